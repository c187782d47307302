package org.evenbeam.app;

import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import org.evenbeam.certificate.TemplatePress;
import org.evenbeam.cli.EvenbeamCommand;
import org.evenbeam.exchange.CheckPointTables;
import org.evenbeam.exchange.WeighingTable;
import org.evenbeam.logbook.certificates.CertificatePress;
import org.evenbeam.metrology.DecimalSign;
import org.evenbeam.wording.Figures;
import org.evenbeam.wording.Words;
import picocli.CommandLine;

/** The launcher. It loads no class of the toolkit before it is known that there is a display. */
public final class Main {
  private Main() {}

  /** Runs the command that the arguments name and ends with its exit status. */
  public static void main(String[] arguments) {
    Logs.onlyWarnings();
    System.exit(commandLine().execute(arguments));
  }

  private static CommandLine commandLine() {
    DataFolders folders = DataFolders.ofThisMachine();
    EvenbeamCommand.Parts parts =
        new EvenbeamCommand.Parts(
            new CheckPointTables(),
            new WeighingTable(),
            (folder, fresh) ->
                new DemonstrationLaboratory(
                    orElse(folder, folders.demonstration()), fresh, press()),
            folder -> new Window(orElse(folder, folders.laboratory()), press(), List.of()).open());
    return EvenbeamCommand.of(parts, new Words(Locale.ENGLISH), new Figures(DecimalSign.POINT));
  }

  private static CertificatePress press() {
    return new TemplatePress();
  }

  private static Path orElse(Path folder, Path usual) {
    return folder == null ? usual : folder;
  }
}
