package org.evenbeam.logbook.laboratory;

import java.util.Optional;
import org.evenbeam.logbook.Transaction;

/** Where the laboratory's own facts are kept. */
public interface LaboratoryRecords {
  /** The laboratory, once it is set up. */
  Optional<Laboratory> find(Transaction transaction);

  /** Sets the laboratory up; there is only one. */
  void add(Transaction transaction, Laboratory laboratory);
}
