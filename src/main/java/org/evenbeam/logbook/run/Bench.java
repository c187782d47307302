package org.evenbeam.logbook.run;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.evenbeam.logbook.Desk;
import org.evenbeam.logbook.NotFound;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.UseCase;
import org.evenbeam.metrology.DecimalSign;
import org.evenbeam.metrology.NumberRefused;
import org.evenbeam.metrology.TypedDecimal;
import org.evenbeam.verification.plan.Conditions;

/** What a technician does at a draft: readings, corrections, strikes, conditions, scratch. */
public final class Bench {
  private final Desk desk;
  private final RunRecords runs;
  private final SheetReader sheets;

  /** Works on the given store. */
  public Bench(Desk desk, RunRecords runs, SheetReader sheets) {
    this.desk = desk;
    this.runs = runs;
    this.sheets = sheets;
  }

  /**
   * Enters one reading as typed.
   *
   * @throws RunRefused when the text is no number, all readings are in, or the run is no draft of
   *     this person
   */
  public Reading enter(Session session, long run, String checkPoint, String typed) {
    return onDraft(
        session,
        run,
        UseCase.ENTER_READING,
        Optional.empty(),
        draft -> {
          TypedDecimal value = parse(typed, sign(draft.transaction()));
          runs.keepScratch(draft.transaction(), run, new Scratch(checkPoint, "", session.now()));
          return add(draft, session, checkPoint, value, Reading.Source.KEYBOARD);
        });
  }

  /**
   * Enters a pasted column, all of it or nothing. Lines without any text are passed over.
   *
   * @throws RunRefused naming the first line that is no number, or when there are more lines than
   *     readings to go
   */
  public List<Reading> enterColumn(
      Session session, long run, String checkPoint, List<String> lines) {
    return onDraft(
        session,
        run,
        UseCase.ENTER_READING,
        Optional.empty(),
        draft -> {
          List<TypedDecimal> values = parseLines(lines, sign(draft.transaction()));
          List<Reading> entered = new ArrayList<>();
          SheetCheckPoint point = checkPoint(draft.sheet(), checkPoint);
          if (values.size() > point.toGo()) {
            throw RunRefused.allReadingsIn(checkPoint, point.planned().readings());
          }
          int next = nextPosition(point);
          for (TypedDecimal value : values) {
            entered.add(
                keep(draft, reading(session, checkPoint, next++, value, Reading.Source.PASTED)));
          }
          return entered;
        });
  }

  /**
   * Corrects a reading by a new entry that points at the old one.
   *
   * @throws RunRefused when the text is no number, the reason is missing, the reading no longer
   *     counts, or the run is no draft of this person
   */
  public Reading correct(Session session, long run, long readingId, String typed, String reason) {
    String why = Reasons.required(reason);
    return onDraft(
        session,
        run,
        UseCase.CORRECT_READING,
        Optional.of(why),
        draft -> {
          Reading old = counting(draft.sheet(), readingId);
          TypedDecimal value = parse(typed, sign(draft.transaction()));
          return keep(
              draft,
              new Reading(
                  0,
                  old.checkPoint(),
                  old.position(),
                  value,
                  session.now(),
                  session.person().id(),
                  Reading.Source.KEYBOARD,
                  Optional.empty(),
                  Optional.of(new Reading.Correction(readingId, why)),
                  Optional.empty()));
        });
  }

  /**
   * Strikes a reading for a cause seen at the bench. It stays visible and no longer counts.
   *
   * @throws RunRefused when the cause is missing, the reading no longer counts, or the run is no
   *     draft of this person
   */
  public void strike(Session session, long run, long readingId, String cause) {
    String seen = Reasons.required(cause);
    onDraft(
        session,
        run,
        UseCase.STRIKE_READING,
        Optional.of(seen),
        draft -> {
          counting(draft.sheet(), readingId);
          Reading.Strike strike = new Reading.Strike(seen, session.now(), session.person().id());
          runs.addStrike(draft.transaction(), readingId, strike);
          return strike;
        });
  }

  /** Records the conditions of the room; earlier ones stay in the record. */
  public void recordConditions(Session session, long run, Conditions conditions) {
    onDraft(
        session,
        run,
        UseCase.RECORD_CONDITIONS,
        Optional.empty(),
        draft -> {
          runs.addConditions(
              draft.transaction(), run, conditions, session.person().id(), session.now());
          return conditions;
        });
  }

  /** Keeps what is being typed, outside the trail; an empty text forgets it. */
  public void keepScratch(Session session, long run, String checkPoint, String text) {
    desk.scratch(
        session,
        UseCase.KEEP_SCRATCH,
        transaction -> {
          Scratch scratch = new Scratch(checkPoint, text, session.now());
          runs.keepScratch(transaction, run, scratch);
          return scratch;
        });
  }

  private record Draft(Transaction transaction, RunSheet sheet) {}

  private <T> T onDraft(
      Session session,
      long run,
      UseCase useCase,
      Optional<String> reason,
      Function<Draft, T> work) {
    return desk.change(
        session,
        useCase,
        reason,
        transaction -> {
          RunSheet sheet = sheets.read(transaction, run);
          RunState state = Runs.state(runs.events(transaction, run));
          Drafts.requireOwn(session, sheet, state, RunState.DRAFT);
          return work.apply(new Draft(transaction, sheet));
        });
  }

  private Reading add(
      Draft draft, Session session, String checkPoint, TypedDecimal value, Reading.Source source) {
    SheetCheckPoint point = checkPoint(draft.sheet(), checkPoint);
    if (point.toGo() == 0) {
      throw RunRefused.allReadingsIn(checkPoint, point.planned().readings());
    }
    return keep(draft, reading(session, checkPoint, nextPosition(point), value, source));
  }

  private static Reading reading(
      Session session, String checkPoint, int position, TypedDecimal value, Reading.Source source) {
    return new Reading(
        0,
        checkPoint,
        position,
        value,
        session.now(),
        session.person().id(),
        source,
        Optional.empty(),
        Optional.empty(),
        Optional.empty());
  }

  private Reading keep(Draft draft, Reading reading) {
    long id = runs.addReading(draft.transaction(), draft.sheet().run().number(), reading);
    return new Reading(
        id,
        reading.checkPoint(),
        reading.position(),
        reading.value(),
        reading.at(),
        reading.personId(),
        reading.source(),
        reading.sourceKey(),
        reading.corrects(),
        reading.strike());
  }

  private static int nextPosition(SheetCheckPoint point) {
    return point.readings().stream().mapToInt(Reading::position).max().orElse(0) + 1;
  }

  private static SheetCheckPoint checkPoint(RunSheet sheet, String label) {
    return sheet
        .checkPoint(label)
        .orElseThrow(() -> new NotFound(NotFound.Thing.CHECK_POINT, label));
  }

  private static Reading counting(RunSheet sheet, long readingId) {
    Reading reading =
        sheet.checkPoints().stream()
            .flatMap(point -> point.readings().stream())
            .filter(r -> r.id() == readingId)
            .findFirst()
            .orElseThrow(() -> new NotFound(NotFound.Thing.READING, Long.toString(readingId)));
    boolean counts =
        sheet.checkPoints().stream().anyMatch(point -> point.counting().contains(reading));
    if (!counts) {
      throw RunRefused.readingNoLongerCounts(reading.position());
    }
    return reading;
  }

  private DecimalSign sign(Transaction transaction) {
    return sheets.laboratory(transaction).decimalSign();
  }

  private static TypedDecimal parse(String typed, DecimalSign sign) {
    try {
      return TypedDecimal.parse(typed, sign);
    } catch (NumberRefused why) {
      throw RunRefused.reading(why);
    }
  }

  private static List<TypedDecimal> parseLines(List<String> lines, DecimalSign sign) {
    List<TypedDecimal> values = new ArrayList<>();
    for (int i = 0; i < lines.size(); i++) {
      if (!lines.get(i).isBlank()) {
        try {
          values.add(TypedDecimal.parse(lines.get(i), sign));
        } catch (NumberRefused why) {
          throw RunRefused.readingInLine(i + 1, why);
        }
      }
    }
    return values;
  }
}
