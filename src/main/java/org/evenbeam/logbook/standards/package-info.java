/**
 * Reference standards, their calibration certificates or reference material certificates, and the
 * certified values with their uncertainty budgets.
 */
package org.evenbeam.logbook.standards;
