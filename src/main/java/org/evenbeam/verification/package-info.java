/**
 * Check points, readings, findings, verdicts and the decision rules between them: pure, no input or
 * output, no clock. Findings and notes leave as codes with typed arguments; the sentences are made
 * in {@code wording}. What the numbers come from is {@code stats}; who may do what is {@code
 * logbook}.
 */
package org.evenbeam.verification;
