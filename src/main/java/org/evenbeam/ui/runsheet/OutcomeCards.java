package org.evenbeam.ui.runsheet;

import java.util.Optional;
import javafx.beans.value.ObservableValue;
import javafx.collections.ListChangeListener;
import javafx.collections.ObservableList;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import org.evenbeam.picture.BeamPlot;
import org.evenbeam.picture.Labels;
import org.evenbeam.picture.SpreadBar;
import org.evenbeam.ui.common.Panes;
import org.evenbeam.ui.common.PicturePane;
import org.evenbeam.ui.common.ScreenTexts;
import org.evenbeam.ui.common.StatusPill;
import org.evenbeam.verification.Verdict;
import org.evenbeam.wording.UnitSymbols;

/** The two pictures of a check point, and below them what they mean in words. */
final class OutcomeCards extends VBox {
  private final RunSheetViewModel model;
  private final ScreenTexts texts;
  private final SheetWords words;
  private final PicturePane beam = new PicturePane(220, 130);
  private final PicturePane spread = new PicturePane(220, 66);
  private final Label readingLess = Panes.label("", "quiet", "small");
  private final Label spreadUnit = Panes.label("", "quiet", "small");
  private final VBox said = new VBox(8);

  OutcomeCards(RunSheetViewModel model, ScreenTexts texts) {
    super(10);
    this.model = model;
    this.texts = texts;
    this.words = new SheetWords(texts);
    beam.setId("beam-plot");
    spread.setId("spread-bar");
    VBox bias = Panes.card(4, head(texts.text("sheet.bias"), readingLess), beam);
    VBox.setVgrow(beam, Priority.ALWAYS);
    VBox.setVgrow(bias, Priority.ALWAYS);
    bias.setMinHeight(170);
    VBox precision = Panes.card(2, head(texts.text("sheet.spread"), spreadUnit), spread);
    precision.setMinHeight(Region.USE_PREF_SIZE);
    getChildren().addAll(bias, precision, words());
    model.picture().addListener((picture, before, now) -> show(now));
    follow(model.findings());
    follow(model.notes());
    follow(model.risks());
    ObservableValue<SheetState> state = model.state();
    state.addListener((sheet, before, now) -> say());
  }

  private static HBox head(String title, Label right) {
    HBox head = new HBox(8, Panes.label(title, "heading"), Panes.spring(), right);
    head.setAlignment(Pos.BASELINE_LEFT);
    return head;
  }

  private ScrollPane words() {
    said.getStyleClass().add("words");
    said.setFillWidth(true);
    said.setId("findings");
    ScrollPane scroll = new ScrollPane(said);
    scroll.setFitToWidth(true);
    scroll.getStyleClass().add("boxed");
    scroll.setMinHeight(90);
    scroll.setPrefHeight(215);
    scroll.setAccessibleText(texts.text("sheet.findings"));
    return scroll;
  }

  private void follow(ObservableList<String> sentences) {
    sentences.addListener((ListChangeListener<String>) change -> say());
  }

  private void show(PointPicture picture) {
    String unit = model.state().get().unit();
    Labels labels = texts.labels(unit);
    String less = words.readingLess(model.point(), unit);
    readingLess.setText(picture.withTyped() ? texts.text("sheet.with-typed", less) : less);
    spreadUnit.setText(texts.text("sheet.spread-unit", UnitSymbols.of(unit)));
    beam.show(
        (size, measure) ->
            BeamPlot.draw(
                picture.question(), picture.readings(), picture.findings(), size, labels, measure));
    spread.show(
        (size, measure) ->
            SpreadBar.draw(picture.question(), picture.findings(), size, labels, measure));
  }

  private void say() {
    if (model.state().get() == null) {
      return;
    }
    said.getChildren().clear();
    Optional<Verdict> verdict = model.point().findings().flatMap(found -> found.verdict());
    boolean hindered = !model.state().get().sheet().obstacles().isEmpty();
    verdict
        .map(found -> StatusPill.of(hindered ? Optional.empty() : verdict, texts))
        .ifPresent(said.getChildren()::add);
    model.findings().forEach(sentence -> say(sentence, "strong"));
    model.notes().forEach(sentence -> say(sentence, "ink"));
    model.risks().forEach(sentence -> say(sentence, "quiet"));
  }

  private void say(String sentence, String style) {
    Label label = Panes.label(sentence, style);
    label.setWrapText(true);
    label.setMinHeight(Region.USE_PREF_SIZE);
    said.getChildren().add(label);
  }
}
