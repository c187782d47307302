/**
 * Runs: one execution of one plan revision on one instrument by one person, with its readings as
 * typed, its conditions and its scratch, up to the moment it is submitted. What follows is {@code
 * logbook.signoff}.
 */
package org.evenbeam.logbook.run;
