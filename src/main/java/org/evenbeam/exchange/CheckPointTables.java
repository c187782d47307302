package org.evenbeam.exchange;

import java.math.BigDecimal;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import org.evenbeam.logbook.files.BadInput;
import org.evenbeam.logbook.files.CheckPointFiles;
import org.evenbeam.stats.Arguments;
import org.evenbeam.verification.CheckPointQuestion;
import org.evenbeam.verification.Criteria;
import org.evenbeam.verification.DecisionRule;
import org.evenbeam.verification.Reference;

/** Check points and readings from two CSV files. */
public final class CheckPointTables implements CheckPointFiles {
  private static final String CHECK_POINT = "check_point";
  private static final String READING = "reading";
  private static final String VALUE = "reference_value";
  private static final String UNCERTAINTY = "reference_standard_uncertainty";
  private static final String DEGREES = "reference_degrees_of_freedom";
  private static final String RESOLUTION = "resolution";
  private static final String MAX_BIAS = "max_bias";
  private static final String MAX_DEVIATION = "max_standard_deviation";
  private static final String ALPHA = "alpha";
  private static final String BIAS_RULE = "bias_rule";
  private static final String PRECISION_RULE = "precision_rule";
  private static final List<String> CHECK_POINT_HEADER =
      List.of(
          CHECK_POINT,
          VALUE,
          UNCERTAINTY,
          DEGREES,
          RESOLUTION,
          MAX_BIAS,
          MAX_DEVIATION,
          ALPHA,
          BIAS_RULE,
          PRECISION_RULE);
  private static final List<String> READING_HEADER = List.of(CHECK_POINT, READING);
  private static final double USUAL_ALPHA = 0.05;
  private static final double FEWEST_DEGREES = 0.5;
  private static final Map<String, DecisionRule> RULES =
      Map.of(
          "guarded-acceptance", DecisionRule.GUARDED_ACCEPTANCE,
          "guarded-rejection", DecisionRule.GUARDED_REJECTION,
          "simple-acceptance", DecisionRule.SIMPLE_ACCEPTANCE);

  private record Pending(TableRow row, CheckPointQuestion question, List<BigDecimal> readings) {}

  @Override
  public List<Case> read(Path checkPoints, Path readings) {
    Map<String, Pending> pending = new LinkedHashMap<>();
    for (TableRow row : TableFile.read(checkPoints, CHECK_POINT_HEADER)) {
      CheckPointQuestion question = question(row);
      Pending other =
          pending.putIfAbsent(question.label(), new Pending(row, question, new ArrayList<>()));
      if (other != null) {
        throw BadInput.twice(row.place(CHECK_POINT), question.label());
      }
    }
    for (TableRow row : TableFile.read(readings, READING_HEADER)) {
      String label = row.text(CHECK_POINT);
      Pending known = pending.get(label);
      if (known == null) {
        throw BadInput.unknown(row.place(CHECK_POINT), label, checkPoints);
      }
      known.readings().add(row.requiredNumber(READING));
    }
    return pending.values().stream().map(point -> complete(point, readings)).toList();
  }

  private static Case complete(Pending point, Path readings) {
    if (point.readings().isEmpty()) {
      throw BadInput.noReadings(point.row().place(CHECK_POINT), point.question().label(), readings);
    }
    return new Case(point.question(), point.readings());
  }

  private static CheckPointQuestion question(TableRow row) {
    return new CheckPointQuestion(
        row.text(CHECK_POINT),
        reference(row),
        row.positive(RESOLUTION),
        criteria(row),
        OptionalInt.empty());
  }

  private static Reference reference(TableRow row) {
    BigDecimal value = row.requiredNumber(VALUE);
    Optional<BigDecimal> uncertainty = row.number(UNCERTAINTY);
    if (uncertainty.isPresent() && uncertainty.get().signum() < 0) {
      throw BadInput.range(row.place(UNCERTAINTY), row.text(UNCERTAINTY), "0 …");
    }
    double degrees =
        row.number(DEGREES).map(BigDecimal::doubleValue).orElse(Double.POSITIVE_INFINITY);
    if (degrees < FEWEST_DEGREES) {
      throw BadInput.range(row.place(DEGREES), row.text(DEGREES), "0.5 …");
    }
    return uncertainty
        .map(u -> new Reference(value, u.doubleValue(), degrees, true))
        .orElseGet(() -> Reference.takenAsExact(value));
  }

  private static Criteria criteria(TableRow row) {
    Optional<BigDecimal> bias = row.positive(MAX_BIAS);
    double alpha = row.number(ALPHA).map(BigDecimal::doubleValue).orElse(USUAL_ALPHA);
    if (!(alpha >= Arguments.SMALLEST_ALPHA && alpha <= Arguments.LARGEST_ALPHA)) {
      throw BadInput.range(row.place(ALPHA), row.text(ALPHA), "1e-12 … 0.5");
    }
    return new Criteria(
        bias,
        bias,
        row.positive(MAX_DEVIATION),
        alpha,
        rule(row, BIAS_RULE, DecisionRule.GUARDED_ACCEPTANCE),
        rule(row, PRECISION_RULE, DecisionRule.GUARDED_REJECTION),
        true);
  }

  private static DecisionRule rule(TableRow row, String column, DecisionRule usual) {
    Optional<String> name = row.optional(column);
    if (name.isPresent() && !RULES.containsKey(name.get())) {
      throw BadInput.range(
          row.place(column),
          name.get(),
          String.join(", ", RULES.keySet().stream().sorted().toList()));
    }
    return name.map(RULES::get).orElse(usual);
  }
}
