package org.evenbeam.logbook.history;

import java.util.List;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.trail.SealedEntry;

/** Where the audit trail is kept. */
public interface TrailRecords {
  /** The entries after that number, oldest first, at most {@code most}. */
  List<SealedEntry> after(Transaction transaction, long number, int most);

  /** The number and hash in the chain's head: number 0 and sixty-four zeros before any entry. */
  Head head(Transaction transaction);

  /**
   * The chain's head.
   *
   * @param number the newest entry's number
   * @param hash its hash
   */
  record Head(long number, String hash) {}
}
