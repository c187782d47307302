/** People, their passwords and signing in. */
package org.evenbeam.logbook.people;
