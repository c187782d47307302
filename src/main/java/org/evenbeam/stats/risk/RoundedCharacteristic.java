package org.evenbeam.stats.risk;

import java.util.ArrayList;
import java.util.List;
import org.evenbeam.stats.Arguments;
import org.evenbeam.stats.Interval;

/**
 * The chances where readings are coarse, sigma being below the resolution: mean and standard
 * deviation then take few values and depend on each other and on where the true value lies between
 * two digits. Their joint distribution is exact up to about 50 readings, and more where sigma is
 * small. For still more, mean and standard deviation are taken as independent again, with the
 * moments of one rounded reading at each position; the chances are then within 0.005 for the bias
 * and 0.03 for the precision.
 *
 * <p>The average is taken at 32 positions, a true value being equally likely anywhere between two
 * digits; each stands for the step about it. Against ten times as many the chances differ by less
 * than 0.002.
 */
final class RoundedCharacteristic implements BiasCharacteristic {
  private static final int POSITIONS = 32;
  private static final int POSITIONS_OF_STEADY = 128;

  /** Below it, in units of the resolution, the chances change within a thirty-second of a digit. */
  private static final double STEADY = 0.2;

  private final List<Position> positions;
  private final double reference;
  private final double step;

  private RoundedCharacteristic(List<Position> positions, double reference, double step) {
    this.positions = positions;
    this.reference = reference;
    this.step = step;
  }

  /**
   * The chances at one position; {@code bias} and {@code deviation} are what it adds to the error.
   */
  record Position(
      PassingChance conforms, PassingChance notRejected, double bias, double deviation) {

    VerdictChances at(double trueBias, double otherDeviation, double step) {
      ErrorOfMean error = new ErrorOfMean(Math.hypot(deviation, otherDeviation), step);
      return VerdictChances.ofNested(
          conforms.at(trueBias + bias, error), notRejected.at(trueBias + bias, error));
    }
  }

  static RoundedCharacteristic of(
      CheckDesign design,
      PassingRegion conforming,
      PassingRegion notRejected,
      BiasMargin margin,
      double sigma) {
    double relative = sigma / design.resolution();
    RoundedPositions source =
        new RoundedPositions(design, conforming, notRejected, margin, relative);
    int count = relative < STEADY ? POSITIONS_OF_STEADY : POSITIONS;
    List<Position> positions = new ArrayList<>();
    boolean exact = DigitCounts.affordable(design.n(), relative);
    for (int i = 0; i < count / 2; i++) {
      double position = (i + 0.5) / count;
      positions.addAll(exact ? source.exact(position) : source.byMoments(position));
    }
    double step = design.resolution() / count;
    return new RoundedCharacteristic(positions, design.reference().standardUncertainty(), step);
  }

  @Override
  public VerdictChances at(double bias) {
    return average(bias, reference);
  }

  @Override
  public VerdictChances given(double bias, double referenceError) {
    Arguments.finite("referenceError", referenceError);
    return average(bias + referenceError * reference, 0);
  }

  @Override
  public Interval conformsByPosition(double bias) {
    Arguments.finite("bias", bias);
    double[] chances =
        positions.stream()
            .mapToDouble(position -> position.at(bias, reference, step).conforms())
            .sorted()
            .toArray();
    return new Interval(chances[0], chances[chances.length - 1]);
  }

  @Override
  public double referenceInOwn() {
    return reference / step;
  }

  private VerdictChances average(double bias, double deviation) {
    Arguments.finite("bias", bias);
    List<VerdictChances> each =
        positions.stream().map(position -> position.at(bias, deviation, step)).toList();
    double conforms = each.stream().mapToDouble(VerdictChances::conforms).average().orElseThrow();
    double rejected =
        each.stream().mapToDouble(VerdictChances::doesNotConform).average().orElseThrow();
    return VerdictChances.ofNested(conforms, 1 - rejected);
  }
}
