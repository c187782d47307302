package org.evenbeam.cli.readings;

import java.util.List;
import org.evenbeam.stats.samplesize.ReadingsForMean;
import org.evenbeam.stats.samplesize.ReadingsNeeded;
import org.evenbeam.wording.Words;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** For the one-sample t test to find a bias. */
@Command(
    name = "mean-test",
    mixinStandardHelpOptions = true,
    description = "For the one-sample t test at alpha to find a bias with the given power.")
final class MeanTest extends Question {
  @Option(names = "--bias", required = true, description = "The bias to be found, above 0.")
  private double bias;

  @Option(
      names = "--standard-deviation",
      required = true,
      description = "Of a single reading, above 0.")
  private double standardDeviation;

  @Option(
      names = "--power",
      defaultValue = "0.9",
      description = "Above 0 and below 1; by default ${DEFAULT-VALUE}.")
  private double power;

  @Option(names = "--one-sided", description = "Only biases on one side are looked for.")
  private boolean oneSided;

  MeanTest(Words words) {
    super(words);
  }

  @Override
  ReadingsNeeded answer() {
    return oneSided
        ? ReadingsForMean.forOneSidedPower(bias, standardDeviation, alpha(), power)
        : ReadingsForMean.forTwoSidedPower(bias, standardDeviation, alpha(), power);
  }

  @Override
  List<String> assumptions() {
    return List.of(
        "readings.independent-normal", "readings.planning-sd", "readings.reference-exact");
  }
}
