package org.evenbeam.ui;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Duration;
import java.time.Instant;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.BooleanSupplier;
import org.evenbeam.app.Wiring;
import org.evenbeam.exchange.LaboratoryImport;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.certificates.CertificatePress;
import org.evenbeam.logbook.certificates.CertificateRecord;
import org.evenbeam.logbook.laboratory.Laboratory;
import org.evenbeam.logbook.open.OpenLogbook;
import org.evenbeam.logbook.people.Passwords;
import org.evenbeam.logbook.run.NewRun;
import org.evenbeam.logbook.run.RunKind;
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
    this.logbook = Wiring.over(store, new NumberPress(), CHEAP, clock);
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
        .start(session, new NewRun("BAL-01", plan, RunKind.AS_FOUND_LEFT_SO, Optional.empty()));
  }

  @Override
  public void close() {
    store.close();
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
