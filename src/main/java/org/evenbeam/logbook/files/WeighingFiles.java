package org.evenbeam.logbook.files;

import java.math.BigDecimal;
import java.nio.file.Path;
import java.util.List;

/** Weighings of water from a file, without a logbook. */
public interface WeighingFiles {
  /**
   * Reads the file.
   *
   * @return the masses in mg, in the file's order, at least one
   * @throws BadInput with file, line, column and reason, when anything is not as it must be
   */
  List<BigDecimal> read(Path weighings);
}
