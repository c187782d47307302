package org.evenbeam.cli;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.util.Locale;
import org.evenbeam.exchange.CheckPointTables;
import org.evenbeam.exchange.WeighingTable;
import org.evenbeam.metrology.DecimalSign;
import org.evenbeam.wording.Figures;
import org.evenbeam.wording.Words;
import picocli.CommandLine;

/** Runs a command as from a shell and keeps what it printed. */
record Cli(int exit, String out, String err) {

  static Cli run(String... arguments) {
    CommandLine line =
        EvenbeamCommand.of(
            new EvenbeamCommand.Parts(
                new CheckPointTables(),
                new WeighingTable(),
                (folder, fresh) -> {
                  throw new AssertionError("no demonstration here");
                },
                folder -> {
                  throw new AssertionError("no window here");
                }),
            new Words(Locale.ENGLISH),
            new Figures(DecimalSign.POINT));
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    line.setOut(new PrintWriter(out)).setErr(new PrintWriter(err));
    int exit = line.execute(arguments);
    return new Cli(exit, out.toString(), err.toString());
  }
}
