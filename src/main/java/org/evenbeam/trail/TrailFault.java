package org.evenbeam.trail;

/**
 * The first thing that is wrong with a trail.
 *
 * @param kind what is wrong
 * @param entry the number of the entry at which it shows; the head's number for {@link
 *     Kind#HEAD_DIFFERS}, the last entry's for a difference from the tables
 * @param table the table concerned, empty where it is the chain
 * @param key the row's key, empty where it is the chain
 */
public record TrailFault(Kind kind, long entry, String table, String key) {
  /** What can be wrong. */
  public enum Kind {
    /** The entry does not have the number that follows the one before it. */
    NUMBER_OUT_OF_ORDER,
    /** The entry is in a form that this program does not know. */
    FORM_UNKNOWN,
    /** The entry's text does not have the hash that is kept with it. */
    HASH_DIFFERS,
    /** The entry's text is no entry in canonical form. */
    NOT_CANONICAL,
    /** The number inside the text is not the number that is kept with it. */
    NUMBER_DIFFERS,
    /** The entry does not name the hash of the one before it. */
    PREVIOUS_DIFFERS,
    /** The head names another entry than the last. */
    HEAD_DIFFERS,
    /** The entry's row before the change is not what the earlier entries left. */
    BEFORE_DIFFERS,
    /** A row that the entries made is not in its table. */
    ROW_MISSING,
    /** A row is in a table that no entry made. */
    ROW_UNKNOWN,
    /** A row is not as the entries left it. */
    ROW_DIFFERS
  }

  static TrailFault ofChain(Kind kind, long entry) {
    return new TrailFault(kind, entry, "", "");
  }
}
