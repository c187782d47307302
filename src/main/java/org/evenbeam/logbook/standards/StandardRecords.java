package org.evenbeam.logbook.standards;

import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.Transaction;

/** Where reference standards and their certificates are kept. */
public interface StandardRecords {
  /** Adds a standard. */
  void add(Transaction transaction, ReferenceStandard standard);

  /** The standard of that tag. */
  Optional<ReferenceStandard> find(Transaction transaction, String tag);

  /** All standards, by tag. */
  List<ReferenceStandard> all(Transaction transaction);

  /** Adds a certificate to a standard. */
  void addCertificate(Transaction transaction, String tag, StandardCertificate certificate);

  /** A standard's certificates, newest first. */
  List<StandardCertificate> certificates(Transaction transaction, String tag);
}
