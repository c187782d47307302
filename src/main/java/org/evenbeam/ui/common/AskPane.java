package org.evenbeam.ui.common;

import java.util.ArrayList;
import java.util.List;
import java.util.function.BiConsumer;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import javafx.geometry.Pos;
import javafx.scene.AccessibleRole;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.PasswordField;
import javafx.scene.control.TextField;
import javafx.scene.input.KeyCode;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;

/**
 * Asks for a few texts over its screen, such as a reason or a password, before something is done.
 * It stays open with the answers in it until what was asked for has worked or the person cancels.
 */
public final class AskPane extends StackPane {
  /**
   * What is asked.
   *
   * @param title what will be done
   * @param explanation what that means; may be empty
   * @param fields the names of the texts asked for
   * @param confirm the name of the button that does it
   */
  public record Question(String title, String explanation, List<Field> fields, String confirm) {
    /** Keeps the fields unchangeable. */
    public Question {
      fields = List.copyOf(fields);
    }
  }

  /**
   * One text asked for.
   *
   * @param name its name
   * @param initial what stands in it at first
   * @param secret whether it is a password
   */
  public record Field(String name, String initial, boolean secret) {
    /** A password. */
    public static Field password(String name) {
      return new Field(name, "", true);
    }

    /** A text. */
    public static Field text(String name) {
      return new Field(name, "", false);
    }
  }

  private final Node content;
  private final String cancel;
  private final StringProperty problem = new SimpleStringProperty("");
  private final StackPane veil = new StackPane();
  private Node focusBefore;

  /** Lies over that content. */
  public AskPane(Node content, String cancel) {
    this.content = content;
    this.cancel = cancel;
    veil.getStyleClass().add("veil");
    veil.setVisible(false);
    getChildren().addAll(content, veil);
  }

  /**
   * Asks.
   *
   * @param answered takes the answers in the fields' order, and what to run once it has worked
   */
  public void ask(Question question, BiConsumer<List<String>, Runnable> answered) {
    problem.set("");
    focusBefore = getScene() == null ? null : getScene().getFocusOwner();
    List<TextField> fields = new ArrayList<>();
    VBox card = Panes.card(12);
    card.setMaxSize(460, Region.USE_PREF_SIZE);
    card.setAccessibleRole(AccessibleRole.DIALOG);
    card.setAccessibleText(question.title());
    card.getChildren().add(Panes.label(question.title(), "heading"));
    card.getChildren()
        .add(Panes.following(new SimpleStringProperty(question.explanation()), "quiet"));
    question.fields().forEach(field -> card.getChildren().add(input(field, fields)));
    Runnable confirm = () -> answered.accept(texts(fields), this::close);
    Button button = Panes.button(question.confirm(), confirm, "accent");
    button.setId("confirm");
    for (int i = 0; i < fields.size(); i++) {
      Runnable next = i + 1 < fields.size() ? fields.get(i + 1)::requestFocus : confirm;
      fields.get(i).setOnAction(event -> next.run());
    }
    HBox buttons = new HBox(8, Panes.spring(), Panes.button(cancel, this::close), button);
    buttons.setAlignment(Pos.CENTER_RIGHT);
    card.getChildren().addAll(Panes.problem(problem), buttons);
    open(card, fields.isEmpty() ? button : fields.get(0));
  }

  /** Says what went wrong with the answers; they stay. */
  public StringProperty problem() {
    return problem;
  }

  /** Whether it is asking. */
  public boolean isAsking() {
    return veil.isVisible();
  }

  private void open(Node card, Node first) {
    content.setDisable(true);
    veil.getChildren().setAll(card);
    veil.setVisible(true);
    card.setOnKeyPressed(
        event -> {
          if (event.getCode() == KeyCode.ESCAPE) {
            close();
            event.consume();
          }
        });
    first.requestFocus();
  }

  private void close() {
    veil.setVisible(false);
    veil.getChildren().clear();
    content.setDisable(false);
    if (focusBefore != null) {
      focusBefore.requestFocus();
    }
  }

  private static Node input(Field field, List<TextField> fields) {
    TextField input = field.secret() ? new PasswordField() : new TextField();
    input.setText(field.initial());
    fields.add(input);
    return Panes.named(field.name(), input);
  }

  private static List<String> texts(List<TextField> fields) {
    return fields.stream().map(TextField::getText).toList();
  }
}
