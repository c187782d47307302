/** The laboratory's own facts: name, address, time zone, decimal sign, and its first set-up. */
package org.evenbeam.logbook.laboratory;
