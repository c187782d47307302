package org.evenbeam.ui;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.security.SecureRandom;
import java.time.Clock;
import java.time.Duration;
import java.time.Instant;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.BooleanSupplier;
import org.evenbeam.exchange.LaboratoryImport;
import org.evenbeam.logbook.Desk;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.Transactions;
import org.evenbeam.logbook.certificates.CertificatePress;
import org.evenbeam.logbook.certificates.CertificateRecord;
import org.evenbeam.logbook.certificates.Certificates;
import org.evenbeam.logbook.history.TrailReading;
import org.evenbeam.logbook.instruments.Instruments;
import org.evenbeam.logbook.laboratory.Laboratory;
import org.evenbeam.logbook.laboratory.LaboratorySetUp;
import org.evenbeam.logbook.open.OpenLogbook;
import org.evenbeam.logbook.people.Passwords;
import org.evenbeam.logbook.people.People;
import org.evenbeam.logbook.plans.Plans;
import org.evenbeam.logbook.run.Bench;
import org.evenbeam.logbook.run.NewRun;
import org.evenbeam.logbook.run.RunKind;
import org.evenbeam.logbook.run.Runs;
import org.evenbeam.logbook.run.SheetReader;
import org.evenbeam.logbook.run.Submissions;
import org.evenbeam.logbook.signoff.SignOff;
import org.evenbeam.logbook.standards.Standards;
import org.evenbeam.store.LogbookStore;
import org.evenbeam.ui.common.ScreenTexts;

/** The demonstration laboratory in memory, at half past nine on the first of December 2026. */
public final class TestLaboratory implements AutoCloseable {
  /** Its technician's sign-in name and password. */
  public static final String TECHNICIAN = "tomas";

  /** Likewise. */
  public static final String TECHNICIANS_PASSWORD = "highwater";

  /** Its manager's sign-in name and password. */
  public static final String MANAGER = "maren";

  /** Likewise. */
  public static final String MANAGERS_PASSWORD = "lowwater";

  private static final Passwords.Cost CHEAP = new Passwords.Cost(64, 1);

  private final LogbookStore store;
  private final OpenLogbook logbook;
  private final Clock clock = new TickingClock(Instant.parse("2026-12-01T09:30:00Z"));

  /** Opens it; the store refuses a thread for which the given one says so. */
  public TestLaboratory(BooleanSupplier onScreenThread) {
    this.store = LogbookStore.openInMemory(onScreenThread);
    this.logbook = useCases(store);
    new LaboratoryImport(Path.of("demo-data")).into(logbook);
  }

  /** Opens it for tests that have no screen. */
  public TestLaboratory() {
    this(() -> false);
  }

  /** Its use cases. */
  public OpenLogbook logbook() {
    return logbook;
  }

  /** Its clock, a quarter of a minute later each time. */
  public Clock clock() {
    return clock;
  }

  /** Its own facts. */
  public Laboratory facts() {
    return logbook.laboratory().find().orElseThrow();
  }

  /** The texts of its screens. */
  public ScreenTexts texts() {
    return new ScreenTexts(facts());
  }

  /** A person's session. */
  public Session session(String name, String password) {
    return logbook.people().signIn(name, password.toCharArray(), facts().zone(), clock);
  }

  /** The technician's session. */
  public Session technician() {
    return session(TECHNICIAN, TECHNICIANS_PASSWORD);
  }

  /** The manager's session. */
  public Session manager() {
    return session(MANAGER, MANAGERS_PASSWORD);
  }

  /** A new run on the first balance, by the technician. */
  public long newRun(Session session) {
    String plan = logbook.plans().current(session, "BAL-01").get(0).title();
    return logbook
        .runs()
        .start(
            session,
            new NewRun("BAL-01", plan, RunKind.AS_FOUND_LEFT_SO, java.util.Optional.empty()));
  }

  @Override
  public void close() {
    store.close();
  }

  private static OpenLogbook useCases(LogbookStore store) {
    Transactions transactions = store.transactions();
    Desk desk = new Desk(transactions);
    People people =
        new People(transactions, desk, store.people(), new Passwords(new SecureRandom(), CHEAP));
    SheetReader sheets =
        new SheetReader(
            store.runs(),
            store.instruments(),
            store.standards(),
            store.plans(),
            store.people(),
            store.laboratory());
    return new OpenLogbook(
        new LaboratorySetUp(transactions, desk, store.laboratory(), store.people(), people),
        people,
        new Instruments(desk, store.instruments()),
        new Standards(desk, store.standards()),
        new Plans(desk, store.plans(), store.instruments(), store.standards()),
        new Runs(desk, store.runs(), store.instruments(), store.standards(), store.plans(), sheets),
        new Bench(desk, store.runs(), sheets),
        new Submissions(desk, store.runs(), store.instruments(), sheets, people),
        new SignOff(desk, store.runs(), sheets, people),
        new Certificates(
            desk,
            store.certificates(),
            new Certificates.Sources(
                store.runs(), sheets, store.people(), store.laboratory(), store.trail()),
            new NumberPress(),
            "test"),
        new TrailReading(desk, store.trail()));
  }

  /** Prints no more than the certificate's number. */
  private static final class NumberPress implements CertificatePress {
    @Override
    public String templateSha256() {
      return "0".repeat(64);
    }

    @Override
    public byte[] print(CertificateRecord certificate) {
      return certificate.number().getBytes(StandardCharsets.UTF_8);
    }
  }

  private static final class TickingClock extends Clock {
    private final AtomicReference<Instant> now;

    TickingClock(Instant start) {
      this.now = new AtomicReference<>(start);
    }

    @Override
    public Instant instant() {
      return now.getAndUpdate(at -> at.plus(Duration.ofSeconds(15)));
    }

    @Override
    public ZoneId getZone() {
      return ZoneOffset.UTC;
    }

    @Override
    public Clock withZone(ZoneId zone) {
      return this;
    }
  }
}
