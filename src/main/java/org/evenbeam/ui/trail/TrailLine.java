package org.evenbeam.ui.trail;

/**
 * One entry of the trail in a list.
 *
 * @param number its number
 * @param at day and time
 * @param person who
 * @param action what was done
 * @param reason why, where a reason was asked for
 */
public record TrailLine(long number, String at, String person, String action, String reason) {}
