package org.evenbeam.cli;

import java.io.PrintWriter;
import org.evenbeam.logbook.LogbookException;
import org.evenbeam.wording.Problems;
import picocli.CommandLine;
import picocli.CommandLine.IExecutionExceptionHandler;
import picocli.CommandLine.ParseResult;

/** Says what was refused or failed in one sentence; what nobody foresaw is passed on. */
final class Failure implements IExecutionExceptionHandler {
  /** Bad input, or a logbook that cannot be used as asked. */
  static final int STATUS = 2;

  private final Problems problems;

  Failure(Problems problems) {
    this.problems = problems;
  }

  @Override
  public int handleExecutionException(Exception thrown, CommandLine line, ParseResult parsed)
      throws Exception {
    if (!(thrown instanceof LogbookException refused)) {
      throw thrown;
    }
    PrintWriter errors = line.getErr();
    errors.println(problems.sentence(refused.key(), refused.arguments()));
    errors.flush();
    return STATUS;
  }
}
