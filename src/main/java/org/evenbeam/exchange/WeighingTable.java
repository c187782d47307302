package org.evenbeam.exchange;

import java.math.BigDecimal;
import java.nio.file.Path;
import java.util.List;
import org.evenbeam.logbook.files.WeighingFiles;

/** Weighings of water from a CSV file with one column, {@code mass_mg}. */
public final class WeighingTable implements WeighingFiles {
  private static final String MASS = "mass_mg";

  @Override
  public List<BigDecimal> read(Path weighings) {
    return TableFile.read(weighings, List.of(MASS)).stream()
        .map(row -> row.requiredNumber(MASS))
        .toList();
  }
}
