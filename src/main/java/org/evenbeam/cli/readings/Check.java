package org.evenbeam.cli.readings;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import org.evenbeam.stats.BiasLimits;
import org.evenbeam.stats.UncertaintyComponent;
import org.evenbeam.stats.risk.BiasCriterion;
import org.evenbeam.stats.risk.CheckDesign;
import org.evenbeam.stats.risk.DecisionRule;
import org.evenbeam.stats.samplesize.ReadingsForCheck;
import org.evenbeam.stats.samplesize.ReadingsNeeded;
import org.evenbeam.wording.Words;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** For a check point's bias criterion to find a fault and to pass a faultless instrument. */
@Command(
    name = "check",
    mixinStandardHelpOptions = true,
    description = {
      "For a bias criterion to miss a bias at most 1 time in 10,",
      "and to pass an instrument without bias with the given chance."
    })
final class Check extends Question {
  /** The rules, as options name them. */
  enum Rule {
    GUARDED_ACCEPTANCE,
    GUARDED_REJECTION,
    SIMPLE_ACCEPTANCE;

    @Override
    public String toString() {
      return name().toLowerCase(Locale.ROOT).replace('_', '-');
    }
  }

  @Option(names = "--max-bias", required = true, description = "The limit on both sides, above 0.")
  private double maxBias;

  @Option(names = "--target-bias", required = true, description = "The bias to be found, above 0.")
  private double targetBias;

  @Option(
      names = "--standard-deviation",
      required = true,
      description = "Of a single reading, above 0.")
  private double standardDeviation;

  @Option(
      names = "--reference-standard-uncertainty",
      defaultValue = "0",
      description = "0 or more; by default the reference is taken as exact.")
  private double referenceUncertainty;

  @Option(
      names = "--bias-rule",
      defaultValue = "guarded-acceptance",
      description = "${COMPLETION-CANDIDATES}; by default ${DEFAULT-VALUE}.")
  private Rule rule;

  @Option(
      names = "--pass",
      defaultValue = "0.9",
      description =
          "The chance with which an instrument without bias shall pass; ${DEFAULT-VALUE}.")
  private double pass;

  Check(Words words) {
    super(words);
  }

  @Override
  ReadingsNeeded answer() {
    BiasCriterion criterion =
        new BiasCriterion(
            BiasLimits.symmetric(maxBias), DecisionRule.valueOf(rule.name()), alpha());
    CheckDesign design =
        new CheckDesign(
            2,
            0,
            UncertaintyComponent.known(referenceUncertainty),
            true,
            OptionalDouble.empty(),
            Optional.of(criterion),
            Optional.empty());
    return ReadingsForCheck.of(design, standardDeviation, pass).toFindBias(targetBias);
  }

  @Override
  List<String> assumptions() {
    List<String> assumptions = new ArrayList<>();
    assumptions.add("readings.independent-normal");
    assumptions.add("readings.planning-sd");
    assumptions.add("readings.missed-tenth");
    assumptions.add(
        referenceUncertainty == 0 ? "readings.reference-exact" : "readings.reference-known");
    return assumptions;
  }
}
