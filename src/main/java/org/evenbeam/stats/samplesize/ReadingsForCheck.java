package org.evenbeam.stats.samplesize;

import java.util.function.IntPredicate;
import org.evenbeam.stats.Arguments;
import org.evenbeam.stats.risk.BiasCriterion;
import org.evenbeam.stats.risk.CheckDesign;
import org.evenbeam.stats.risk.DetectableChange;
import org.evenbeam.stats.risk.OperatingCharacteristic;

/**
 * Readings needed for a check to find a fault and to pass a faultless instrument. Under guarded
 * acceptance too few readings pass hardly anyone and so miss nothing; hence both are asked. The
 * chances need not be monotone in n, so each n is looked at in turn.
 */
public final class ReadingsForCheck {
  /** The most readings that it looks at. */
  public static final int CAP = 500;

  private final CheckDesign design;
  private final double sigma;
  private final double wantedPass;

  private ReadingsForCheck(CheckDesign design, double sigma, double wantedPass) {
    this.design = design;
    this.sigma = sigma;
    this.wantedPass = wantedPass;
  }

  /**
   * Asks for a design, whose own number of readings does not count.
   *
   * @param sigma the assumed standard deviation of a faultless instrument
   * @param wantedPass the chance with which an instrument without bias shall pass, above 0 and
   *     below 1
   * @throws IllegalArgumentException if an argument is outside its range
   */
  public static ReadingsForCheck of(CheckDesign design, double sigma, double wantedPass) {
    Arguments.positive("sigma", sigma);
    Arguments.probability("wantedPass", wantedPass);
    return new ReadingsForCheck(design, sigma, wantedPass);
  }

  /**
   * For a bias of this size to be missed with a chance of at most a tenth, on each side that has a
   * limit.
   *
   * @throws IllegalArgumentException if {@code bias} is not above zero, or no bias is judged
   */
  public ReadingsNeeded toFindBias(double bias) {
    Arguments.positive("bias", bias);
    if (design.bias().isEmpty()) {
      throw new IllegalArgumentException("the design judges no bias");
    }
    return search(n -> findsBias(n, bias, 1) && findsBias(n, bias, -1));
  }

  /**
   * For a standard deviation of this size to be missed with a chance of at most a tenth.
   *
   * @throws IllegalArgumentException if {@code faulty} is not above zero
   */
  public ReadingsNeeded toFindStandardDeviation(double faulty) {
    Arguments.positive("faulty", faulty);
    return search(n -> missesNoMore(n, 0, faulty));
  }

  private ReadingsNeeded search(IntPredicate findsFault) {
    int fewest = design.establishedSigma().isPresent() ? 1 : 2;
    for (int n = fewest; n <= CAP; n++) {
      if (chanceToPass(n, 0, sigma) >= wantedPass && findsFault.test(n)) {
        return new ReadingsNeeded.Enough(n);
      }
    }
    return new ReadingsNeeded.NotUpTo(CAP);
  }

  private boolean findsBias(int n, double bias, int side) {
    boolean limited =
        design
            .bias()
            .map(BiasCriterion::limits)
            .filter(limits -> Double.isFinite(side > 0 ? limits.above() : limits.below()))
            .isPresent();
    return !limited || missesNoMore(n, side * bias, sigma);
  }

  private boolean missesNoMore(int n, double bias, double trueSigma) {
    return chanceToPass(n, bias, trueSigma) <= DetectableChange.MISSED;
  }

  private double chanceToPass(int n, double bias, double trueSigma) {
    return OperatingCharacteristic.of(design.withReadings(n)).at(bias, trueSigma).conforms();
  }
}
