/** Verification plans and their numbered revisions. */
package org.evenbeam.logbook.plans;
