package org.evenbeam.store.rows;

import java.nio.charset.StandardCharsets;
import org.evenbeam.trail.SealedEntry;
import org.jdbi.v3.core.Handle;

/**
 * The newest entry of the trail, by the single row that every change locks.
 *
 * @param number its number, 0 before any
 * @param hash its hash, sixty-four zeros before any
 */
public record TrailHead(long number, String hash) {
  /** The head as it stands. */
  public static TrailHead read(Handle handle) {
    return select(handle, "select number, hash from chain_head where id = 1");
  }

  static TrailHead lock(Handle handle) {
    return select(handle, "select number, hash from chain_head where id = 1 for update");
  }

  static void advance(Handle handle, SealedEntry entry) {
    handle
        .createUpdate(
            "insert into trail_entry (number, form, canonical, hash)"
                + " values (:number, :form, :canonical, :hash)")
        .bind("number", entry.number())
        .bind("form", entry.form())
        .bind("canonical", entry.canonical().getBytes(StandardCharsets.UTF_8))
        .bind("hash", entry.hash())
        .execute();
    handle
        .createUpdate("update chain_head set number = :number, hash = :hash where id = 1")
        .bind("number", entry.number())
        .bind("hash", entry.hash())
        .execute();
  }

  private static TrailHead select(Handle handle, String sql) {
    return handle
        .createQuery(sql)
        .map((row, context) -> new TrailHead(row.getLong("number"), row.getString("hash")))
        .one();
  }
}
