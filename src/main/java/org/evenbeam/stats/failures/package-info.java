/**
 * Pass/fail checks: failures counted in trials, their exact test, intervals and acceptance plans.
 * Readings on a scale are not treated here.
 */
package org.evenbeam.stats.failures;
