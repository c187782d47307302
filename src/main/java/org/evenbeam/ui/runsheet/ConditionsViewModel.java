package org.evenbeam.ui.runsheet;

import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import org.evenbeam.metrology.NumberRefused;
import org.evenbeam.metrology.TypedDecimal;
import org.evenbeam.ui.common.ScreenTexts;
import org.evenbeam.verification.Condition;
import org.evenbeam.verification.plan.Conditions;

/** The conditions of the room as they are typed. */
public final class ConditionsViewModel {
  private final ScreenTexts texts;
  private final Consumer<Conditions> record;
  private final Map<Condition, StringProperty> typed = new EnumMap<>(Condition.class);
  private final StringProperty problem = new SimpleStringProperty("");
  private Conditions recorded = Conditions.NONE;

  ConditionsViewModel(ScreenTexts texts, Consumer<Conditions> record) {
    this.texts = texts;
    this.record = record;
    for (Condition condition : Condition.values()) {
      typed.put(condition, new SimpleStringProperty(""));
    }
  }

  /** Shows what is recorded; a field that was changed and not recorded yet stays as it is. */
  void show(Conditions now) {
    for (Condition condition : Condition.values()) {
      boolean untouched = text(condition).equals(shown(recorded, condition));
      if (untouched) {
        typed.get(condition).set(shown(now, condition));
      }
    }
    recorded = now;
  }

  /**
   * Records what is typed, where it differs from what is recorded; bad numbers stay to be mended.
   */
  public void commit() {
    problem.set("");
    try {
      Conditions now =
          new Conditions(
              number(Condition.TEMPERATURE),
              number(Condition.HUMIDITY),
              number(Condition.PRESSURE));
      if (!now.equals(recorded)) {
        record.accept(now);
      }
    } catch (NumberRefused why) {
      problem.set(texts.problem("condition-refused", why.reason(), why.text()));
    }
  }

  private Optional<TypedDecimal> number(Condition condition) {
    String text = text(condition);
    return text.isEmpty() ? Optional.empty() : Optional.of(TypedDecimal.parse(text, texts.sign()));
  }

  private String text(Condition condition) {
    return typed.get(condition).get().strip();
  }

  private static String shown(Conditions conditions, Condition condition) {
    return conditions.value(condition).map(TypedDecimal::text).orElse("");
  }

  /** What is typed for one condition. */
  public StringProperty typed(Condition condition) {
    return typed.get(condition);
  }

  /** Why what is typed was not recorded; empty for nothing. */
  public StringProperty problem() {
    return problem;
  }
}
