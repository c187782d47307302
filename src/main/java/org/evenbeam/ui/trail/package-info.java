/** The audit trail, to read and to check. */
package org.evenbeam.ui.trail;
