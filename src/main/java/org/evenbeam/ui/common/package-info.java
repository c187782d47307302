/**
 * What all screens share: theme and fonts, the painter of pictures, work in the background, texts,
 * and the small panes that ask for a reason or a password.
 */
package org.evenbeam.ui.common;
