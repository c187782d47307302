package org.evenbeam.cli;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.evenbeam.logbook.files.CheckPointFiles;
import org.evenbeam.verification.CheckPointEvaluation;
import org.evenbeam.verification.CheckPointFindings;
import org.evenbeam.verification.Verdict;
import org.evenbeam.wording.Sentences;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;

/** Evaluates check points from two files, without a logbook. */
@Command(
    name = "evaluate",
    mixinStandardHelpOptions = true,
    description = {
      "Evaluates readings against their check points, without a logbook.",
      "Exit status: 0 all conform; 1 some do not conform, are undecided or have no verdict; 2 bad input."
    })
final class EvaluateCommand implements Callable<Integer> {
  static final int ALL_CONFORM = 0;
  static final int NOT_ALL_CONFORM = 1;

  @Option(
      names = "--check-points",
      required = true,
      paramLabel = "FILE",
      description = "CSV: reference values, limits and rules, a row for each check point.")
  private Path checkPoints;

  @Option(
      names = "--readings",
      required = true,
      paramLabel = "FILE",
      description = "CSV: check_point,reading, in the order in which they were made.")
  private Path readings;

  @Option(names = "--json", description = "Print one JSON array, every figure in full.")
  private boolean json;

  @Spec private CommandSpec spec;

  private final CheckPointFiles files;
  private final Sentences sentences;

  EvaluateCommand(CheckPointFiles files, Sentences sentences) {
    this.files = files;
    this.sentences = sentences;
  }

  @Override
  public Integer call() {
    List<CheckPointFindings> found =
        files.read(checkPoints, readings).stream()
            .map(point -> CheckPointEvaluation.of(point.question(), point.readings()))
            .toList();
    print(found);
    boolean allConform =
        found.stream().allMatch(f -> f.verdict().equals(Optional.of(Verdict.CONFORMS)));
    return allConform ? ALL_CONFORM : NOT_ALL_CONFORM;
  }

  private void print(List<CheckPointFindings> found) {
    PrintWriter out = spec.commandLine().getOut();
    if (json) {
      out.println(new FindingsJson(sentences).of(found));
    } else {
      found.forEach(f -> new FindingsText(sentences).lines(f).forEach(out::println));
    }
    out.flush();
  }
}
