package org.evenbeam.exchange;

import java.math.BigDecimal;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import org.evenbeam.logbook.files.BadInput;
import org.evenbeam.verification.DecisionRule;
import org.evenbeam.verification.plan.Bounds;
import org.evenbeam.verification.plan.EnvironmentLimits;
import org.evenbeam.verification.plan.LimitTerms;
import org.evenbeam.verification.plan.PlanRevision;
import org.evenbeam.verification.plan.PlannedCheckPoint;

/** The tables of verification plans and their check points. */
final class PlanTables {
  private static final List<String> PLANS =
      List.of(
          "instrument",
          "title",
          "revision",
          "method",
          "interval_days",
          "temperature_low",
          "temperature_high",
          "humidity_low",
          "humidity_high",
          "pressure_low",
          "pressure_high");
  private static final List<String> CHECK_POINTS =
      List.of(
          "instrument",
          "title",
          "revision",
          "label",
          "nominal",
          "standard",
          "value_label",
          "readings",
          "max_bias",
          "max_bias_percent_of_reference",
          "max_standard_deviation",
          "max_standard_deviation_percent_of_reference",
          "alpha",
          "bias_rule",
          "precision_rule",
          "reference_left_out_because");

  private final Path folder;

  PlanTables(Path folder) {
    this.folder = folder;
  }

  List<PlanRevision> plans() {
    Map<List<String>, List<PlannedCheckPoint>> points =
        TableFile.read(folder.resolve("check_points.csv"), CHECK_POINTS).stream()
            .collect(
                Collectors.groupingBy(
                    PlanTables::key,
                    Collectors.mapping(PlanTables::checkPoint, Collectors.toList())));
    return TableFile.read(folder.resolve("plans.csv"), PLANS).stream()
        .map(row -> plan(row, points.getOrDefault(key(row), List.of())))
        .toList();
  }

  private static List<String> key(TableRow row) {
    return List.of(row.text("instrument"), row.text("title"), row.text("revision"));
  }

  private static PlanRevision plan(TableRow row, List<PlannedCheckPoint> points) {
    if (points.isEmpty()) {
      throw BadInput.range(row.place("title"), row.text("title"), "check_points.csv");
    }
    return new PlanRevision(
        row.text("instrument"),
        row.text("title"),
        count(row, "revision"),
        row.text("method"),
        count(row, "interval_days"),
        new EnvironmentLimits(
            bounds(row, "temperature"), bounds(row, "humidity"), bounds(row, "pressure")),
        points);
  }

  private static PlannedCheckPoint checkPoint(TableRow row) {
    Optional<LimitTerms> bias = limit(row, "max_bias");
    return new PlannedCheckPoint(
        row.text("label"),
        row.requiredNumber("nominal"),
        row.text("standard"),
        row.text("value_label"),
        count(row, "readings"),
        bias,
        bias,
        limit(row, "max_standard_deviation"),
        row.requiredNumber("alpha").doubleValue(),
        LaboratoryTables.constant(row, "bias_rule", DecisionRule.class),
        LaboratoryTables.constant(row, "precision_rule", DecisionRule.class),
        row.optional("reference_left_out_because"));
  }

  private static Optional<LimitTerms> limit(TableRow row, String column) {
    Optional<BigDecimal> absolute = row.positive(column);
    Optional<BigDecimal> percent = row.positive(column + "_percent_of_reference");
    return absolute.isEmpty() && percent.isEmpty()
        ? Optional.empty()
        : Optional.of(
            new LimitTerms(absolute, percent, Optional.empty(), LimitTerms.Combination.SUM));
  }

  private static Bounds bounds(TableRow row, String condition) {
    return new Bounds(row.number(condition + "_low"), row.number(condition + "_high"));
  }

  private static int count(TableRow row, String column) {
    BigDecimal number = row.requiredNumber(column);
    try {
      return number.intValueExact();
    } catch (ArithmeticException notWhole) {
      throw BadInput.range(row.place(column), row.text(column), "1, 2, 3 …");
    }
  }
}
