/** The manager's queue: submitted runs to approve or return. */
package org.evenbeam.ui.signoff;
