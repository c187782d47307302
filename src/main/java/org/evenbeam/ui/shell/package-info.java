/** The window around the screens: who is signed in, and the way from one screen to another. */
package org.evenbeam.ui.shell;
