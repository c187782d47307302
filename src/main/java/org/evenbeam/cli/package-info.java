/** The command line: thin commands over the logbook's use cases and the pure evaluation. */
package org.evenbeam.cli;
