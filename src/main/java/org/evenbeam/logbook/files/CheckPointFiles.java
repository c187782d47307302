package org.evenbeam.logbook.files;

import java.math.BigDecimal;
import java.nio.file.Path;
import java.util.List;
import org.evenbeam.verification.CheckPointQuestion;

/** Check points and readings from two files, without a logbook. */
public interface CheckPointFiles {
  /**
   * A check point with its readings.
   *
   * @param question what is asked
   * @param readings in the file's order, at least one
   */
  record Case(CheckPointQuestion question, List<BigDecimal> readings) {}

  /**
   * Reads the two files.
   *
   * @return the check points in their file's order
   * @throws BadInput with file, line, column and reason, when anything is not as it must be
   */
  List<Case> read(Path checkPoints, Path readings);
}
