package org.evenbeam.cli.readings;

import java.util.List;
import java.util.OptionalInt;
import org.evenbeam.stats.failures.AcceptancePlan;
import org.evenbeam.stats.samplesize.ReadingsNeeded;
import org.evenbeam.wording.Words;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** For a number of failures to show that the failure rate is within its limit. */
@Command(
    name = "acceptance",
    mixinStandardHelpOptions = true,
    description =
        "Trials for this many failures to show at level 1 - alpha that the failure rate is within its limit.")
final class Acceptance extends Question {
  @Option(
      names = "--limit",
      required = true,
      description = "The maximum permissible failure rate, above 0 and below 1.")
  private double limit;

  @Option(
      names = "--failures",
      defaultValue = "0",
      description = "The acceptance number, 0 or more; by default ${DEFAULT-VALUE}.")
  private int failures;

  Acceptance(Words words) {
    super(words);
  }

  @Override
  ReadingsNeeded answer() {
    OptionalInt trials = AcceptancePlan.fewestTrials(failures, limit, alpha());
    return trials.isPresent()
        ? new ReadingsNeeded.Enough(trials.getAsInt())
        : new ReadingsNeeded.NotUpTo(AcceptancePlan.MOST);
  }

  @Override
  List<String> assumptions() {
    return List.of("readings.independent-trials");
  }
}
