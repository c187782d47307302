package org.evenbeam.verification;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.math.BigDecimal;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.stream.Stream;
import org.evenbeam.stats.LimitTest;
import org.evenbeam.stats.StudentTTest;
import org.evenbeam.stats.VarianceTest;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * A hundred simulated samples, evaluated whole and held against high-precision arithmetic on the
 * decimals as typed: reference/r-grid/samples100_data.csv and samples100_decimal.csv (mpmath, 40
 * digits).
 */
class HundredSamplesTest {
  private static final Path FOLDER = Path.of("src/test/resources/reference/r-grid");
  private static final double RELATIVE = 1e-11;
  private static final double NEAR_ZERO = 1e-14;

  static Stream<Map<String, String>> samples() throws IOException {
    return rows("samples100_decimal.csv").stream();
  }

  private static List<Map<String, String>> rows(String file) throws IOException {
    List<String> lines =
        Files.readAllLines(FOLDER.resolve(file)).stream()
            .filter(line -> !line.startsWith("#"))
            .toList();
    String[] header = lines.get(0).split(",", -1);
    List<Map<String, String>> rows = new ArrayList<>();
    for (String line : lines.subList(1, lines.size())) {
      String[] cells = line.split(",", -1);
      Map<String, String> row = new LinkedHashMap<>();
      for (int i = 0; i < header.length; i++) {
        row.put(header[i], cells[i]);
      }
      rows.add(row);
    }
    return rows;
  }

  private static final class Readings {
    private static final Map<String, List<BigDecimal>> BY_ID = new HashMap<>();

    private Readings() {}

    static synchronized List<BigDecimal> of(String id) throws IOException {
      if (BY_ID.isEmpty()) {
        for (Map<String, String> row : rows("samples100_data.csv")) {
          BY_ID
              .computeIfAbsent(row.get("id"), key -> new ArrayList<>())
              .add(new BigDecimal(row.get("x")));
        }
      }
      return BY_ID.get(id);
    }
  }

  private static CheckPointFindings evaluate(Map<String, String> row) throws IOException {
    Optional<BigDecimal> limit = Optional.of(new BigDecimal(row.get("Delta")));
    Criteria criteria =
        new Criteria(
            limit,
            limit,
            Optional.of(new BigDecimal(row.get("sigma0"))),
            Double.parseDouble(row.get("alpha")),
            DecisionRule.GUARDED_ACCEPTANCE,
            DecisionRule.GUARDED_REJECTION,
            true);
    CheckPointQuestion question =
        new CheckPointQuestion(
            row.get("id"),
            Reference.takenAsExact(new BigDecimal(row.get("mu0"))),
            Optional.empty(),
            criteria,
            OptionalInt.empty());
    return CheckPointEvaluation.of(question, Readings.of(row.get("id")));
  }

  private static void same(String what, double found, String expected) {
    double value = new BigDecimal(expected).doubleValue();
    double allowed = Math.max(NEAR_ZERO, RELATIVE * Math.abs(value));
    assertThat(Math.abs(found - value))
        .as("%s: %s for %s", what, found, expected)
        .isLessThanOrEqualTo(allowed);
  }

  @ParameterizedTest
  @MethodSource("samples")
  void everyFigureAgreesWithTheDecimals(Map<String, String> row) throws IOException {
    CheckPointFindings found = evaluate(row);
    StudentTTest t = found.tTest().orElseThrow();
    LimitTest limit = found.biasFinding().test().orElseThrow();
    VarianceTest variance = found.precisionFinding().test().orElseThrow();

    assertThat(found.n()).isEqualTo(Integer.parseInt(row.get("n")));
    assertThat(found.mean()).isEqualTo(new BigDecimal(row.get("mean")).doubleValue());
    same("sd", found.standardDeviation().orElseThrow(), row.get("sd"));
    same("t", t.statistic(), row.get("t"));
    same("p", t.pTwoSided(), row.get("p_two"));
    same("p lower", limit.pLower(), row.get("tost_p_lower"));
    same("p upper", limit.pUpper(), row.get("tost_p_upper"));
    same("chi2", variance.statistic(), row.get("chi2"));
    same("chi2 lower", variance.pLower(), row.get("p_chi2_lower"));
    same("chi2 upper", variance.pUpper(), row.get("p_chi2_upper"));
    same("chi2 two", variance.pTwoSided(), row.get("p_chi2_two"));
  }
}
