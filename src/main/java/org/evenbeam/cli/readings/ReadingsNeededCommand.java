package org.evenbeam.cli.readings;

import org.evenbeam.wording.Words;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** How many readings are needed; the question is a command below it. */
@Command(
    name = "readings-needed",
    mixinStandardHelpOptions = true,
    description = {
      "How many readings or trials a question needs, always rounded up, with its assumptions.",
      "Exit status: 0 answered; 1 no number up to the cap reaches it; 2 bad input."
    })
public final class ReadingsNeededCommand implements Runnable {
  @Spec private CommandSpec spec;

  private ReadingsNeededCommand() {}

  /** The command with its questions, speaking that language. */
  public static CommandLine of(Words words) {
    CommandLine line = new CommandLine(new ReadingsNeededCommand());
    line.addSubcommand(new MeanInterval(words));
    line.addSubcommand(new MeanTest(words));
    line.addSubcommand(new Check(words));
    line.addSubcommand(new SpreadInterval(words));
    line.addSubcommand(new SpreadTest(words));
    line.addSubcommand(new Rate(words));
    line.addSubcommand(new Acceptance(words));
    line.setCaseInsensitiveEnumValuesAllowed(true);
    return line;
  }

  @Override
  public void run() {
    throw new ParameterException(spec.commandLine(), "Which question? See --help.");
  }
}
