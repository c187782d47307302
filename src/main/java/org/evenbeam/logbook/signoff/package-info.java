/** What a manager does with a submitted run: approve it or return it, with a signature. */
package org.evenbeam.logbook.signoff;
