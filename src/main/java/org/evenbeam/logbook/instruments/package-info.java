/** Instruments, their status and the log of what happened to them. */
package org.evenbeam.logbook.instruments;
