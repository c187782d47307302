/**
 * The audit trail's entry, its canonical form and its chain of hashes: pure, and usable by a
 * checker without the rest of the program. Where entries are kept is {@code store}; what makes them
 * is {@code logbook}.
 */
package org.evenbeam.trail;
