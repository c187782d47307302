package org.evenbeam.logbook.certificates;

import java.util.Comparator;
import java.util.List;
import org.evenbeam.logbook.Desk;
import org.evenbeam.logbook.LastingJson;
import org.evenbeam.logbook.NotFound;
import org.evenbeam.logbook.Person;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.UseCase;
import org.evenbeam.logbook.history.TrailRecords;
import org.evenbeam.logbook.laboratory.Laboratory;
import org.evenbeam.logbook.laboratory.LaboratoryRecords;
import org.evenbeam.logbook.people.PersonRecords;
import org.evenbeam.logbook.run.RunEvent;
import org.evenbeam.logbook.run.RunRecords;
import org.evenbeam.logbook.run.RunSheet;
import org.evenbeam.logbook.run.RunStep;
import org.evenbeam.logbook.run.SheetReader;
import org.evenbeam.logbook.run.Signature;
import org.evenbeam.verification.CheckPointEvaluation;

/** Issuing certificates of approved runs, and their history. */
public final class Certificates {
  /** The records that a certificate is made from. */
  public record Sources(
      RunRecords runs,
      SheetReader sheets,
      PersonRecords people,
      LaboratoryRecords laboratories,
      TrailRecords trail) {}

  private final Desk desk;
  private final CertificateRecords certificates;
  private final Sources sources;
  private final CertificatePress press;
  private final String program;

  /**
   * Works on the given store and press.
   *
   * @param program the program's version, named in each record
   */
  public Certificates(
      Desk desk,
      CertificateRecords certificates,
      Sources sources,
      CertificatePress press,
      String program) {
    this.desk = desk;
    this.certificates = certificates;
    this.sources = sources;
    this.press = press;
    this.program = program;
  }

  /**
   * Issues the certificate of an approved run: the record in one transaction, then its document.
   *
   * @return the certificate's number
   * @throws CertificateRefused when the run is not approved or has its certificate already
   */
  public String issue(Session session, long run) {
    CertificateRecord record =
        desk.change(
            session,
            UseCase.ISSUE_CERTIFICATE,
            transaction -> {
              CertificateRecord made = record(transaction, session, run);
              certificates.add(transaction, made);
              return made;
            });
    print(session, record);
    return record.number();
  }

  /** Prints what was recorded and not yet printed, as after a crash; returns the numbers. */
  public List<String> printPending(Session session) {
    List<String> pending =
        desk.read(session, UseCase.READ_CERTIFICATES, certificates::withoutDocument);
    for (String number : pending) {
      print(session, record(session, number));
    }
    return pending;
  }

  /** All certificates, newest first, at most {@code most}. */
  public List<CertificateFacts> history(Session session, int most) {
    return desk.read(
        session, UseCase.READ_CERTIFICATES, transaction -> certificates.newest(transaction, most));
  }

  /**
   * The record of that number.
   *
   * @throws NotFound when there is none
   */
  public CertificateRecord record(Session session, String number) {
    return desk.read(
            session,
            UseCase.READ_CERTIFICATES,
            transaction -> certificates.find(transaction, number))
        .orElseThrow(() -> new NotFound(NotFound.Thing.CERTIFICATE, number));
  }

  /**
   * The bytes of a certificate's document as they were issued.
   *
   * @throws CertificateRefused when it is not printed yet
   */
  public byte[] document(Session session, String number) {
    return desk.read(
            session,
            UseCase.READ_CERTIFICATES,
            transaction -> certificates.document(transaction, number))
        .orElseThrow(() -> CertificateRefused.notYetPrinted(number));
  }

  private void print(Session session, CertificateRecord record) {
    byte[] document = press.print(record);
    desk.change(
        session,
        UseCase.KEEP_CERTIFICATE_DOCUMENT,
        transaction -> {
          certificates.addDocument(transaction, record.number(), document, session.now());
          return document.length;
        });
  }

  private CertificateRecord record(Transaction transaction, Session session, long run) {
    List<RunEvent> events = sources.runs().events(transaction, run);
    RunEvent last = events.stream().max(Comparator.comparingInt(RunEvent::sequence)).orElseThrow();
    if (last.step() != RunStep.APPROVED) {
      throw CertificateRefused.notApproved(run, last.step().state());
    }
    certificates.ofRun(transaction, run).stream()
        .findFirst()
        .ifPresent(
            issued -> {
              throw CertificateRefused.alreadyIssued(run, issued.number());
            });
    CertificateData data = data(transaction, run, last);
    int year = session.today().getYear();
    return new CertificateRecord(
        "%d-%05d".formatted(year, certificates.countOfYear(transaction, year) + 1),
        run,
        last.id(),
        data.sheet().performed(),
        session.now(),
        session.person().id(),
        sources.trail().head(transaction).hash(),
        press.templateSha256(),
        program,
        CheckPointEvaluation.RULES_VERSION,
        LastingJson.write(data));
  }

  private CertificateData data(Transaction transaction, long run, RunEvent approval) {
    Laboratory laboratory =
        sources
            .laboratories()
            .find(transaction)
            .orElseThrow(() -> new NotFound(NotFound.Thing.LABORATORY, ""));
    RunSheet sheet = sources.sheets().read(transaction, run);
    long submission = approval.answers().orElseThrow().eventId();
    return new CertificateData(
        laboratory,
        sheet,
        sources.runs().findings(transaction, submission),
        sources.runs().signatures(transaction, run).stream()
            .filter(signature -> signature.meaning() != Signature.Meaning.RETURNED)
            .map(signature -> signed(transaction, signature))
            .toList(),
        approval.reason());
  }

  private CertificateData.Signed signed(Transaction transaction, Signature signature) {
    String name =
        sources.people().find(transaction, signature.personId()).map(Person::name).orElseThrow();
    return new CertificateData.Signed(
        name, signature.meaning(), signature.at(), signature.contentSha256());
  }
}
