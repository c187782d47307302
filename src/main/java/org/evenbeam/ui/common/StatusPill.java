package org.evenbeam.ui.common;

import java.util.Optional;
import javafx.geometry.Pos;
import javafx.scene.AccessibleRole;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import org.evenbeam.logbook.instruments.InstrumentStatus;
import org.evenbeam.picture.Picture;
import org.evenbeam.picture.VerdictMark;
import org.evenbeam.verification.Verdict;

/** A word with its shape in a pill: an instrument's status, or a verdict. */
public final class StatusPill extends HBox {
  private static final double MARK = 13;

  private StatusPill(Picture mark, String word, String style) {
    super(10, PicturePane.fixed(mark), Panes.label(word, style, "strong"));
    getStyleClass().add("pill");
    setAlignment(Pos.CENTER_LEFT);
    setMinWidth(Region.USE_PREF_SIZE);
    setMaxSize(Region.USE_PREF_SIZE, Region.USE_PREF_SIZE);
    setAccessibleRole(AccessibleRole.TEXT);
    setAccessibleText(word);
  }

  /** The pill of an instrument's status. */
  public static StatusPill of(InstrumentStatus status, ScreenTexts texts) {
    return of(shape(status), texts.name("status", status), texts);
  }

  /** The pill of a verdict, or of none. */
  public static StatusPill of(Optional<Verdict> verdict, ScreenTexts texts) {
    return of(verdict, texts.sentences().verdict(verdict), texts);
  }

  private static StatusPill of(Optional<Verdict> shape, String word, ScreenTexts texts) {
    return new StatusPill(VerdictMark.draw(shape, MARK, texts.labels("")), word, style(shape));
  }

  /** The shape that goes with a status. */
  public static Optional<Verdict> shape(InstrumentStatus status) {
    return switch (status) {
      case IN_SERVICE -> Optional.of(Verdict.CONFORMS);
      case IN_SERVICE_WITH_RESTRICTION -> Optional.of(Verdict.UNDECIDED);
      case OUT_OF_SERVICE -> Optional.of(Verdict.DOES_NOT_CONFORM);
      case RETIRED -> Optional.empty();
    };
  }

  /** The style of a verdict's words. */
  public static String style(Optional<Verdict> verdict) {
    return verdict
        .map(
            v ->
                switch (v) {
                  case CONFORMS -> "level";
                  case DOES_NOT_CONFORM -> "tilt";
                  case UNDECIDED -> "sway";
                })
        .orElse("quiet");
  }
}
