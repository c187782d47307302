package org.evenbeam.trail;

import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** Chains of entries for tests. */
final class Entries {
  static final Instant NOON = Instant.parse("2026-03-02T11:00:00.123456Z");

  private Entries() {}

  /** A whole chain, each entry with one list of changes. */
  @SafeVarargs
  static List<SealedEntry> chain(List<RowChange>... changes) {
    List<SealedEntry> chain = new ArrayList<>();
    String previous = TrailEntry.NO_PREVIOUS;
    for (List<RowChange> change : changes) {
      SealedEntry sealed = CanonicalForm.seal(entry(chain.size() + 1, previous, change));
      chain.add(sealed);
      previous = sealed.hash();
    }
    return chain;
  }

  static TrailEntry entry(long number, String previous, List<RowChange> changes) {
    return new TrailEntry(
        number, NOON, Optional.of("7"), "reading entered", Optional.empty(), changes, previous);
  }

  static RowChange added(String key, Map<String, Cell> after) {
    return new RowChange("reading", key, Optional.empty(), Optional.of(after));
  }

  static Map<String, Cell> row(String typed) {
    return Map.of("id", Cell.of(1), "typed", Cell.of(typed), "reason", Cell.nothing());
  }
}
