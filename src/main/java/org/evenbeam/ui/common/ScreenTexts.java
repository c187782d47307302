package org.evenbeam.ui.common;

import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.util.List;
import java.util.Locale;
import org.evenbeam.logbook.LogbookException;
import org.evenbeam.logbook.laboratory.Laboratory;
import org.evenbeam.metrology.DecimalSign;
import org.evenbeam.picture.Labels;
import org.evenbeam.wording.Figures;
import org.evenbeam.wording.PictureWords;
import org.evenbeam.wording.Problems;
import org.evenbeam.wording.Sentences;
import org.evenbeam.wording.UnitSymbols;
import org.evenbeam.wording.Words;

/** The texts of the screens in one laboratory's language, figures and time zone. */
public final class ScreenTexts {
  private static final DateTimeFormatter TIME = DateTimeFormatter.ofPattern("HH:mm:ss");
  private static final DateTimeFormatter DAY_AND_TIME =
      DateTimeFormatter.ofPattern("yyyy-MM-dd HH:mm");

  private final Words words;
  private final Figures figures;
  private final Sentences sentences;
  private final Problems problems;
  private final DecimalSign sign;
  private final ZoneId zone;

  /** The texts for that laboratory. */
  public ScreenTexts(Laboratory laboratory) {
    this.words = new Words(Locale.forLanguageTag(laboratory.language()));
    this.figures = new Figures(laboratory.decimalSign());
    this.sentences = new Sentences(words, figures);
    this.problems = new Problems(words);
    this.sign = laboratory.decimalSign();
    this.zone = laboratory.zone();
  }

  /** The text of that key, with arguments that are text already. */
  public String text(String key, String... arguments) {
    return words.text(Words.Bundle.SCREEN, key, arguments);
  }

  /** The name of a constant, from the key {@code prefix.CONSTANT}. */
  public String name(String prefix, Enum<?> constant) {
    return words.name(Words.Bundle.SCREEN, prefix, constant);
  }

  /** What went wrong, in words. */
  public String problem(Throwable thrown) {
    return thrown instanceof LogbookException refused
        ? problems.sentence(refused.key(), refused.arguments())
        : problems.sentence("unexpected", List.of(thrown.toString()));
  }

  /** A refusal of the screen itself, of the same keys. */
  public String problem(String key, Object... arguments) {
    return problems.sentence(key, List.of(arguments));
  }

  /** How figures are written. */
  public Figures figures() {
    return figures;
  }

  /** Findings in words. */
  public Sentences sentences() {
    return sentences;
  }

  /** The laboratory's decimal sign. */
  public DecimalSign sign() {
    return sign;
  }

  /** The labels of pictures in that UCUM unit. */
  public Labels labels(String unit) {
    return new PictureWords(words, figures, UnitSymbols.of(unit));
  }

  /** The time of day to the second. */
  public String time(Instant at) {
    return TIME.format(at.atZone(zone));
  }

  /** Day and time to the minute. */
  public String dayAndTime(Instant at) {
    return DAY_AND_TIME.format(at.atZone(zone));
  }

  /** A day by ISO 8601. */
  public String day(LocalDate day) {
    return day.toString();
  }
}
