package org.evenbeam.cli.readings;

import static org.evenbeam.wording.Words.Bundle.COMMAND;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.PrintWriter;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import org.evenbeam.stats.samplesize.ReadingsNeeded;
import org.evenbeam.wording.Words;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;

/** One question about a number of readings: answered, with its assumptions, as text or as JSON. */
abstract class Question implements Callable<Integer> {
  private static final int REACHED = 0;
  private static final int NOT_REACHED = 1;
  private static final int BAD_INPUT = 2;

  @Option(
      names = "--alpha",
      defaultValue = "0.05",
      description = "The risk accepted, 1e-12 to 0.5; by default ${DEFAULT-VALUE}.")
  private double alpha;

  @Option(names = "--json", description = "Print one JSON object.")
  private boolean json;

  @Spec private CommandSpec spec;

  private final Words words;

  Question(Words words) {
    this.words = words;
  }

  /** The risk accepted. */
  final double alpha() {
    return alpha;
  }

  /**
   * The answer.
   *
   * @throws IllegalArgumentException naming the argument that is outside its range
   */
  abstract ReadingsNeeded answer();

  /** The keys of the sentences that say what the answer takes for granted. */
  abstract List<String> assumptions();

  @Override
  public final Integer call() {
    ReadingsNeeded answer;
    try {
      answer = answer();
    } catch (IllegalArgumentException outside) {
      PrintWriter errors = spec.commandLine().getErr();
      errors.println(words.text(COMMAND, "readings.refused", outside.getMessage()));
      errors.flush();
      return BAD_INPUT;
    }
    PrintWriter out = spec.commandLine().getOut();
    out.println(json ? json(answer) : text(answer));
    out.flush();
    return answer instanceof ReadingsNeeded.Enough ? REACHED : NOT_REACHED;
  }

  private String text(ReadingsNeeded answer) {
    List<String> lines = new ArrayList<>();
    lines.add(sentence(answer));
    assumptions().forEach(key -> lines.add("  " + words.text(COMMAND, key)));
    return String.join(System.lineSeparator(), lines);
  }

  private String sentence(ReadingsNeeded answer) {
    return answer instanceof ReadingsNeeded.Enough enough
        ? words.text(COMMAND, "readings.enough", Integer.toString(enough.n()))
        : words.text(
            COMMAND,
            "readings.not-up-to",
            Integer.toString(((ReadingsNeeded.NotUpTo) answer).cap()));
  }

  private String json(ReadingsNeeded answer) {
    ObjectNode node = JsonNodeFactory.instance.objectNode();
    node.put("question", spec.name());
    Integer n = answer instanceof ReadingsNeeded.Enough enough ? Integer.valueOf(enough.n()) : null;
    node.put("n", n);
    node.put("answer", sentence(answer));
    ArrayNode assumptions = node.putArray("assumptions");
    assumptions().forEach(key -> assumptions.add(words.text(COMMAND, key)));
    return node.toPrettyString();
  }
}
