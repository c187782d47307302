/**
 * Whether readings are fit for the tests made on them: normality, outliers, order, and the
 * homogeneity of standard deviations across runs. Everything here raises questions; nothing here
 * removes a reading or changes a verdict.
 *
 * <p>All works on deviations from the exact mean, so that an offset costs no digits.
 */
package org.evenbeam.stats.fitness;
