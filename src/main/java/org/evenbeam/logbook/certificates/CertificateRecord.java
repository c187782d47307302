package org.evenbeam.logbook.certificates;

import java.time.Instant;
import java.time.LocalDate;

/**
 * Everything a certificate's document is made from. The same record gives the same bytes.
 *
 * @param number the certificate's number; unique
 * @param run the run's number
 * @param approvalEventId the key of the run's approval
 * @param performed the day on which the run was performed
 * @param issuedAt when it was issued
 * @param issuedBy the key of the person who issued it
 * @param trailHead the hash of the approval's trail entry
 * @param templateSha256 SHA-256 of the template in force
 * @param program the program's version
 * @param rulesVersion the version of the decision rules
 * @param data the run as JSON in canonical form
 */
public record CertificateRecord(
    String number,
    long run,
    long approvalEventId,
    LocalDate performed,
    Instant issuedAt,
    long issuedBy,
    String trailHead,
    String templateSha256,
    String program,
    int rulesVersion,
    String data) {}
