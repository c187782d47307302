/**
 * How many readings a question needs: the inverses of the tests, intervals and chances. Always
 * rounded up; that no number up to the cap suffices is an answer, not an error.
 */
package org.evenbeam.stats.samplesize;
