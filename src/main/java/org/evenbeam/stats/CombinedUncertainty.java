package org.evenbeam.stats;

import java.util.Arrays;
import java.util.List;

/**
 * The combined standard uncertainty of independent components, {@code u_c = sqrt(sum(u_i^2))} (JCGM
 * 100:2008, 5.1.2), with its effective degrees of freedom by the Welch-Satterthwaite formula,
 * {@code u_c^4 / sum(u_i^4 / nu_i)} (JCGM 100:2008, G.4.1, equation G.2b), not truncated.
 *
 * @param standardUncertainty u_c, 0 or more
 * @param degreesOfFreedom effective degrees of freedom; infinite where no component limits them
 */
public record CombinedUncertainty(double standardUncertainty, double degreesOfFreedom) {

  /** Combines components; without any, or with all of them zero, u_c is zero and known. */
  public static CombinedUncertainty of(List<UncertaintyComponent> components) {
    UncertaintyComponent largest = UncertaintyComponent.known(0);
    int felt = 0;
    for (UncertaintyComponent component : components) {
      felt += component.standardUncertainty() > 0 ? 1 : 0;
      largest =
          largest.standardUncertainty() < component.standardUncertainty() ? component : largest;
    }
    return felt > 1
        ? combined(components, largest.standardUncertainty())
        : new CombinedUncertainty(largest.standardUncertainty(), largest.degreesOfFreedom());
  }

  /** Combines components; see {@link #of(List)}. */
  public static CombinedUncertainty of(UncertaintyComponent... components) {
    return of(Arrays.asList(components));
  }

  /** Works on the components relative to the largest, so that no fourth power leaves the range. */
  private static CombinedUncertainty combined(
      List<UncertaintyComponent> components, double largest) {
    double squares = 0;
    double fourthPowers = 0;
    for (UncertaintyComponent component : components) {
      double relative = component.standardUncertainty() / largest;
      double square = relative * relative;
      squares += square;
      fourthPowers += square * square / component.degreesOfFreedom();
    }
    return new CombinedUncertainty(largest * Math.sqrt(squares), squares * squares / fourthPowers);
  }
}
