/**
 * Every sentence for people, for screen, command line and certificate, made from codes with typed
 * arguments, and how figures are written. Nothing is decided or computed here, and no other package
 * holds sentences.
 */
package org.evenbeam.wording;
