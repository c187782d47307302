package org.evenbeam.cli;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ReadingsNeededCommandTest {

  private static Cli ask(String question) {
    return Cli.run(("readings-needed " + question).split(" ", -1));
  }

  /** R 4.2.2: power.t.test, the formula of the e-Handbook 7.2.4.2, and (1 - p)^n = alpha. */
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          mean-interval --standard-deviation 10 --half-width 2 --established | 97
          mean-interval --standard-deviation 10 --half-width 2               | 99
          mean-test --bias 1 --standard-deviation 1 --power 0.9              | 13
          rate --half-width 0.03                                             | 1068
          rate --half-width 0.05 --planning-value 0.1                        | 139
          acceptance --limit 0.1                                             | 29
          acceptance --limit 0.05                                            | 59
          acceptance --limit 0.01                                            | 299
          """)
  void knownNumbersComeOut(String question, int n) throws IOException {
    Cli cli = ask(question + " --json");

    JsonNode answer = new ObjectMapper().readTree(cli.out());
    assertThat(cli.exit()).as(cli.err()).isZero();
    assertThat(answer.get("n").asInt()).isEqualTo(n);
    assertThat(answer.get("assumptions")).isNotEmpty();
  }

  @Test
  void aCheckFindsItsTargetAndPassesTheFaultless() throws IOException {
    Cli cli =
        ask("check --max-bias 0.0005 --target-bias 0.0008 --standard-deviation 0.0003 --json");

    assertThat(cli.exit()).as(cli.err()).isZero();
    assertThat(new ObjectMapper().readTree(cli.out()).get("n").asInt()).isBetween(4, 12);
  }

  @Test
  void whatCannotBeReachedIsAnAnswer() {
    Cli cli =
        ask(
            "check --max-bias 1 --target-bias 1.01 --standard-deviation 1"
                + " --reference-standard-uncertainty 5");

    assertThat(cli.exit()).isEqualTo(1);
    assertThat(cli.out()).contains("No number up to").contains("Assumed");
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          mean-test --bias -1 --standard-deviation 1        | bias is -1.0
          mean-test --bias 1 --standard-deviation 1 --power 1 | power is 1.0
          mean-test --bias 1 --standard-deviation 1 --alpha 0.7 | alpha is 0.7
          spread-test --ratio 1                             | ratio is 1.0
          mean-test --bias x --standard-deviation 1         | --bias
          """)
  void badInputNamesTheArgument(String question, String message) {
    Cli cli = ask(question);

    assertThat(cli.exit()).isEqualTo(2);
    assertThat(cli.out()).isEmpty();
    assertThat(cli.err()).contains(message);
  }
}
