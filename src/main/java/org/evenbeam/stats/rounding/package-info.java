/**
 * Intervals from readings so coarse that only a few values occur: the likelihood of rounded normal
 * readings in place of the classical formulas, shown beside them.
 */
package org.evenbeam.stats.rounding;
