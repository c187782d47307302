package org.evenbeam.stats.risk;

import java.util.Collection;
import java.util.List;
import org.evenbeam.stats.Interval;

/**
 * The chance of each verdict of a whole run, the worst check point deciding: the run conforms where
 * all check points do, and does not where one does not. Check points judged against one reference
 * share its error, so their chances are multiplied for each error and then averaged over it; those
 * of different references are independent.
 */
public final class RunRisk {
  private static final Interval ERRORS = new Interval(-8.5, 8.5);
  private static final double PANEL = 3;

  private RunRisk() {}

  /**
   * The chances of the run.
   *
   * @param byReference the check points, those of one reference together; none may be empty
   */
  public static VerdictChances of(Collection<List<AssumedPoint>> byReference) {
    double conforms = 1;
    double notRejected = 1;
    for (List<AssumedPoint> sharing : byReference) {
      VerdictChances together = together(sharing);
      conforms *= together.conforms();
      notRejected *= 1 - together.doesNotConform();
    }
    return VerdictChances.ofNested(conforms, notRejected);
  }

  private static VerdictChances together(List<AssumedPoint> sharing) {
    if (sharing.size() == 1) {
      return sharing.get(0).characteristic().at(sharing.get(0).bias());
    }
    double steepest =
        sharing.stream().mapToDouble(p -> p.characteristic().referenceInOwn()).max().orElse(0);
    double conforms = 0;
    double notRejected = 0;
    for (Interval panel :
        Panels.halved(ERRORS, (a, b) -> (b - a) * Math.max(1, steepest) > PANEL)) {
      for (Panels.Node node : Panels.nodes(panel, RunRisk::density)) {
        VerdictChances given = given(sharing, node.at());
        conforms += node.weight() * given.conforms();
        notRejected += node.weight() * (1 - given.doesNotConform());
      }
    }
    return VerdictChances.ofNested(conforms, notRejected);
  }

  private static VerdictChances given(List<AssumedPoint> sharing, double error) {
    double conforms = 1;
    double notRejected = 1;
    for (AssumedPoint point : sharing) {
      VerdictChances chances = point.characteristic().given(point.bias(), error);
      conforms *= chances.conforms();
      notRejected *= 1 - chances.doesNotConform();
    }
    return VerdictChances.ofNested(conforms, notRejected);
  }

  private static double density(double error) {
    return Math.exp(-error * error / 2) / Math.sqrt(2 * Math.PI);
  }
}
