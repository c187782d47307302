package org.evenbeam.logbook.certificates;

import java.time.Clock;
import java.time.Instant;
import java.time.temporal.ChronoUnit;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
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
  private final Clock clock;

  /**
   * Works on the given store and press.
   *
   * @param program the program's version, named in each record
   * @param clock by which printing is dated
   */
  public Certificates(
      Desk desk,
      CertificateRecords certificates,
      Sources sources,
      CertificatePress press,
      String program,
      Clock clock) {
    this.clock = clock;
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
    CertificateRecord record = issueRecord(session, run);
    print(record);
    return record.number();
  }

  /**
   * Issues the record of an approved run's certificate; its document is printed when it is first
   * asked for, or by {@link #printNext()}.
   *
   * @throws CertificateRefused when the run is not approved or has its certificate already
   */
  public CertificateRecord issueRecord(Session session, long run) {
    return desk.change(
        session,
        UseCase.ISSUE_CERTIFICATE,
        transaction -> {
          CertificateRecord made = record(transaction, session, run);
          certificates.add(transaction, made);
          return made;
        });
  }

  /**
   * Prints the oldest certificate that was recorded and not printed, as after a crash; its number.
   */
  public Optional<String> printNext() {
    Optional<CertificateRecord> next =
        desk.readByItself(
            transaction ->
                certificates.withoutDocument(transaction).stream()
                    .findFirst()
                    .flatMap(number -> certificates.find(transaction, number)));
    next.ifPresent(this::print);
    return next.map(CertificateRecord::number);
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
   * The bytes of a certificate's document as they were issued; printed now where that was still to
   * come.
   *
   * @throws NotFound when there is no such certificate
   */
  public byte[] document(Session session, String number) {
    return desk.read(
            session,
            UseCase.READ_CERTIFICATES,
            transaction -> certificates.document(transaction, number))
        .orElseGet(() -> print(record(session, number)));
  }

  /** One at a time, so that nobody prints what another is printing. */
  private synchronized byte[] print(CertificateRecord record) {
    return desk.readByItself(transaction -> certificates.document(transaction, record.number()))
        .orElseGet(() -> printed(record));
  }

  private byte[] printed(CertificateRecord record) {
    byte[] document = press.print(record);
    Instant at = clock.instant().truncatedTo(ChronoUnit.MICROS);
    return desk.changeByItself(
        at,
        UseCase.KEEP_CERTIFICATE_DOCUMENT,
        transaction -> {
          certificates.addDocument(transaction, record.number(), document, at);
          return document;
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
    String content = sheet.contentSha256();
    long submission = approval.answers().orElseThrow().eventId();
    return new CertificateData(
        laboratory,
        sheet,
        sources.runs().findings(transaction, submission),
        sources.runs().signatures(transaction, run).stream()
            .filter(signature -> signature.contentSha256().equals(content))
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
