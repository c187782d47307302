/** The launcher, and the only place where the parts are wired together. */
package org.evenbeam.app;
