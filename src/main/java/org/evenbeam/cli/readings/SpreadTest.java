package org.evenbeam.cli.readings;

import java.util.List;
import org.evenbeam.stats.samplesize.ReadingsForSpread;
import org.evenbeam.stats.samplesize.ReadingsNeeded;
import org.evenbeam.wording.Words;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** For the variance test to show a standard deviation beyond its limit, or within it. */
@Command(
    name = "spread-test",
    mixinStandardHelpOptions = true,
    description = {
      "For the one-sided chi-square test at alpha to show a standard deviation beyond its limit",
      "(ratio above 1) or within it (ratio below 1) with the given power."
    })
final class SpreadTest extends Question {
  @Option(
      names = "--ratio",
      required = true,
      description = "True standard deviation over its limit; above 0, not 1.")
  private double ratio;

  @Option(
      names = "--power",
      defaultValue = "0.9",
      description = "Above 0 and below 1; by default ${DEFAULT-VALUE}.")
  private double power;

  SpreadTest(Words words) {
    super(words);
  }

  @Override
  ReadingsNeeded answer() {
    return ReadingsForSpread.forPower(ratio, alpha(), power);
  }

  @Override
  List<String> assumptions() {
    return List.of("readings.independent-normal");
  }
}
