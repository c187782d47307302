package org.evenbeam.store.tables;

import java.nio.charset.StandardCharsets;
import java.util.List;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.history.TrailRecords;
import org.evenbeam.store.rows.OpenTransaction;
import org.evenbeam.store.rows.TrailHead;
import org.evenbeam.trail.SealedEntry;

/** The audit trail as it is kept. */
public final class TrailTable implements TrailRecords {
  /** A table of any open store. */
  public TrailTable() {}

  @Override
  public List<SealedEntry> after(Transaction transaction, long number, int most) {
    return OpenTransaction.reading(transaction)
        .createQuery(
            "select number, form, canonical, hash from trail_entry where number > :number"
                + " order by number fetch first :most rows only")
        .bind("number", number)
        .bind("most", most)
        .map(
            (row, context) ->
                new SealedEntry(
                    row.getLong("number"),
                    row.getInt("form"),
                    new String(row.getBytes("canonical"), StandardCharsets.UTF_8),
                    row.getString("hash")))
        .list();
  }

  @Override
  public Head head(Transaction transaction) {
    TrailHead head = TrailHead.read(OpenTransaction.reading(transaction));
    return new Head(head.number(), head.hash());
  }
}
