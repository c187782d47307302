package org.evenbeam.trail;

import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Optional;

/**
 * Follows the chain from its first entry: numbers without a gap, each entry's own hash recomputed
 * from its text, each naming the hash of the one before, the head naming the last. It is given one
 * entry after the other, so that a trail of any length is checked in little memory, and stops at
 * the first fault.
 */
public final class ChainCheck {
  private long number;
  private String hash = TrailEntry.NO_PREVIOUS;
  private Optional<TrailFault> fault = Optional.empty();

  /** A check before the first entry. */
  public ChainCheck() {}

  /**
   * Takes the next entry.
   *
   * @return the first fault so far
   */
  public Optional<TrailFault> next(SealedEntry entry) {
    if (fault.isEmpty()) {
      fault = faultOf(entry).map(kind -> TrailFault.ofChain(kind, entry.number()));
      number = entry.number();
      hash = entry.hash();
    }
    return fault;
  }

  /**
   * Ends the check.
   *
   * @param headNumber the number that the head names
   * @param headHash the hash that the head names
   * @return the first fault of all
   */
  public Optional<TrailFault> end(long headNumber, String headHash) {
    if (fault.isEmpty() && (headNumber != number || !headHash.equals(hash))) {
      fault = Optional.of(TrailFault.ofChain(TrailFault.Kind.HEAD_DIFFERS, headNumber));
    }
    return fault;
  }

  /** The number of the last entry taken, 0 before any. */
  public long number() {
    return number;
  }

  private Optional<TrailFault.Kind> faultOf(SealedEntry entry) {
    if (entry.number() != number + 1) {
      return Optional.of(TrailFault.Kind.NUMBER_OUT_OF_ORDER);
    }
    if (entry.form() != TrailEntry.FORM) {
      return Optional.of(TrailFault.Kind.FORM_UNKNOWN);
    }
    if (!Sha256.hex(entry.canonical().getBytes(StandardCharsets.UTF_8)).equals(entry.hash())) {
      return Optional.of(TrailFault.Kind.HASH_DIFFERS);
    }
    if (!isCanonical(entry.canonical())) {
      return Optional.of(TrailFault.Kind.NOT_CANONICAL);
    }
    return faultInside(entry);
  }

  private Optional<TrailFault.Kind> faultInside(SealedEntry entry) {
    try {
      TrailEntry inside = EntryReader.read(entry.canonical());
      if (inside.number() != entry.number()) {
        return Optional.of(TrailFault.Kind.NUMBER_DIFFERS);
      }
      return inside.previousHash().equals(hash)
          ? Optional.empty()
          : Optional.of(TrailFault.Kind.PREVIOUS_DIFFERS);
    } catch (UnreadableEntry unreadable) {
      return Optional.of(TrailFault.Kind.NOT_CANONICAL);
    }
  }

  private static boolean isCanonical(String text) {
    try {
      return CanonicalForm.canonical(text).equals(text);
    } catch (UncheckedIOException notJson) {
      return false;
    }
  }
}
