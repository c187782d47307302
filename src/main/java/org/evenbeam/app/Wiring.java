package org.evenbeam.app;

import java.security.SecureRandom;
import java.time.Clock;
import org.evenbeam.logbook.Desk;
import org.evenbeam.logbook.Transactions;
import org.evenbeam.logbook.certificates.CertificatePress;
import org.evenbeam.logbook.certificates.Certificates;
import org.evenbeam.logbook.history.TrailReading;
import org.evenbeam.logbook.instruments.Instruments;
import org.evenbeam.logbook.laboratory.LaboratorySetUp;
import org.evenbeam.logbook.open.OpenLogbook;
import org.evenbeam.logbook.people.Passwords;
import org.evenbeam.logbook.people.People;
import org.evenbeam.logbook.plans.Plans;
import org.evenbeam.logbook.run.Bench;
import org.evenbeam.logbook.run.Runs;
import org.evenbeam.logbook.run.SheetReader;
import org.evenbeam.logbook.run.Submissions;
import org.evenbeam.logbook.signoff.SignOff;
import org.evenbeam.logbook.standards.Standards;
import org.evenbeam.store.LogbookStore;

/** Every use case over its store and its press, put together by hand. */
public final class Wiring {
  private Wiring() {}

  /**
   * The use cases over that store.
   *
   * @param press prints certificates
   * @param cost what a guess at a password costs
   * @param clock by which the program dates its own work
   */
  public static OpenLogbook over(
      LogbookStore store, CertificatePress press, Passwords.Cost cost, Clock clock) {
    Transactions transactions = store.transactions();
    Desk desk = new Desk(transactions);
    People people =
        new People(transactions, desk, store.people(), new Passwords(new SecureRandom(), cost));
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
            press,
            ProgramVersion.text(),
            clock),
        new TrailReading(desk, store.trail()));
  }
}
