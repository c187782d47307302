/** The bench: what to go on with, and the instruments. */
package org.evenbeam.ui.bench;
