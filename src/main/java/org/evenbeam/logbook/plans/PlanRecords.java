package org.evenbeam.logbook.plans;

import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.verification.plan.PlanRevision;

/** Where plan revisions are kept. */
public interface PlanRecords {
  /** Adds a revision; instrument, title and revision number together are unique. */
  void add(Transaction transaction, PlanRevision revision);

  /** The newest revision of each plan of an instrument, by title. */
  List<PlanRevision> current(Transaction transaction, String instrumentTag);

  /** One revision. */
  Optional<PlanRevision> find(
      Transaction transaction, String instrumentTag, String title, int revision);
}
