package org.evenbeam.logbook.standards;

import java.util.List;
import org.evenbeam.logbook.AlreadyThere;
import org.evenbeam.logbook.Desk;
import org.evenbeam.logbook.NotFound;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.UseCase;

/** The laboratory's reference standards. */
public final class Standards {
  private final Desk desk;
  private final StandardRecords standards;

  /** Works on the given store. */
  public Standards(Desk desk, StandardRecords standards) {
    this.desk = desk;
    this.standards = standards;
  }

  /**
   * Adds a standard.
   *
   * @throws AlreadyThere when the tag is taken
   */
  public void add(Session session, ReferenceStandard standard) {
    desk.change(
        session,
        UseCase.ADD_STANDARD,
        transaction -> {
          if (standards.find(transaction, standard.tag()).isPresent()) {
            throw new AlreadyThere(NotFound.Thing.STANDARD, standard.tag());
          }
          standards.add(transaction, standard);
          return standard;
        });
  }

  /**
   * Adds a certificate to a standard.
   *
   * @throws NotFound when there is no such standard
   */
  public void addCertificate(Session session, String tag, StandardCertificate certificate) {
    desk.change(
        session,
        UseCase.ADD_STANDARD_CERTIFICATE,
        transaction -> {
          if (standards.find(transaction, tag).isEmpty()) {
            throw new NotFound(NotFound.Thing.STANDARD, tag);
          }
          standards.addCertificate(transaction, tag, certificate);
          return certificate;
        });
  }

  /** All standards, by tag. */
  public List<ReferenceStandard> all(Session session) {
    return desk.read(session, UseCase.READ_STANDARDS, standards::all);
  }

  /** A standard's certificates, newest first. */
  public List<StandardCertificate> certificates(Session session, String tag) {
    return desk.read(
        session, UseCase.READ_STANDARDS, transaction -> standards.certificates(transaction, tag));
  }
}
