package org.evenbeam.cli;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;
import org.evenbeam.wording.Sentences;
import org.evenbeam.wording.Words;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;

/** Opens the demonstration laboratory; without a display it does the same job and says so. */
@Command(
    name = "demo",
    mixinStandardHelpOptions = true,
    description = {
      "Opens the demonstration laboratory, an invented one.",
      "Without a display: imports its data, evaluates, writes its certificates and says where."
    })
final class DemoCommand implements Callable<Integer> {
  @Option(
      names = "--laboratory",
      paramLabel = "FOLDER",
      description =
          "Where the demonstration laboratory lies; by default in the user's data folder.")
  private Path folder;

  @Option(names = "--fresh", description = "Put it back to its start first.")
  private boolean fresh;

  @Option(names = "--headless", description = "Open no window, even where there is a display.")
  private boolean headless;

  @Spec private CommandSpec spec;

  private final EvenbeamCommand.DemonstrationFactory factory;
  private final Words words;
  private final Sentences sentences;

  DemoCommand(EvenbeamCommand.DemonstrationFactory factory, Words words, Sentences sentences) {
    this.factory = factory;
    this.words = words;
    this.sentences = sentences;
  }

  @Override
  public Integer call() {
    Demonstration demonstration = factory.in(folder, fresh);
    if (!headless && demonstration.hasDisplay()) {
      return demonstration.openWindow();
    }
    writeCertificates(demonstration);
    return 0;
  }

  private void writeCertificates(Demonstration demonstration) {
    PrintWriter out = spec.commandLine().getOut();
    String why = headless ? "demo.headless" : "demo.no-display";
    out.println(words.text(Words.Bundle.COMMAND, why));
    out.flush();
    List<Demonstration.Written> written = demonstration.writeCertificates();
    for (Demonstration.Written certificate : written) {
      out.println(
          "%s  %-8s  %-16s  %s"
              .formatted(
                  certificate.number(),
                  certificate.instrumentTag(),
                  sentences.verdict(certificate.verdict()),
                  certificate.file()));
    }
    out.println(words.text(Words.Bundle.COMMAND, "demo.written", Integer.toString(written.size())));
    out.flush();
  }
}
