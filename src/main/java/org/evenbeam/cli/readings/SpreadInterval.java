package org.evenbeam.cli.readings;

import java.util.List;
import org.evenbeam.stats.samplesize.ReadingsForSpread;
import org.evenbeam.stats.samplesize.ReadingsNeeded;
import org.evenbeam.wording.Words;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** For the interval of a standard deviation to be no wider than asked. */
@Command(
    name = "spread-interval",
    mixinStandardHelpOptions = true,
    description =
        "For the interval of a standard deviation to have no end farther off than this share of it.")
final class SpreadInterval extends Question {
  @Option(names = "--share", required = true, description = "Such as 0.2 for 20 %%; above 0.")
  private double share;

  SpreadInterval(Words words) {
    super(words);
  }

  @Override
  ReadingsNeeded answer() {
    return ReadingsForSpread.forInterval(share, alpha());
  }

  @Override
  List<String> assumptions() {
    return List.of("readings.independent-normal");
  }
}
