/** Signing in. */
package org.evenbeam.ui.signin;
