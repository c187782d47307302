package org.evenbeam.logbook;

import java.nio.file.Path;

/**
 * The laboratory's folder or database cannot be used as asked. Nothing acknowledged before is lost.
 */
public final class StoreFailed extends LogbookException {
  private static final long serialVersionUID = 1L;

  /** What went wrong. */
  public enum Reason {
    /** Another program holds the database. */
    IN_USE,
    /** The folder cannot be written to. */
    READ_ONLY,
    /** The disk is full. */
    DISK_FULL,
    /** The database was written by a newer program. */
    NEWER_SCHEMA,
    /** The database file is damaged. */
    DAMAGED,
    /** Another window changed the same thing first. */
    CHANGED_MEANWHILE,
    /** The database refused a change that would break a guarded table or a rule. */
    RULE_BROKEN,
    /** Anything else that the database reports. */
    OTHER
  }

  private final Reason reason;

  /** Names the reason, the file or folder concerned and the technical detail. */
  public StoreFailed(Reason reason, Path where, String detail, Throwable cause) {
    super(cause, "store-failed", reason, where.toString(), detail);
    this.reason = reason;
  }

  /** What went wrong. */
  public Reason reason() {
    return reason;
  }
}
