/**
 * The window. Each screen is a package with its view and view model side by side; {@code ui.common}
 * holds what they share and {@code ui.shell} the window around them. Screens work through the use
 * cases of {@code logbook} alone, and off the screen's thread.
 */
package org.evenbeam.ui;
