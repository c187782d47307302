/**
 * What a check could have missed: the chance of each verdict for an instrument of a true bias and a
 * true standard deviation, before or after the readings are made.
 *
 * <p>Here live the decision rules as far as they set limits on mean and standard deviation, and the
 * integrals over their distribution. The verdict on actual readings is taken elsewhere, by the
 * tests of {@code org.evenbeam.stats}.
 */
package org.evenbeam.stats.risk;
