package org.evenbeam.trail;

import java.time.Instant;
import java.util.List;
import java.util.Optional;

/**
 * What one use case did, before it is sealed.
 *
 * @param number 1 for the first entry, each next one more
 * @param at when, by the laboratory's clock
 * @param person the key of the person who did it; empty for what the program did by itself
 * @param action what was done, by the use case's lasting name
 * @param reason why, where a reason was asked for
 * @param changes every row touched, in the order of the work
 * @param previousHash the hash of the entry before, 64 hexadecimal digits
 */
public record TrailEntry(
    long number,
    Instant at,
    Optional<String> person,
    String action,
    Optional<String> reason,
    List<RowChange> changes,
    String previousHash) {
  /** The previous hash of the first entry. */
  public static final String NO_PREVIOUS = "0".repeat(64);

  /** The version of the form that {@link CanonicalForm} writes. */
  public static final int FORM = 1;

  /** Keeps the changes unchangeable. */
  public TrailEntry {
    changes = List.copyOf(changes);
  }
}
