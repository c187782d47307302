/**
 * The command {@code readings-needed}: how many readings or trials a question needs, each with the
 * assumptions that its answer rests on.
 */
package org.evenbeam.cli.readings;
