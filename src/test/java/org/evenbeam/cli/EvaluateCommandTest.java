package org.evenbeam.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class EvaluateCommandTest {
  private static final String HEADER =
      "check_point,reference_value,reference_standard_uncertainty,reference_degrees_of_freedom,"
          + "resolution,max_bias,max_standard_deviation,alpha,bias_rule,precision_rule\n";
  private static final String READINGS =
      "check_point,reading\na,20.0001\na,20.0003\na,19.9999\na,20.0002\n";

  @TempDir private Path folder;

  private Cli evaluate(String checkPoints, String readings) throws IOException {
    Path c = Files.writeString(folder.resolve("C.csv"), checkPoints);
    Path r = Files.writeString(folder.resolve("R.csv"), readings);
    return Cli.run(
        "evaluate", "--check-points", c.toString(), "--readings", r.toString(), "--json");
  }

  private static JsonNode only(Cli cli) throws IOException {
    JsonNode array = new ObjectMapper().readTree(cli.out());
    assertThat(array).hasSize(1);
    return array.get(0);
  }

  @Test
  void conformingReadingsExitWithZeroAndEveryFigure() throws IOException {
    Cli cli = evaluate(HEADER + "a,20,0.00002,,0.0001,0.0005,0.0005,,,\n", READINGS);

    JsonNode found = only(cli);
    assertThat(cli.exit()).as(cli.err()).isZero();
    assertThat(found.get("verdict").asText()).isEqualTo("CONFORMS");
    assertThat(found.get("mean").asDouble()).isEqualTo(20.000125);
    // R 4.2.2: sd(c(1,3,-1,2)*1e-4), t.test(c(1,3,-1,2)*1e-4)$p.value
    assertThat(found.at("/standard_deviation").asDouble())
        .isCloseTo(0.000170782512765993, within(1e-18));
    assertThat(found.at("/t_test/p_two_sided").asDouble())
        .isCloseTo(0.239442598636003, within(1e-13));
    assertThat(found.at("/bias_limit/shown").asText()).isEqualTo("within");
    assertThat(found.at("/bias_limit/effective_degrees_of_freedom").isNumber()).isTrue();
  }

  @Test
  void aReferenceWithoutUncertaintyIsTakenAsExactAndSaidSo() throws IOException {
    Cli cli = evaluate(HEADER + "a,20,,,0.0001,0.0005,,,,\n", READINGS);

    assertThat(only(cli).get("notes").toString()).contains("taken as exact");
  }

  @Test
  void nothingAskedGivesNoVerdictAndExitOne() throws IOException {
    Cli cli = evaluate(HEADER + "a,20,,,,,,,,\n", READINGS);

    assertThat(cli.exit()).isEqualTo(1);
    assertThat(only(cli).get("verdict").isNull()).isTrue();
    assertThat(only(cli).at("/variance_test/interval_low").isNumber()).isTrue();
    assertThat(only(cli).at("/variance_test/outcome").isNull()).isTrue();
  }

  @Test
  void oneReadingHasNoStandardDeviationAndNoVerdict() throws IOException {
    Cli cli =
        evaluate(HEADER + "a,20,,,0.0001,0.0005,0.0005,,,\n", "check_point,reading\na,20.0001\n");

    JsonNode found = only(cli);
    assertThat(cli.exit()).isEqualTo(1);
    assertThat(found.get("bias").asDouble()).isEqualTo(0.0001);
    assertThat(found.get("standard_deviation").isNull()).isTrue();
    assertThat(found.at("/t_test/statistic").isNull()).isTrue();
    assertThat(found.at("/bias_limit/outcome").isNull()).isTrue();
    assertThat(found.get("verdict").isNull()).isTrue();
    assertThat(found.get("notes").toString()).contains("at least two readings");
  }

  @Test
  void equalReadingsAreBoundedByTheResolution() throws IOException {
    Cli cli =
        evaluate(
            HEADER + "a,20,,,0.0001,0.0005,0.0005,,,\n",
            "check_point,reading\na,20.0001\na,20.0001\na,20.0001\n");

    JsonNode found = only(cli);
    assertThat(cli.exit()).isZero();
    assertThat(found.at("/t_test/statistic").isNull()).isTrue();
    // reference/r-grid/equal_readings_bound.csv, n = 3, alpha = 0.05: 1.32426259057 d
    assertThat(found.at("/variance_test/upper_bound").asDouble())
        .isCloseTo(0.000132426259057, within(1e-14));
    assertThat(found.at("/bias_limit/standard_uncertainty").asDouble())
        .isCloseTo(0.0001 / Math.sqrt(12), within(1e-18));
  }

  @Test
  void equalReadingsWithoutAResolutionHaveNoVerdict() throws IOException {
    Cli cli =
        evaluate(
            HEADER + "a,20,,,,0.0005,0.0005,,,\n",
            "check_point,reading\na,20.0001\na,20.0001\na,20.0001\n");

    assertThat(cli.exit()).isEqualTo(1);
    assertThat(only(cli).get("verdict").isNull()).isTrue();
    assertThat(only(cli).get("notes").toString()).contains("resolution is missing");
  }

  @Test
  void aLargeOffsetLosesNoDigit() throws IOException {
    Cli cli =
        evaluate(
            HEADER + "a,1000000000,,,,0.01,0.01,,,\n",
            "check_point,reading\na,1000000000.001\na,1000000000.003\na,999999999.998\n");

    // exact: deviations 1, 3, -2 thousandths; mean 2/3, variance 19/3
    assertThat(only(cli).get("bias").asDouble()).isEqualTo(2.0 / 3000);
    assertThat(only(cli).get("standard_deviation").asDouble())
        .isCloseTo(Math.sqrt(19.0 / 3) / 1000, within(1e-18));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      textBlock =
          """
          a,20,,,0.0001,0.0005,,,, | a,twenty            | R.csv, line 2, column 2 (reading)
          a,20,,,0.0001,0.0005,,,, | a,"1,234"           | decimal sign is not the one in use
          a,20,,,0.0001,0.0005,,,, | a,1,234             | R.csv, line 2, column 3
          a,20,,,0.0001,0.0005,,,, | a,NaN               | "NaN" was not taken as a number
          a,20,,,0.0001,0.0005,,,, | a,1e400             | outside 1e-150 to 1e150
          a,20,,,0.0001,0.0005,,,, | a,                  | nothing stands there
          a,20,,,0.0001,0.0005,,,, | b,20.1              | "b" is not in
          a,20,,,0.0001,-1,,,,     | a,20.1              | C.csv, line 2, column 6 (max_bias)
          a,20,,,0,0.0005,,,,      | a,20.1              | C.csv, line 2, column 5 (resolution)
          a,20,,,0.0001,0.0005,,0.7,, | a,20.1           | C.csv, line 2, column 8 (alpha)
          a,20,,,0.0001,0.0005,,,guess, | a,20.1         | guarded-acceptance, guarded-rejection
          a,20,-1,,0.0001,0.0005,,,, | a,20.1            | C.csv, line 2, column 3
          a,20,,0,0.0001,0.0005,,,, | a,20.1             | C.csv, line 2, column 4
          ,20,,,0.0001,0.0005,,,,  | a,20.1              | C.csv, line 2, column 1
          """)
  void badInputExitsWithTwoNamesThePlaceAndPrintsNothing(
      String checkPoint, String reading, String message) throws IOException {
    Cli cli = evaluate(HEADER + checkPoint + "\n", "check_point,reading\n" + reading + "\n");

    assertThat(cli.exit()).isEqualTo(2);
    assertThat(cli.out()).isEmpty();
    assertThat(cli.err()).contains(message);
  }

  @Test
  void emptyFilesAreRefused() throws IOException {
    assertThat(evaluate("", READINGS).err()).contains("C.csv, line 1, column 1");
    assertThat(evaluate(HEADER, READINGS).exit()).isEqualTo(2);
    assertThat(evaluate(HEADER + "a,20,,,,,,,,\n", "").err()).contains("R.csv, line 1, column 1");
  }

  @Test
  void aCheckPointWithoutReadingsIsRefused() throws IOException {
    Cli cli = evaluate(HEADER + "a,20,,,,,,,,\nb,30,,,,,,,,\n", READINGS);

    assertThat(cli.exit()).isEqualTo(2);
    assertThat(cli.err()).contains("line 3, column 1 (check_point): \"b\" has no reading");
  }

  @Test
  void aFileThatIsNotThereIsRefused() {
    Cli cli =
        Cli.run(
            "evaluate",
            "--check-points",
            folder.resolve("none.csv").toString(),
            "--readings",
            folder.resolve("none.csv").toString());

    assertThat(cli.exit()).isEqualTo(2);
    assertThat(cli.err()).contains("cannot be read");
  }

  @Test
  void withoutJsonTheFindingsAreSentences() throws IOException {
    Path c =
        Files.writeString(
            folder.resolve("C.csv"), HEADER + "a,20,0.00002,,0.0001,0.0005,0.0005,,,\n");
    Path r = Files.writeString(folder.resolve("R.csv"), READINGS);

    Cli cli = Cli.run("evaluate", "--check-points", c.toString(), "--readings", r.toString());

    assertThat(cli.out()).contains("a: CONFORMS").contains("By guarded acceptance: CONFORMS.");
  }
}
