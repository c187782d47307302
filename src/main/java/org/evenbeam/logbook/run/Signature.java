package org.evenbeam.logbook.run;

import java.time.Instant;

/**
 * An electronic signature (21 CFR 11.50): who, when, with which meaning, bound to what was signed.
 *
 * @param personId who signed
 * @param meaning what the signature says
 * @param at when
 * @param contentSha256 SHA-256 of the run's content in canonical form, 64 hexadecimal digits
 */
public record Signature(long personId, Meaning meaning, Instant at, String contentSha256) {
  /** What a signature says. */
  public enum Meaning {
    /** The signer measured and submits. */
    PREPARED,
    /** The signer reviewed and approves. */
    APPROVED,
    /** The signer reviewed and returns. */
    RETURNED
  }
}
