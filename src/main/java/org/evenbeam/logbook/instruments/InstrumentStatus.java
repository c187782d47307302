package org.evenbeam.logbook.instruments;

/** Whether an instrument may be used. */
public enum InstrumentStatus {
  /** It may. */
  IN_SERVICE,
  /** It may, within a stated restriction. */
  IN_SERVICE_WITH_RESTRICTION,
  /** It may not, for now. */
  OUT_OF_SERVICE,
  /** It may not, for good. */
  RETIRED
}
