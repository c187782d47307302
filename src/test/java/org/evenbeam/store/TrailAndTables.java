package org.evenbeam.store;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.history.TrailRecords;
import org.evenbeam.store.rows.OpenTransaction;
import org.evenbeam.store.rows.RowCells;
import org.evenbeam.store.rows.TrailedTable;
import org.evenbeam.trail.Cell;
import org.evenbeam.trail.ChainCheck;
import org.evenbeam.trail.EntryReader;
import org.evenbeam.trail.Replay;
import org.evenbeam.trail.SealedEntry;
import org.evenbeam.trail.TrailFault;

/** Follows the whole chain, replays it and compares the result with every trailed table. */
final class TrailAndTables {
  private static final int PAGE = 100;

  private TrailAndTables() {}

  /** The first thing that is wrong. */
  static Optional<TrailFault> check(LogbookStore store) {
    return store.transactions().read(t -> check(t, store.trail()));
  }

  /** Every row of a table by its key. */
  static Map<String, Map<String, Cell>> rows(Transaction transaction, TrailedTable table) {
    Map<String, Map<String, Cell>> rows = new HashMap<>();
    OpenTransaction.reading(transaction)
        .createQuery("select * from " + table.sqlName())
        .map(new RowCells())
        .forEach(row -> rows.put(row.get(table.key()).text().orElseThrow(), row));
    return rows;
  }

  private static Optional<TrailFault> check(Transaction transaction, TrailRecords trail) {
    ChainCheck chain = new ChainCheck();
    Replay replay = new Replay();
    List<SealedEntry> page;
    do {
      page = trail.after(transaction, chain.number(), PAGE);
      for (SealedEntry entry : page) {
        Optional<TrailFault> fault =
            chain.next(entry).or(() -> replay.next(EntryReader.read(entry.canonical())));
        if (fault.isPresent()) {
          return fault;
        }
      }
    } while (!page.isEmpty());
    TrailRecords.Head head = trail.head(transaction);
    return chain.end(head.number(), head.hash()).or(() -> compare(transaction, replay));
  }

  private static Optional<TrailFault> compare(Transaction transaction, Replay replay) {
    for (TrailedTable table : TrailedTable.values()) {
      Optional<TrailFault> fault = replay.compare(table.sqlName(), rows(transaction, table));
      if (fault.isPresent()) {
        return fault;
      }
    }
    return Optional.empty();
  }
}
