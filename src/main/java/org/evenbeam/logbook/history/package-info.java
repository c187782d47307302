/** Reading the audit trail and checking its chain. */
package org.evenbeam.logbook.history;
