package org.evenbeam.planted.logbook.plans;

import java.time.Instant;
import org.evenbeam.planted.logbook.run.Knot;

/** The other half of the cycle, past the desk, by its own clock, with a broad catch. */
public final class Loop {
  Knot knot;
  Transactions transactions;

  Instant late() {
    try {
      return Instant.now();
    } catch (RuntimeException swallowed) {
      return Instant.EPOCH;
    }
  }
}
