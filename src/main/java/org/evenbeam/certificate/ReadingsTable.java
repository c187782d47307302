package org.evenbeam.certificate;

import static org.evenbeam.wording.Words.Bundle.CERTIFICATE;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.evenbeam.logbook.run.Reading;
import org.evenbeam.logbook.run.SheetCheckPoint;
import org.evenbeam.wording.Words;

/**
 * Every reading as typed, in rows of several, and what became of those that were corrected or
 * struck.
 */
final class ReadingsTable {
  private static final int IN_A_ROW = 3;
  private static final Map<String, String> NO_CELL =
      Map.of("index", "", "reading", "", "time", "", "mark", "");

  private final Words words;
  private final CertificateTimes times;

  ReadingsTable(Words words, CertificateTimes times) {
    this.words = words;
    this.times = times;
  }

  String title(SheetCheckPoint point) {
    return words.text(
        CERTIFICATE,
        "readings",
        Integer.toString(point.planned().readings()),
        Integer.toString(point.counting().size()));
  }

  List<Map<String, Object>> rows(SheetCheckPoint point) {
    List<Map<String, String>> cells = new ArrayList<>();
    point.standing().forEach(reading -> cells.add(cell(reading)));
    while (cells.size() % IN_A_ROW != 0) {
      cells.add(NO_CELL);
    }
    List<Map<String, Object>> rows = new ArrayList<>();
    for (int i = 0; i < cells.size(); i += IN_A_ROW) {
      rows.add(Map.of("cells", cells.subList(i, i + IN_A_ROW)));
    }
    return rows;
  }

  /** What happened to readings, in the order in which it happened. */
  List<String> changes(SheetCheckPoint point) {
    List<String> changes = new ArrayList<>();
    for (Reading reading : point.readings()) {
      reading
          .corrects()
          .ifPresent(correction -> changes.add(corrected(point, reading, correction)));
      reading.strike().ifPresent(strike -> changes.add(struck(reading, strike)));
    }
    return changes;
  }

  private Map<String, String> cell(Reading reading) {
    return Map.of(
        "index", Integer.toString(reading.position()),
        "reading", reading.value().text(),
        "time", times.ofDay(reading.at()),
        "mark", reading.strike().isPresent() ? "struck" : "");
  }

  private String struck(Reading reading, Reading.Strike strike) {
    return words.text(
        CERTIFICATE,
        "change.struck",
        Integer.toString(reading.position()),
        reading.value().text(),
        times.ofDay(strike.at()),
        strike.cause());
  }

  private String corrected(SheetCheckPoint point, Reading reading, Reading.Correction correction) {
    Optional<Reading> old =
        point.readings().stream().filter(r -> r.id() == correction.readingId()).findFirst();
    return words.text(
        CERTIFICATE,
        "change.corrected",
        Integer.toString(reading.position()),
        old.map(r -> r.value().text()).orElse(""),
        reading.value().text(),
        times.ofDay(reading.at()),
        correction.reason());
  }
}
