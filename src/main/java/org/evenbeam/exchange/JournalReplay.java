package org.evenbeam.exchange;

import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.evenbeam.logbook.NotFound;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.files.BadInput;
import org.evenbeam.logbook.instruments.InstrumentEvent;
import org.evenbeam.logbook.open.OpenLogbook;
import org.evenbeam.logbook.run.NewRun;
import org.evenbeam.logbook.run.Reading;
import org.evenbeam.logbook.run.Run;
import org.evenbeam.logbook.run.RunKind;
import org.evenbeam.metrology.DecimalSign;
import org.evenbeam.metrology.TypedDecimal;
import org.evenbeam.verification.plan.Conditions;

/** Does what a journal says, through the same use cases as a person at the screen. */
final class JournalReplay {
  private final OpenLogbook logbook;
  private final DecimalSign sign;
  private final Map<String, Long> numbers = new HashMap<>();

  JournalReplay(OpenLogbook logbook, DecimalSign sign) {
    this.logbook = logbook;
    this.sign = sign;
  }

  /** Does one row, as that person, with that person's password where a signature is asked. */
  void apply(JournalRow journal, Session session, String password) {
    TableRow row = journal.row();
    switch (journal.action()) {
      case START -> start(row, session);
      case CONDITIONS -> logbook.bench().recordConditions(session, run(row), conditions(row));
      case ENTER ->
          logbook.bench().enter(session, run(row), row.text("check_point"), row.text("text"));
      case CORRECT ->
          logbook
              .bench()
              .correct(
                  session, run(row), reading(row, session), row.text("text"), row.text("reason"));
      case STRIKE ->
          logbook.bench().strike(session, run(row), reading(row, session), row.text("reason"));
      case SUBMIT -> logbook.submissions().submit(session, run(row), password.toCharArray(), false);
      case SUBMIT_WITHOUT_VERDICT ->
          logbook.submissions().submit(session, run(row), password.toCharArray(), true);
      case APPROVE ->
          logbook
              .signOff()
              .approve(
                  session, run(row), password.toCharArray(), row.optional("reason").orElse(""));
      case GIVE_BACK ->
          logbook.signOff().giveBack(session, run(row), password.toCharArray(), row.text("reason"));
      case TAKE_UP -> logbook.runs().takeUp(session, run(row));
      case ABANDON -> logbook.runs().abandon(session, run(row), row.text("reason"));
      case ISSUE -> logbook.certificates().issueRecord(session, run(row));
      case EVENT -> event(row, session);
      case STOP -> logbook.instruments().stop(session, row.text("instrument"), row.text("reason"));
      case RELEASE ->
          logbook
              .instruments()
              .release(session, row.text("instrument"), row.text("reason"), row.optional("text"));
    }
  }

  private void start(TableRow row, Session session) {
    RunKind kind = LaboratoryTables.constant(row, "kind", RunKind.class);
    Optional<Run.AsLeftOf> before =
        row.optional("text")
            .map(text -> text.split(";", -1))
            .map(names -> new Run.AsLeftOf(number(row, names[0]), number(row, names[1])));
    long started =
        logbook
            .runs()
            .start(session, new NewRun(row.text("instrument"), row.text("plan"), kind, before));
    numbers.put(row.text("run"), started);
  }

  private void event(TableRow row, Session session) {
    InstrumentEvent.Kind kind = LaboratoryTables.constant(row, "kind", InstrumentEvent.Kind.class);
    long id = logbook.instruments().record(session, row.text("instrument"), kind, row.text("text"));
    row.optional("run").ifPresent(name -> numbers.put(name, id));
  }

  private long run(TableRow row) {
    return number(row, row.text("run"));
  }

  private long number(TableRow row, String name) {
    Long number = numbers.get(name);
    if (number == null) {
      throw BadInput.unknown(row.place("run"), name, row.file());
    }
    return number;
  }

  private long reading(TableRow row, Session session) {
    int position = row.requiredNumber("position").intValue();
    return logbook
        .runs()
        .open(session, run(row))
        .sheet()
        .checkPoint(row.text("check_point"))
        .stream()
        .flatMap(point -> point.standing().stream())
        .filter(reading -> reading.position() == position)
        .mapToLong(Reading::id)
        .findFirst()
        .orElseThrow(() -> new NotFound(NotFound.Thing.READING, Integer.toString(position)));
  }

  private Conditions conditions(TableRow row) {
    List<Optional<TypedDecimal>> typed =
        Arrays.stream(row.text("text").split(";", -1))
            .map(
                text ->
                    text.isBlank()
                        ? Optional.<TypedDecimal>empty()
                        : Optional.of(TypedDecimal.parse(text, sign)))
            .toList();
    return new Conditions(typed.get(0), typed.get(1), typed.get(2));
  }
}
