package org.evenbeam.logbook.run;

import java.time.LocalDate;
import org.evenbeam.logbook.LogbookException;
import org.evenbeam.metrology.NumberRefused;

/** Something that a run does not allow. What was entered before is kept. */
public final class RunRefused extends LogbookException {
  private static final long serialVersionUID = 1L;

  private RunRefused(String key, Object... arguments) {
    super(key, arguments);
  }

  /** The run is not in the state that the step needs. */
  static RunRefused wrongState(long run, RunState state) {
    return new RunRefused("run-wrong-state", run, state);
  }

  /** Only the technician who started a run works on it. */
  static RunRefused notYours(long run, String technician) {
    return new RunRefused("run-not-yours", run, technician);
  }

  /** The standard has no certificate that holds on the day. */
  static RunRefused standardExpired(String standard, LocalDate expired, LocalDate day) {
    return new RunRefused("run-standard-expired", standard, expired, day);
  }

  /** The standard has no certificate at all. */
  static RunRefused standardWithoutCertificate(String standard) {
    return new RunRefused("run-standard-without-certificate", standard);
  }

  /** The instrument is retired. */
  static RunRefused instrumentRetired(String tag) {
    return new RunRefused("run-instrument-retired", tag);
  }

  /** An as-left run needs its as-found run and the adjustment after it. */
  static RunRefused asLeftWithoutAdjustment() {
    return new RunRefused("run-as-left-without-adjustment");
  }

  /** The text is not accepted as a number. */
  static RunRefused reading(NumberRefused why) {
    return new RunRefused("reading-refused", why.reason(), why.text());
  }

  /** The text in one line of several is not accepted as a number; none of them was entered. */
  static RunRefused readingInLine(int line, NumberRefused why) {
    return new RunRefused("reading-in-line-refused", line, why.reason(), why.text());
  }

  /** All readings that the plan asks for are in. */
  static RunRefused allReadingsIn(String checkPoint, int planned) {
    return new RunRefused("run-all-readings-in", checkPoint, planned);
  }

  /** A corrected or struck reading is not corrected or struck again. */
  static RunRefused readingNoLongerCounts(int position) {
    return new RunRefused("run-reading-no-longer-counts", position);
  }

  /** A correction, a strike or an abandonment needs its reason in words. */
  static RunRefused reasonMissing() {
    return new RunRefused("reason-missing");
  }

  /** There is no verdict, and the run was not submitted as one without. */
  static RunRefused noVerdict() {
    return new RunRefused("run-no-verdict");
  }

  /** There is nothing to submit. */
  static RunRefused noReadings() {
    return new RunRefused("run-no-readings");
  }
}
