package org.evenbeam.cli;

import java.nio.file.Path;
import java.util.concurrent.Callable;
import org.evenbeam.cli.readings.ReadingsNeededCommand;
import org.evenbeam.logbook.files.CheckPointFiles;
import org.evenbeam.logbook.files.WeighingFiles;
import org.evenbeam.wording.Figures;
import org.evenbeam.wording.Problems;
import org.evenbeam.wording.Sentences;
import org.evenbeam.wording.Words;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** The program's command: without a subcommand it opens the window. */
@Command(
    name = "evenbeam",
    mixinStandardHelpOptions = true,
    versionProvider = EvenbeamCommand.Version.class,
    description = {
      "Instrument-verification logbook for the laboratory bench.",
      "Without a command, opens the window on the laboratory's own logbook.",
      "A verification is not an accredited calibration; laws and local codes go first."
    })
public final class EvenbeamCommand implements Callable<Integer> {
  /**
   * What the commands need from outside.
   *
   * @param files reads check points and readings
   * @param weighings reads weighings of water
   * @param demonstration makes the demonstration laboratory
   * @param window opens the window on a laboratory's folder, or on the usual one for null; returns
   *     the exit status
   */
  public record Parts(
      CheckPointFiles files,
      WeighingFiles weighings,
      DemonstrationFactory demonstration,
      WindowOpener window) {}

  /** Makes the demonstration laboratory. */
  @FunctionalInterface
  public interface DemonstrationFactory {
    /**
     * The demonstration laboratory.
     *
     * @param folderOrNull where it lies; null for the usual place
     * @param fresh whether to put it back to its start
     */
    Demonstration in(Path folderOrNull, boolean fresh);
  }

  /** Opens the window. */
  @FunctionalInterface
  public interface WindowOpener {
    /** Opens it on that folder, or on the usual one for null, and returns the exit status. */
    int open(Path folderOrNull);
  }

  @Option(
      names = "--laboratory",
      paramLabel = "FOLDER",
      description = "The laboratory's folder; by default in the user's data folder.")
  private Path folder;

  private final WindowOpener window;

  private EvenbeamCommand(WindowOpener window) {
    this.window = window;
  }

  /** The command line over those parts, speaking that language. */
  public static CommandLine of(Parts parts, Words words, Figures figures) {
    Sentences sentences = new Sentences(words, figures);
    CommandLine line = new CommandLine(new EvenbeamCommand(parts.window()));
    line.addSubcommand(new EvaluateCommand(parts.files(), sentences));
    line.addSubcommand(new DemoCommand(parts.demonstration(), words, sentences));
    line.addSubcommand(ReadingsNeededCommand.of(words));
    line.addSubcommand(new VolumesCommand(parts.weighings(), words, figures));
    line.setExecutionExceptionHandler(new Failure(new Problems(words)));
    return line;
  }

  @Override
  public Integer call() {
    return window.open(folder);
  }

  /** The version from the jar, or that this is a build from source. */
  static final class Version implements CommandLine.IVersionProvider {
    @Override
    public String[] getVersion() {
      String version = EvenbeamCommand.class.getPackage().getImplementationVersion();
      return new String[] {"Evenbeam " + (version == null ? "(from source)" : version)};
    }
  }
}
