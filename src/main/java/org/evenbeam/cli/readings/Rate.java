package org.evenbeam.cli.readings;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.evenbeam.stats.samplesize.ReadingsNeeded;
import org.evenbeam.stats.samplesize.TrialsForRate;
import org.evenbeam.wording.Words;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** For the interval of a failure rate to be no wider than asked. */
@Command(
    name = "rate",
    mixinStandardHelpOptions = true,
    description = "Trials for the interval of a failure rate to have at most this half-width.")
final class Rate extends Question {
  @Option(names = "--half-width", required = true, description = "Above 0 and below 1.")
  private double halfWidth;

  @Option(
      names = "--planning-value",
      description = "The rate expected, above 0 and below 1; by default the worst case is taken.")
  private Optional<Double> planningValue = Optional.empty();

  Rate(Words words) {
    super(words);
  }

  @Override
  ReadingsNeeded answer() {
    OptionalDouble planned =
        planningValue.isPresent() ? OptionalDouble.of(planningValue.get()) : OptionalDouble.empty();
    return TrialsForRate.forHalfWidth(planned, halfWidth, alpha());
  }

  @Override
  List<String> assumptions() {
    return List.of(
        "readings.independent-trials",
        "readings.normal-approximation",
        planningValue.isPresent() ? "readings.planning-rate" : "readings.worst-rate");
  }
}
