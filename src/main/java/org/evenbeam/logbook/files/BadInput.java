package org.evenbeam.logbook.files;

import java.nio.file.Path;
import org.evenbeam.logbook.LogbookException;
import org.evenbeam.metrology.NumberRefused;

/** A file that is not taken, with the place and the reason. Nothing of it is used. */
public final class BadInput extends LogbookException {
  private static final long serialVersionUID = 1L;

  private BadInput(String key, Object... arguments) {
    super(key, arguments);
  }

  /**
   * A place in a table file.
   *
   * @param file the file
   * @param line its line, from 1
   * @param column its column, from 1
   * @param name the column's name in the header
   */
  public record Place(Path file, long line, int column, String name) {}

  /** The file cannot be read at all. */
  public static BadInput unreadable(Path file, String detail) {
    return new BadInput("input-unreadable", file, detail);
  }

  /** The file has no rows under its header, or not even a header. */
  public static BadInput empty(Path file) {
    return new BadInput("input-empty", file);
  }

  /** The header is not the expected one. */
  public static BadInput header(Path file, String expected, String found) {
    return new BadInput("input-header", file, expected, found);
  }

  /** A row has more or fewer columns than the header. */
  public static BadInput columns(Path file, long line, int expected, int found) {
    return new BadInput(
        "input-columns", file, line, Math.min(expected, found) + 1, expected, found);
  }

  /** The file is not well-formed from that line on. */
  public static BadInput malformed(Path file, long line, String detail) {
    return new BadInput("input-malformed", file, line, detail);
  }

  /** A cell that must be filled is empty. */
  public static BadInput missing(Place at) {
    return new BadInput("input-missing", at.file(), at.line(), at.column(), at.name());
  }

  /** A cell is not taken as a number. */
  public static BadInput number(Place at, NumberRefused why) {
    return new BadInput(
        "input-number", at.file(), at.line(), at.column(), at.name(), why.reason(), why.text());
  }

  /** A cell's value is outside its range. */
  public static BadInput range(Place at, String value, String allowed) {
    return new BadInput(
        "input-range", at.file(), at.line(), at.column(), at.name(), value, allowed);
  }

  /** A name stands twice where it must be unique. */
  public static BadInput twice(Place at, String value) {
    return new BadInput("input-twice", at.file(), at.line(), at.column(), at.name(), value);
  }

  /** A name refers to nothing. */
  public static BadInput unknown(Place at, String value, Path where) {
    return new BadInput(
        "input-unknown", at.file(), at.line(), at.column(), at.name(), value, where);
  }

  /** A check point has no readings. */
  public static BadInput noReadings(Place at, String checkPoint, Path readings) {
    return new BadInput(
        "input-no-readings", at.file(), at.line(), at.column(), at.name(), checkPoint, readings);
  }
}
