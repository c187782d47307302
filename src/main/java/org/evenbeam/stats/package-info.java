/**
 * The statistics of a check: exact moments of the readings as typed, the classical tests, the tests
 * against limits, and combined uncertainty. Numbers in, records out.
 *
 * <p>Here live no units, no plans, no verdicts, no sentences and no input or output. Distributions
 * and their quantiles come from Commons Statistics; Commons Math gives root finding and quadrature
 * only, since its quantiles lose digits in the tails.
 */
package org.evenbeam.stats;
