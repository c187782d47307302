package org.evenbeam.logbook.run;

import java.time.Instant;

/**
 * What was being typed at a check point and not yet entered; never a reading.
 *
 * @param checkPoint the check point's label
 * @param text as far as it was typed
 * @param at when it was kept
 */
public record Scratch(String checkPoint, String text, Instant at) {}
