package org.evenbeam.logbook.plans;

import org.evenbeam.logbook.LogbookException;

/** A plan revision that cannot be kept. */
public final class PlanRefused extends LogbookException {
  private static final long serialVersionUID = 1L;

  private PlanRefused(String key, Object... arguments) {
    super(key, arguments);
  }

  static PlanRefused notTheNextRevision(String title, int given, int next) {
    return new PlanRefused("plan-not-next-revision", title, given, next);
  }

  static PlanRefused otherUnit(
      String checkPoint, String standard, String standardUnit, String instrumentUnit) {
    return new PlanRefused("plan-other-unit", checkPoint, standard, standardUnit, instrumentUnit);
  }

  static PlanRefused shareOnIntervalScale(String checkPoint, String unit) {
    return new PlanRefused("plan-share-on-interval-scale", checkPoint, unit);
  }

  static PlanRefused cannotBeAsked(String checkPoint, IllegalArgumentException why) {
    return new PlanRefused("plan-cannot-be-asked", checkPoint, why.getMessage());
  }
}
