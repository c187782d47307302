package org.evenbeam.stats.samplesize;

import java.util.function.Predicate;
import org.evenbeam.stats.Arguments;
import org.evenbeam.stats.BiasLimits;
import org.evenbeam.stats.risk.BiasCharacteristic;
import org.evenbeam.stats.risk.CheckDesign;
import org.evenbeam.stats.risk.DetectableChange;
import org.evenbeam.stats.risk.OperatingCharacteristic;
import org.evenbeam.stats.risk.VerdictChances;

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
    return search(
        check -> {
          BiasCharacteristic faultless = check.atSigma(sigma);
          return passes(faultless.at(0)) && findsBias(faultless, bias);
        });
  }

  /**
   * For a standard deviation of this size to be missed with a chance of at most a tenth.
   *
   * @throws IllegalArgumentException if {@code faulty} is not above zero
   */
  public ReadingsNeeded toFindStandardDeviation(double faulty) {
    Arguments.positive("faulty", faulty);
    return search(check -> passes(check.at(0, sigma)) && found(check.at(0, faulty)));
  }

  private ReadingsNeeded search(Predicate<OperatingCharacteristic> enough) {
    int fewest = design.establishedSigma().isPresent() ? 1 : 2;
    for (int n = fewest; n <= CAP; n++) {
      if (enough.test(OperatingCharacteristic.of(design.withReadings(n)))) {
        return new ReadingsNeeded.Enough(n);
      }
    }
    return new ReadingsNeeded.NotUpTo(CAP);
  }

  private boolean findsBias(BiasCharacteristic check, double bias) {
    BiasLimits limits = design.bias().orElseThrow().limits();
    boolean above = Double.isInfinite(limits.above()) || found(check.at(bias));
    return above && (Double.isInfinite(limits.below()) || found(check.at(-bias)));
  }

  private boolean passes(VerdictChances faultless) {
    return faultless.conforms() >= wantedPass;
  }

  private static boolean found(VerdictChances faulty) {
    return faulty.conforms() <= DetectableChange.MISSED;
  }
}
