package org.evenbeam.exchange;

import java.math.BigDecimal;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.files.BadInput;
import org.evenbeam.metrology.DecimalSign;
import org.evenbeam.metrology.NumberRefused;
import org.evenbeam.metrology.TypedDecimal;

/**
 * One row of a table file.
 *
 * @param file the file
 * @param line the row's line in it, from 1
 * @param header the names of the columns
 * @param cells one for each column, as they stand
 */
record TableRow(Path file, long line, List<String> header, List<String> cells) {

  /** The cell's text without surrounding white space, empty where nothing stands. */
  Optional<String> optional(String column) {
    return Optional.of(cells.get(header.indexOf(column)).strip()).filter(text -> !text.isEmpty());
  }

  /**
   * The cell's text.
   *
   * @throws BadInput when nothing stands there
   */
  String text(String column) {
    return optional(column).orElseThrow(() -> BadInput.missing(place(column)));
  }

  /**
   * The cell's number, with a decimal point.
   *
   * @throws BadInput when it is not one
   */
  Optional<BigDecimal> number(String column) {
    return optional(column).map(text -> parse(column, text));
  }

  /**
   * The cell's number.
   *
   * @throws BadInput when nothing stands there or it is not a number
   */
  BigDecimal requiredNumber(String column) {
    return parse(column, text(column));
  }

  /**
   * The cell's number, which must be above zero.
   *
   * @throws BadInput when it is not
   */
  Optional<BigDecimal> positive(String column) {
    Optional<BigDecimal> number = number(column);
    if (number.isPresent() && number.get().signum() <= 0) {
      throw BadInput.range(place(column), text(column), "> 0");
    }
    return number;
  }

  /** Where a cell stands. */
  BadInput.Place place(String column) {
    return new BadInput.Place(file, line, header.indexOf(column) + 1, column);
  }

  private BigDecimal parse(String column, String text) {
    try {
      return TypedDecimal.parse(text, DecimalSign.POINT).value();
    } catch (NumberRefused why) {
      throw BadInput.number(place(column), why);
    }
  }
}
