package org.evenbeam.logbook.run;

import org.evenbeam.logbook.certificates.CertificatePress;
import org.evenbeam.logbook.certificates.CertificateRecord;

/** A press for laboratories that print nothing. */
final class NoPress implements CertificatePress {
  @Override
  public String templateSha256() {
    return "0".repeat(64);
  }

  @Override
  public byte[] print(CertificateRecord certificate) {
    throw new AssertionError("nothing is printed here");
  }
}
