package org.evenbeam.exchange;

import java.nio.file.Path;
import java.time.Clock;
import java.time.Instant;
import java.time.LocalDate;
import java.time.LocalTime;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.evenbeam.logbook.Person;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.files.BadInput;
import org.evenbeam.logbook.laboratory.Laboratory;
import org.evenbeam.logbook.open.OpenLogbook;

/**
 * Brings a whole laboratory in from a folder of tables: its things at the start, then its journal,
 * each row done at its own time by its own person, through the same use cases and permissions as at
 * the screen.
 */
public final class LaboratoryImport {
  private final Path folder;

  /** Reads from that folder. */
  public LaboratoryImport(Path folder) {
    this.folder = folder;
  }

  private record Member(Person person, String password) {}

  private record Step(Instant at, Runnable work) {}

  /**
   * Imports everything into an empty logbook.
   *
   * @throws BadInput when a table is not as it must be
   * @throws org.evenbeam.logbook.LogbookException when a row asks for what the logbook refuses
   */
  public void into(OpenLogbook logbook) {
    LaboratoryTables tables = new LaboratoryTables(folder);
    Laboratory laboratory = tables.laboratory();
    List<JournalRow> journal = JournalRow.read(folder.resolve("journal.csv"));
    Instant opening =
        journal.stream().map(JournalRow::at).min(Comparator.naturalOrder()).orElseThrow();
    Instant start = opening.minusSeconds(3600);
    Map<String, Member> members = people(logbook, laboratory, tables.people(), start);
    Session keeper = session(laboratory, first(members).person(), start);
    tables.instruments().forEach(instrument -> logbook.instruments().add(keeper, instrument));
    tables.standards().forEach(standard -> logbook.standards().add(keeper, standard));
    List<Step> steps = new ArrayList<>();
    certificates(logbook, laboratory, keeper, start, steps);
    new PlanTables(folder).plans().forEach(plan -> logbook.plans().add(keeper, plan));
    journal(logbook, laboratory, members, journal, steps);
    steps.sort(Comparator.comparing(Step::at));
    steps.forEach(step -> step.work().run());
  }

  private static Map<String, Member> people(
      OpenLogbook logbook,
      Laboratory laboratory,
      List<LaboratoryTables.Member> listed,
      Instant start) {
    Map<String, Member> members = new LinkedHashMap<>();
    LaboratoryTables.Member head = listed.get(0);
    Person manager =
        logbook
            .laboratory()
            .setUp(
                laboratory,
                head.person().signInName(),
                head.person().name(),
                head.password().toCharArray(),
                start);
    members.put(manager.signInName(), new Member(manager, head.password()));
    Session keeper = session(laboratory, manager, start);
    for (LaboratoryTables.Member member : listed.subList(1, listed.size())) {
      Person person =
          logbook.people().add(keeper, member.person(), member.password().toCharArray());
      members.put(person.signInName(), new Member(person, member.password()));
    }
    return members;
  }

  /**
   * A certificate is entered at noon of its day, or at the start where it is older than the
   * logbook.
   */
  private void certificates(
      OpenLogbook logbook, Laboratory laboratory, Session keeper, Instant start, List<Step> steps) {
    for (CertificateTables.Owned owned : new CertificateTables(folder).certificates()) {
      LocalDate day = owned.certificate().issued();
      Instant noon = day.atTime(LocalTime.NOON).atZone(laboratory.zone()).toInstant();
      Instant at = noon.isBefore(start) ? start : noon;
      Session then = session(laboratory, keeper.person(), at);
      steps.add(
          new Step(
              at,
              () ->
                  logbook
                      .standards()
                      .addCertificate(then, owned.standardTag(), owned.certificate())));
    }
  }

  private static void journal(
      OpenLogbook logbook,
      Laboratory laboratory,
      Map<String, Member> members,
      List<JournalRow> journal,
      List<Step> steps) {
    JournalReplay replay = new JournalReplay(logbook, laboratory.decimalSign());
    for (JournalRow row : journal) {
      String name = row.row().text("person");
      Member member = members.get(name);
      if (member == null) {
        throw BadInput.unknown(row.row().place("person"), name, row.row().file());
      }
      Session session = session(laboratory, member.person(), row.at());
      steps.add(new Step(row.at(), () -> replay.apply(row, session, member.password())));
    }
  }

  private static Member first(Map<String, Member> members) {
    return members.values().iterator().next();
  }

  private static Session session(Laboratory laboratory, Person person, Instant at) {
    return new Session(person, laboratory.zone(), Clock.fixed(at, laboratory.zone()));
  }
}
