package org.evenbeam.logbook.certificates;

/** Sets and prints a certificate's document. */
public interface CertificatePress {
  /** SHA-256 of the template in force, 64 hexadecimal digits. */
  String templateSha256();

  /** The document, PDF; the same record gives the same bytes. */
  byte[] print(CertificateRecord certificate);
}
