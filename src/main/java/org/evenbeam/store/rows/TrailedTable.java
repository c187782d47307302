package org.evenbeam.store.rows;

import java.util.Locale;

/** Every table that the audit trail covers, with the column of its key. */
public enum TrailedTable {
  /** The laboratory's own facts. */
  LABORATORY("id"),
  /** People. */
  PERSON("id"),
  /** Password hashes. */
  CREDENTIAL("id"),
  /** Instruments. */
  INSTRUMENT("id"),
  /** What happened to instruments. */
  INSTRUMENT_EVENT("id"),
  /** Reference standards. */
  REFERENCE_STANDARD("id"),
  /** The calibration certificates and reference material certificates of standards. */
  STANDARD_CERTIFICATE("id"),
  /** What these certify. */
  CERTIFIED_VALUE("id"),
  /** The lines of their uncertainty budgets. */
  UNCERTAINTY_TERM("id"),
  /** Verification plans. */
  VERIFICATION_PLAN("id"),
  /** Their revisions. */
  PLAN_REVISION("id"),
  /** Check points of a revision. */
  CHECK_POINT("id"),
  /** Limits of a check point. */
  CHECK_POINT_LIMIT("id"),
  /** Runs. */
  RUN("number"),
  /** The standard's certificate in use at each check point of a run. */
  RUN_STANDARD("id"),
  /** Steps of runs. */
  RUN_EVENT("id"),
  /** Signatures of steps. */
  SIGNATURE("id"),
  /** Conditions of runs. */
  RUN_CONDITIONS("id"),
  /** Readings. */
  READING("id"),
  /** Struck readings. */
  READING_STRIKE("reading_id"),
  /** Verdicts of submissions. */
  SUBMISSION("event_id"),
  /** Findings of submissions. */
  FINDING("id"),
  /** Certificate records. */
  CERTIFICATE("number"),
  /** Certificate documents. */
  CERTIFICATE_DOCUMENT("number"),
  /** What happened to certificates. */
  CERTIFICATE_EVENT("id");

  private final String key;

  TrailedTable(String key) {
    this.key = key;
  }

  /** The table's name in the schema and in the trail. */
  public String sqlName() {
    return name().toLowerCase(Locale.ROOT);
  }

  /** The column of its primary key. */
  public String key() {
    return key;
  }
}
