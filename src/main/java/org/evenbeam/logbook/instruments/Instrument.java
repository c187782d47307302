package org.evenbeam.logbook.instruments;

import java.math.BigDecimal;

/**
 * An instrument as the equipment record describes it (ISO/IEC 17025:2017, 6.4.13).
 *
 * @param tag the laboratory's own mark on it; unique
 * @param kind what it is, such as analytical balance
 * @param maker who made it
 * @param model the maker's type
 * @param serialNumber the maker's number
 * @param location where it stands
 * @param measurand what it measures, such as mass
 * @param unit the UCUM code of its unit, such as g
 * @param rangeLow the lower end of its measuring range
 * @param rangeHigh the upper end, above the lower
 * @param resolution the smallest step it shows, greater than 0
 * @param firmware its firmware version, empty where it has none
 */
public record Instrument(
    String tag,
    String kind,
    String maker,
    String model,
    String serialNumber,
    String location,
    String measurand,
    String unit,
    BigDecimal rangeLow,
    BigDecimal rangeHigh,
    BigDecimal resolution,
    String firmware) {
  /** Checks range and resolution. */
  public Instrument {
    if (rangeHigh.compareTo(rangeLow) <= 0) {
      throw new IllegalArgumentException(
          "rangeHigh is " + rangeHigh + ", allowed: above " + rangeLow);
    }
    if (resolution.signum() <= 0) {
      throw new IllegalArgumentException("resolution is " + resolution + ", allowed: above 0");
    }
  }

  /** The span of the measuring range, in its unit. */
  public BigDecimal rangeSpan() {
    return rangeHigh.subtract(rangeLow);
  }
}
