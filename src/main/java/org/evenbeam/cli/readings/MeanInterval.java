package org.evenbeam.cli.readings;

import java.util.List;
import org.evenbeam.stats.samplesize.ReadingsForMean;
import org.evenbeam.stats.samplesize.ReadingsNeeded;
import org.evenbeam.wording.Words;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** For the confidence interval of a bias to be no wider than asked. */
@Command(
    name = "mean-interval",
    mixinStandardHelpOptions = true,
    description = "For the interval of a bias at level 1 - alpha to have at most this half-width.")
final class MeanInterval extends Question {
  @Option(
      names = "--standard-deviation",
      required = true,
      description = "Of a single reading, above 0.")
  private double standardDeviation;

  @Option(names = "--half-width", required = true, description = "In the same unit, above 0.")
  private double halfWidth;

  @Option(
      names = "--established",
      description = "The standard deviation is established beforehand: z in place of t.")
  private boolean established;

  MeanInterval(Words words) {
    super(words);
  }

  @Override
  ReadingsNeeded answer() {
    return established
        ? ReadingsForMean.forHalfWidth(standardDeviation, halfWidth, alpha())
        : ReadingsForMean.forHalfWidthByT(standardDeviation, halfWidth, alpha());
  }

  @Override
  List<String> assumptions() {
    return List.of(
        "readings.independent-normal",
        established ? "readings.established" : "readings.planning-sd",
        "readings.reference-exact");
  }
}
