package org.evenbeam.logbook.history;

import java.util.List;
import org.evenbeam.logbook.Desk;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.UseCase;
import org.evenbeam.trail.SealedEntry;

/** Reading the audit trail. */
public final class TrailReading {
  private final Desk desk;
  private final TrailRecords trail;

  /** Reads from the given store. */
  public TrailReading(Desk desk, TrailRecords trail) {
    this.desk = desk;
    this.trail = trail;
  }

  /** The entries after that number, oldest first, at most {@code most}. */
  public List<SealedEntry> after(Session session, long number, int most) {
    return desk.read(
        session, UseCase.READ_TRAIL, transaction -> trail.after(transaction, number, most));
  }

  /** The chain's head. */
  public TrailRecords.Head head(Session session) {
    return desk.read(session, UseCase.READ_TRAIL, trail::head);
  }
}
