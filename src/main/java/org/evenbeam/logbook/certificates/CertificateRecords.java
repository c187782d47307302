package org.evenbeam.logbook.certificates;

import java.time.Instant;
import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.Transaction;

/** Where certificates are kept. */
public interface CertificateRecords {
  /** How many certificates were issued in that year of the laboratory's calendar. */
  int countOfYear(Transaction transaction, int year);

  /** Adds a certificate record. */
  void add(Transaction transaction, CertificateRecord certificate);

  /** The record of that number. */
  Optional<CertificateRecord> find(Transaction transaction, String number);

  /** The certificates of a run, newest first. */
  List<CertificateFacts> ofRun(Transaction transaction, long run);

  /** All certificates, newest first, at most {@code most}. */
  List<CertificateFacts> newest(Transaction transaction, int most);

  /** The numbers of certificates whose document is not yet kept, oldest first. */
  List<String> withoutDocument(Transaction transaction);

  /** Keeps a certificate's document; there is only one. */
  void addDocument(Transaction transaction, String number, byte[] bytes, Instant at);

  /** The document's bytes. */
  Optional<byte[]> document(Transaction transaction, String number);
}
