package org.evenbeam.logbook.certificates;

import java.time.Instant;
import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.laboratory.Laboratory;
import org.evenbeam.logbook.run.KeptFinding;
import org.evenbeam.logbook.run.RunSheet;
import org.evenbeam.logbook.run.Signature;

/**
 * Everything that a certificate says, kept as JSON in its record; the document is made from this
 * alone.
 *
 * @param laboratory the laboratory as it was when the certificate was issued
 * @param sheet the run with its readings, standards, plan and conditions
 * @param findings as kept at submission
 * @param signatures by whom the run was prepared and approved
 * @param approvalReason what the approving manager wrote, where a reason was given
 */
public record CertificateData(
    Laboratory laboratory,
    RunSheet sheet,
    List<KeptFinding> findings,
    List<Signed> signatures,
    Optional<String> approvalReason) {
  /** Keeps the lists unchangeable. */
  public CertificateData {
    findings = List.copyOf(findings);
    signatures = List.copyOf(signatures);
  }

  /**
   * A signature with the signer's name as it was.
   *
   * @param name the signer's name
   * @param meaning what the signature says
   * @param at when
   * @param contentSha256 SHA-256 of the content signed
   */
  public record Signed(String name, Signature.Meaning meaning, Instant at, String contentSha256) {}
}
