package org.evenbeam.logbook.certificates;

import org.evenbeam.logbook.LogbookException;
import org.evenbeam.logbook.run.RunState;

/** A certificate that cannot be issued. */
public final class CertificateRefused extends LogbookException {
  private static final long serialVersionUID = 1L;

  private CertificateRefused(String key, Object... arguments) {
    super(key, arguments);
  }

  static CertificateRefused notApproved(long run, RunState state) {
    return new CertificateRefused("certificate-not-approved", run, state);
  }

  static CertificateRefused alreadyIssued(long run, String number) {
    return new CertificateRefused("certificate-already-issued", run, number);
  }
}
