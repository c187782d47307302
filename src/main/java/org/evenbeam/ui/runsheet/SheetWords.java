package org.evenbeam.ui.runsheet;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.evenbeam.logbook.instruments.Instrument;
import org.evenbeam.logbook.run.Reading;
import org.evenbeam.logbook.run.Run;
import org.evenbeam.logbook.run.SheetCheckPoint;
import org.evenbeam.ui.common.ScreenTexts;
import org.evenbeam.verification.CheckPointFindings;
import org.evenbeam.verification.Note;
import org.evenbeam.verification.RunFindings;
import org.evenbeam.wording.UnitSymbols;

/** What a run sheet says about itself, in words. */
final class SheetWords {
  private static final String BETWEEN = " · ";

  private final ScreenTexts texts;

  SheetWords(ScreenTexts texts) {
    this.texts = texts;
  }

  /** Kind, range, resolution and place of the instrument. */
  String instrument(Instrument instrument) {
    String range =
        texts.figures().exact(instrument.rangeLow())
            + "–"
            + withUnit(texts.figures().exact(instrument.rangeHigh()), instrument);
    String resolution =
        "d = " + withUnit(texts.figures().exact(instrument.resolution()), instrument);
    return String.join(BETWEEN, instrument.kind(), range, resolution, instrument.location());
  }

  private static String withUnit(String figure, Instrument instrument) {
    String symbol = UnitSymbols.of(instrument.unit());
    return symbol.isEmpty() ? figure : figure + "\u202f" + symbol;
  }

  /** Plan, kind of run and person. */
  String run(SheetState state) {
    Run run = state.sheet().run();
    return String.join(
        BETWEEN,
        texts.text("run.number", Long.toString(run.number())),
        texts.text("run.plan", run.planTitle(), Integer.toString(run.planRevision())),
        texts.name("run.kind", run.kind()),
        state.sheet().technician(),
        texts.dayAndTime(run.startedAt()));
  }

  /** The standard at a check point and how long its certificate holds. */
  String standard(SheetCheckPoint point) {
    return texts.text(
        "sheet.standard",
        point.standard().tag(),
        point.standard().kind(),
        point.certificate().number(),
        texts.day(point.certificate().issued()),
        texts.day(point.certificate().expires()));
  }

  /** What the bias is measured from. */
  String readingLess(SheetCheckPoint point, String unit) {
    String value = texts.figures().exact(point.certified().value());
    return texts.text("sheet.reading-less", texts.figures().withUnit(value, UnitSymbols.of(unit)));
  }

  /** The readings of a check point as lines, in the order in which they were entered. */
  List<ReadingLine> lines(SheetCheckPoint point) {
    Map<Long, String> corrected =
        point.readings().stream()
            .flatMap(reading -> reading.corrects().stream())
            .collect(
                Collectors.toMap(
                    Reading.Correction::readingId, Reading.Correction::reason, (a, b) -> b));
    Function<Reading, ReadingLine> line =
        reading ->
            new ReadingLine(
                reading.id(),
                reading.position(),
                reading.value().text(),
                texts.time(reading.at()),
                state(reading, corrected),
                remark(reading, corrected));
    return point.readings().stream().map(line).toList();
  }

  private static ReadingLine.State state(Reading reading, Map<Long, String> corrected) {
    if (corrected.containsKey(reading.id())) {
      return ReadingLine.State.CORRECTED;
    }
    return reading.strike().isPresent() ? ReadingLine.State.STRUCK : ReadingLine.State.COUNTS;
  }

  private String remark(Reading reading, Map<Long, String> corrected) {
    if (corrected.containsKey(reading.id())) {
      return texts.text("sheet.corrected", corrected.get(reading.id()));
    }
    return reading.strike().map(strike -> texts.text("sheet.struck", strike.cause())).orElse("");
  }

  /** What was found at a check point. */
  List<String> findings(SheetCheckPoint point, String unit) {
    String symbol = UnitSymbols.of(unit);
    return point
        .findings()
        .map(found -> texts.sentences().findings(found, symbol))
        .orElseGet(() -> List.of(texts.text("sheet.no-readings")));
  }

  /** What must be known beside it, of the check point and of the run. */
  List<String> notes(SheetCheckPoint point, RunFindings run, String unit) {
    Optional<CheckPointFindings> found = point.findings();
    List<Note> notes = new ArrayList<>(found.map(CheckPointFindings::notes).orElse(List.of()));
    notes.addAll(run.notes());
    String symbol = UnitSymbols.of(unit);
    return notes.stream().map(note -> texts.sentences().notes().sentence(note, symbol)).toList();
  }
}
