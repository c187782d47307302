/** All use cases of one open logbook together, as screens, commands and the import receive them. */
package org.evenbeam.logbook.open;
