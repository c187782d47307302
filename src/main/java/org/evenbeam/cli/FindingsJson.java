package org.evenbeam.cli;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import org.evenbeam.stats.CombinedUncertainty;
import org.evenbeam.stats.Interval;
import org.evenbeam.stats.LimitTest;
import org.evenbeam.stats.Shown;
import org.evenbeam.stats.StandardDeviationBounds;
import org.evenbeam.stats.StudentTTest;
import org.evenbeam.stats.VarianceTest;
import org.evenbeam.verification.BiasFinding;
import org.evenbeam.verification.CheckPointFindings;
import org.evenbeam.verification.PrecisionFinding;
import org.evenbeam.verification.Verdict;
import org.evenbeam.wording.Sentences;

/**
 * Findings as JSON, every figure with 17 significant digits, so that the double can be read back
 * exactly. What does not exist is null; infinite degrees of freedom, for which JSON has no number,
 * are null too, and a note says so.
 */
final class FindingsJson {
  private static final ObjectMapper MAPPER = new ObjectMapper();
  private static final JsonNodeFactory NODES = JsonNodeFactory.instance;

  private final Sentences sentences;

  FindingsJson(Sentences sentences) {
    this.sentences = sentences;
  }

  /** One array, an object for each check point. */
  String of(List<CheckPointFindings> findings) {
    ArrayNode array = NODES.arrayNode();
    findings.forEach(found -> array.add(checkPoint(found)));
    try {
      return MAPPER.writerWithDefaultPrettyPrinter().writeValueAsString(array);
    } catch (JsonProcessingException impossible) {
      throw new UncheckedIOException(impossible);
    }
  }

  private ObjectNode checkPoint(CheckPointFindings found) {
    ObjectNode node = NODES.objectNode();
    node.put("check_point", found.question().label());
    node.put("n", found.n());
    JsonNumbers.put(node, "mean", found.mean());
    JsonNumbers.put(node, "standard_deviation", found.standardDeviation());
    JsonNumbers.put(node, "bias", found.bias());
    node.set("t_test", tTest(found));
    node.set("bias_limit", biasLimit(found.biasFinding()));
    node.set("variance_test", varianceTest(found));
    FitnessJson.put(node, found.fitness());
    node.set("risk", RiskJson.of(found));
    putVerdict(node, "verdict", found.verdict());
    ArrayNode notes = node.putArray("notes");
    if (found.fitness().tooCoarse()) {
      notes.add(sentences.notAskedTooCoarse());
    }
    found.notes().forEach(note -> notes.add(sentences.notes().sentence(note, "")));
    boolean infinite =
        found
            .biasFinding()
            .uncertainty()
            .filter(u -> Double.isInfinite(u.degreesOfFreedom()))
            .isPresent();
    if (infinite) {
      notes.add(sentences.infiniteDegreesOfFreedom());
    }
    return node;
  }

  private static ObjectNode tTest(CheckPointFindings found) {
    Optional<StudentTTest> test = found.tTest();
    ObjectNode node = NODES.objectNode();
    JsonNumbers.put(node, "statistic", test.map(StudentTTest::statistic));
    putDegrees(node, "degrees_of_freedom", found.n());
    JsonNumbers.put(node, "p_two_sided", test.map(StudentTTest::pTwoSided));
    put(node, test.map(StudentTTest::interval));
    return node;
  }

  private static ObjectNode biasLimit(BiasFinding finding) {
    Optional<LimitTest> test = finding.test();
    ObjectNode node = NODES.objectNode();
    JsonNumbers.put(
        node,
        "standard_uncertainty",
        finding.uncertainty().map(CombinedUncertainty::standardUncertainty));
    JsonNumbers.put(
        node,
        "effective_degrees_of_freedom",
        finding.uncertainty().map(CombinedUncertainty::degreesOfFreedom));
    JsonNumbers.put(node, "p_lower", test.map(LimitTest::pLower));
    JsonNumbers.put(node, "p_upper", test.map(LimitTest::pUpper));
    put(node, finding.interval());
    putShown(node, finding.shown());
    putVerdict(node, "outcome", finding.outcome());
    return node;
  }

  private static ObjectNode varianceTest(CheckPointFindings found) {
    PrecisionFinding finding = found.precisionFinding();
    Optional<VarianceTest> test = finding.test();
    ObjectNode node = NODES.objectNode();
    JsonNumbers.put(node, "statistic", test.map(VarianceTest::statistic));
    putDegrees(node, "degrees_of_freedom", found.n());
    JsonNumbers.put(node, "p_lower", test.map(VarianceTest::pLower));
    JsonNumbers.put(node, "p_upper", test.map(VarianceTest::pUpper));
    JsonNumbers.put(node, "p_two_sided", test.map(VarianceTest::pTwoSided));
    put(node, finding.bounds().map(StandardDeviationBounds::interval));
    JsonNumbers.put(node, "upper_bound", finding.upperBound());
    JsonNumbers.put(node, "lower_bound", finding.lowerBound());
    putShown(node, finding.shown());
    putVerdict(node, "outcome", finding.outcome());
    return node;
  }

  private static void put(ObjectNode node, Optional<Interval> interval) {
    JsonNumbers.put(node, "interval_low", interval.map(Interval::low));
    JsonNumbers.put(node, "interval_high", interval.map(Interval::high));
  }

  /** One reading has no degrees of freedom. */
  private static void putDegrees(ObjectNode node, String name, int n) {
    JsonNumbers.put(node, name, n > 1 ? OptionalDouble.of(n - 1) : OptionalDouble.empty());
  }

  private static void putShown(ObjectNode node, Optional<Shown> shown) {
    node.put("shown", shown.map(s -> s.name().toLowerCase(Locale.ROOT)).orElse(null));
  }

  private static void putVerdict(ObjectNode node, String name, Optional<Verdict> verdict) {
    node.put(name, verdict.map(v -> v.name().replace('_', ' ')).orElse(null));
  }
}
