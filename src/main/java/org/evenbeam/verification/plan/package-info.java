/**
 * What is asked of an instrument before anything is measured: plan revisions, their check points,
 * limits as planned, conditions allowed. Resolving them against a reference gives the questions
 * that {@code verification} answers.
 */
package org.evenbeam.verification.plan;
