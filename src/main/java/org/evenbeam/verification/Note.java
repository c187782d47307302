package org.evenbeam.verification;

import java.time.LocalDate;

/**
 * Something that a reader of a finding must know beside its figures; a sentence in {@code wording}.
 */
public sealed interface Note {

  /** The reference came without an uncertainty and was taken as exact. */
  record ReferenceTakenAsExact() implements Note {}

  /** The plan leaves the reference's uncertainty out of the bias criterion. */
  record ReferenceUncertaintyLeftOut() implements Note {}

  /** The criterion has no limit and is not asked. */
  record NotAsked(Criterion criterion) implements Note {}

  /** One reading has no standard deviation, so no test of it exists. */
  record OneReading() implements Note {}

  /** All readings are equal, so that t and chi-square do not exist. */
  record ReadingsEqual(int n) implements Note {}

  /** All readings are equal and the resolution is not known, so that nothing is known below it. */
  record ResolutionMissing() implements Note {}

  /**
   * The scatter of the mean is below what the resolution hides, so that d/√12 counts in its place.
   *
   * @param resolutionUncertainty d/√12, in the unit of the readings
   */
  record ResolutionCounts(double resolutionUncertainty) implements Note {}

  /**
   * The upper bound of the standard deviation is the one that the resolution allows, not that of
   * chi-square.
   *
   * @param upperBound in the unit of the readings
   */
  record ResolutionBoundsSpread(double upperBound) implements Note {}

  /** The estimate is beyond its limit, but these readings cannot show that the true value is. */
  record EstimateBeyondButNotShown(Criterion criterion, int n) implements Note {}

  /**
   * Under simple acceptance, twice the standard uncertainty of the bias is more than a third of its
   * limit (the trade's third; OIML R 111-1:2004, 5.2, asks it of U at k = 2).
   *
   * @param expanded 2u, in the unit of the readings
   * @param third a third of the smaller limit
   */
  record UncertaintyLargeForSimpleAcceptance(double expanded, double third) implements Note {}

  /** The readings do not look normal (Shapiro–Wilk), at that p. */
  record NotNormal(double p) implements Note {}

  /** One reading lies far from the others (Grubbs), so many standard deviations from the mean. */
  record FarReading(int position, double standardDeviations) implements Note {}

  /** Readings that follow one another are alike (von Neumann), at that p. */
  record NeighboursAlike(double p) implements Note {}

  /** The readings climb in the order in which they were made, at that p. */
  record Climbing(double p) implements Note {}

  /** The readings fall in the order in which they were made, at that p. */
  record Falling(double p) implements Note {}

  /** Readings are still to come before there can be a verdict. */
  record ReadingsToGo(int n, int planned) implements Note {}

  /** There are more readings than planned, which is a deviation. */
  record MoreReadingsThanPlanned(int n, int planned) implements Note {}

  /** A condition that the plan limits was not recorded. */
  record ConditionMissing(Condition condition) implements Note {}

  /** A condition lies outside the plan's limits. */
  record ConditionOutside(Condition condition) implements Note {}

  /** The standard's certificate did not hold on the day. */
  record StandardExpired(String standardTag, LocalDate expired) implements Note {}

  /** Findings with the struck readings in lead to another verdict. */
  record StruckReadingsDecide(int struck) implements Note {}
}
