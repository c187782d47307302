package org.evenbeam.logbook;

import static org.evenbeam.logbook.Role.AUDITOR;
import static org.evenbeam.logbook.Role.MANAGER;
import static org.evenbeam.logbook.Role.TECHNICIAN;

import java.util.Set;

/**
 * Everything that can be done, and by whom: the one table of permissions. The lasting name of a use
 * case is what the audit trail writes as the action; it is never changed.
 */
public enum UseCase {
  /** Put up the laboratory's name, address and first manager. */
  SET_UP_LABORATORY("laboratory set up", MANAGER),
  /** Read the laboratory's own facts. */
  READ_LABORATORY("laboratory read", TECHNICIAN, MANAGER, AUDITOR),
  /** Add a person. */
  ADD_PERSON("person added", MANAGER),
  /** Read the list of people. */
  READ_PEOPLE("people read", TECHNICIAN, MANAGER, AUDITOR),
  /** Add an instrument. */
  ADD_INSTRUMENT("instrument added", MANAGER),
  /** Record what happened to an instrument, such as an adjustment. */
  RECORD_INSTRUMENT_EVENT("instrument event recorded", TECHNICIAN, MANAGER),
  /** Take an instrument out of service. */
  STOP_INSTRUMENT("instrument stopped", TECHNICIAN, MANAGER),
  /** Put an instrument back into service, with or without restriction. */
  RELEASE_INSTRUMENT("instrument released", MANAGER),
  /** Read instruments and their events. */
  READ_INSTRUMENTS("instruments read", TECHNICIAN, MANAGER, AUDITOR),
  /** Add a reference standard. */
  ADD_STANDARD("reference standard added", MANAGER),
  /** Add a calibration certificate or reference material certificate to a standard. */
  ADD_STANDARD_CERTIFICATE("reference standard's certificate added", MANAGER),
  /** Read standards and their certificates. */
  READ_STANDARDS("reference standards read", TECHNICIAN, MANAGER, AUDITOR),
  /** Add a revision of a verification plan. */
  ADD_PLAN_REVISION("plan revision added", MANAGER),
  /** Read plans. */
  READ_PLANS("plans read", TECHNICIAN, MANAGER, AUDITOR),
  /** Start a run. */
  START_RUN("run started", TECHNICIAN, MANAGER),
  /** Record the conditions of the room. */
  RECORD_CONDITIONS("conditions recorded", TECHNICIAN, MANAGER),
  /** Enter a reading. */
  ENTER_READING("reading entered", TECHNICIAN, MANAGER),
  /** Correct a reading by a new entry that points at the old one. */
  CORRECT_READING("reading corrected", TECHNICIAN, MANAGER),
  /** Strike a reading for a cause seen at the bench. */
  STRIKE_READING("reading struck", TECHNICIAN, MANAGER),
  /** Keep what is being typed and not yet entered; outside the trail. */
  KEEP_SCRATCH("scratch kept", TECHNICIAN, MANAGER),
  /** Submit a run for approval. */
  SUBMIT_RUN("run submitted", TECHNICIAN, MANAGER),
  /** Take a returned run up again. */
  TAKE_UP_RETURNED_RUN("returned run taken up", TECHNICIAN, MANAGER),
  /** Give a run up. */
  ABANDON_RUN("run abandoned", TECHNICIAN, MANAGER),
  /** Read runs, readings and findings. */
  READ_RUNS("runs read", TECHNICIAN, MANAGER, AUDITOR),
  /** Approve a submitted run. */
  APPROVE_RUN("run approved", MANAGER),
  /** Return a submitted run to its technician. */
  RETURN_RUN("run returned", MANAGER),
  /** Write the certificate record of an approved run. */
  ISSUE_CERTIFICATE("certificate issued", MANAGER),
  /** Keep the bytes of an issued certificate; done by the program itself. */
  KEEP_CERTIFICATE_DOCUMENT("certificate document kept"),
  /** Read certificates and their history. */
  READ_CERTIFICATES("certificates read", TECHNICIAN, MANAGER, AUDITOR),
  /** Read the audit trail and check its chain. */
  READ_TRAIL("trail read", TECHNICIAN, MANAGER, AUDITOR);

  private final String lastingName;

  @SuppressWarnings("ImmutableEnumChecker") // Set.of cannot be changed
  private final Set<Role> roles;

  UseCase(String lastingName, Role... roles) {
    this.lastingName = lastingName;
    this.roles = Set.of(roles);
  }

  /** The name that the audit trail writes. */
  public String lastingName() {
    return lastingName;
  }

  /** Whether a person of that role may do it. */
  public boolean allows(Role role) {
    return roles.contains(role);
  }
}
