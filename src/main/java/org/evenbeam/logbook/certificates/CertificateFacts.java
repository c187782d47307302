package org.evenbeam.logbook.certificates;

import java.time.Instant;
import java.time.LocalDate;
import java.util.Optional;
import org.evenbeam.verification.Verdict;

/**
 * A certificate in its history.
 *
 * @param number its number, such as 2026-00017; unique
 * @param run the run's number
 * @param instrumentTag the instrument
 * @param performed the day on which the run was performed
 * @param issuedAt when it was issued
 * @param approvedBy the name of the manager who approved
 * @param verdict the run's verdict; empty where none could be given
 * @param documentSha256 SHA-256 of the document's bytes; empty until it is printed
 */
public record CertificateFacts(
    String number,
    long run,
    String instrumentTag,
    LocalDate performed,
    Instant issuedAt,
    String approvedBy,
    Optional<Verdict> verdict,
    Optional<String> documentSha256) {}
