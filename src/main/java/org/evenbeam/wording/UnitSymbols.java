package org.evenbeam.wording;

import java.util.Map;

/**
 * How units are written for people, from their UCUM codes (The Unified Code for Units of Measure,
 * 2.1).
 */
public final class UnitSymbols {
  private static final Map<String, String> OTHERS =
      Map.of(
          "Cel", "°C",
          "[pH]", "pH",
          "uL", "µL",
          "ug", "µg",
          "um", "µm",
          "uS/cm", "µS/cm",
          "1", "",
          "%", "%",
          "[ppm]", "ppm");

  private UnitSymbols() {}

  /** The symbol; most codes are their own. */
  public static String of(String ucum) {
    return OTHERS.getOrDefault(ucum, ucum);
  }
}
