package org.evenbeam.wording;

import static org.evenbeam.wording.Words.Bundle.FINDING;

import org.evenbeam.verification.Note;

/** Notes beside findings, in words. */
public final class Notes {
  private final Words words;
  private final Figures figures;

  Notes(Words words, Figures figures) {
    this.words = words;
    this.figures = figures;
  }

  /** The note as a sentence; figures in that unit, which may be empty. */
  public String sentence(Note note, String unit) {
    return words.text(FINDING, key(note), arguments(note, unit));
  }

  private static String key(Note note) {
    String kind = "note." + note.getClass().getSimpleName();
    if (note instanceof Note.NotAsked asked) {
      return kind + "." + asked.criterion().name();
    }
    return note instanceof Note.EstimateBeyondButNotShown beyond
        ? kind + "." + beyond.criterion().name()
        : kind;
  }

  private String[] arguments(Note note, String unit) {
    if (note instanceof Note.ReadingsEqual equal) {
      return texts(equal.n());
    } else if (note instanceof Note.ResolutionCounts counts) {
      return new String[] {amount(counts.resolutionUncertainty(), unit)};
    } else if (note instanceof Note.ResolutionBoundsSpread bounds) {
      return new String[] {amount(bounds.upperBound(), unit)};
    } else if (note instanceof Note.EstimateBeyondButNotShown beyond) {
      return texts(beyond.n());
    } else if (note instanceof Note.UncertaintyLargeForSimpleAcceptance large) {
      return new String[] {amount(large.expanded(), unit), amount(large.third(), unit)};
    } else if (note instanceof Note.NotNormal flag) {
      return new String[] {figures.probability(flag.p())};
    } else if (note instanceof Note.NeighboursAlike flag) {
      return new String[] {figures.probability(flag.p())};
    } else if (note instanceof Note.Climbing flag) {
      return new String[] {figures.probability(flag.p())};
    } else if (note instanceof Note.Falling flag) {
      return new String[] {figures.probability(flag.p())};
    } else if (note instanceof Note.FarReading far) {
      return new String[] {
        Integer.toString(far.position()), figures.toPlaces(far.standardDeviations(), 1)
      };
    } else if (note instanceof Note.ReadingsToGo toGo) {
      return texts(toGo.planned() - toGo.n(), toGo.planned());
    } else if (note instanceof Note.MoreReadingsThanPlanned more) {
      return texts(more.n(), more.planned());
    } else if (note instanceof Note.ConditionMissing missing) {
      return new String[] {words.name(FINDING, "condition", missing.condition())};
    } else if (note instanceof Note.ConditionOutside outside) {
      return new String[] {words.name(FINDING, "condition", outside.condition())};
    } else if (note instanceof Note.StandardExpired expired) {
      return new String[] {expired.standardTag(), expired.expired().toString()};
    } else if (note instanceof Note.StruckReadingsDecide struck) {
      return texts(struck.struck());
    }
    return new String[0];
  }

  private String amount(double value, String unit) {
    return figures.withUnit(figures.uncertainty(value), unit);
  }

  private static String[] texts(int... numbers) {
    String[] texts = new String[numbers.length];
    for (int i = 0; i < numbers.length; i++) {
      texts[i] = Integer.toString(numbers[i]);
    }
    return texts;
  }
}
