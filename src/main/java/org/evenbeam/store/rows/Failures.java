package org.evenbeam.store.rows;

import java.io.IOException;
import java.nio.file.Path;
import java.sql.SQLException;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.evenbeam.logbook.AlreadyThere;
import org.evenbeam.logbook.LogbookException;
import org.evenbeam.logbook.NotFound.Thing;
import org.evenbeam.logbook.StoreFailed;
import org.evenbeam.logbook.StoreFailed.Reason;
import org.evenbeam.store.guard.AppendOnly;
import org.h2.mvstore.DataUtils;
import org.h2.mvstore.MVStoreException;

/** Says what a failure of the database means to the logbook. */
public final class Failures {
  private static final Pattern CONSTRAINT = Pattern.compile("\"(?:\\w+\\.)?(\\w+)");
  private static final long HARDLY_ANY_SPACE = 1L << 20;

  /** SQLStates as H2 and PostgreSQL report them. */
  private static final Map<String, Reason> BY_STATE =
      Map.ofEntries(
          Map.entry("22001", Reason.RULE_BROKEN), // a text is too long
          Map.entry("23502", Reason.RULE_BROKEN), // a column is empty
          Map.entry("23503", Reason.RULE_BROKEN), // something refers to the row
          Map.entry("23505", Reason.CHANGED_MEANWHILE), // unique
          Map.entry("23506", Reason.RULE_BROKEN), // what is referred to is missing
          Map.entry("23513", Reason.RULE_BROKEN), // a check
          Map.entry("23514", Reason.RULE_BROKEN), // a check, PostgreSQL
          Map.entry(AppendOnly.REFUSED, Reason.RULE_BROKEN),
          Map.entry("90096", Reason.RULE_BROKEN), // no right to it
          Map.entry("40001", Reason.CHANGED_MEANWHILE), // deadlock
          Map.entry("HYT00", Reason.CHANGED_MEANWHILE), // waited too long for a row
          Map.entry("53100", Reason.DISK_FULL), // PostgreSQL
          Map.entry("90020", Reason.IN_USE),
          Map.entry("90030", Reason.DAMAGED),
          Map.entry("90048", Reason.DAMAGED), // a file of another kind
          Map.entry("90097", Reason.READ_ONLY));

  /** What H2's storage reports when the file does not hold what it should. */
  private static final Set<Integer> DAMAGE =
      Set.of(
          DataUtils.ERROR_READING_FAILED,
          DataUtils.ERROR_INTERNAL,
          DataUtils.ERROR_UNSUPPORTED_FORMAT,
          DataUtils.ERROR_FILE_CORRUPT,
          DataUtils.ERROR_CHUNK_NOT_FOUND,
          DataUtils.ERROR_BLOCK_NOT_FOUND);

  /** Which thing is taken when a unique constraint refuses a row, and the column with its name. */
  private static final Map<String, Taken> TAKEN =
      Map.ofEntries(
          Map.entry("laboratory_key", new Taken(Thing.LABORATORY, "name")),
          Map.entry("person_sign_in_name_once", new Taken(Thing.PERSON, "sign_in_name")),
          Map.entry("instrument_tag_once", new Taken(Thing.INSTRUMENT, "tag")),
          Map.entry("reference_standard_tag_once", new Taken(Thing.STANDARD, "tag")),
          Map.entry(
              "standard_certificate_number_once", new Taken(Thing.STANDARD_CERTIFICATE, "number")),
          Map.entry("certified_value_label_once", new Taken(Thing.CERTIFIED_VALUE, "label")),
          Map.entry("check_point_label_once", new Taken(Thing.CHECK_POINT, "label")),
          Map.entry("reading_source_once", new Taken(Thing.READING, "source_key")),
          Map.entry("certificate_key", new Taken(Thing.CERTIFICATE, "number")),
          Map.entry("certificate_document_key", new Taken(Thing.CERTIFICATE, "number")));

  private final Path where;

  private record Taken(Thing thing, String column) {}

  /** Names that file in what it says. */
  public Failures(Path where) {
    this.where = where;
  }

  /** What a failure means that came of no row in particular. */
  public StoreFailed of(Throwable failure) {
    return because(reason(failure), failure);
  }

  /** A failure for that reason. */
  public StoreFailed because(Reason reason, Throwable failure) {
    return new StoreFailed(reason, where, detail(failure), failure);
  }

  /** What it means that the row was refused. */
  LogbookException of(Throwable failure, Row row) {
    return sql(failure)
        .filter(refusal -> "23505".equals(refusal.getSQLState()))
        .flatMap(Failures::constraint)
        .map(TAKEN::get)
        .<LogbookException>map(
            taken -> new AlreadyThere(taken.thing, String.valueOf(row.columns().get(taken.column))))
        .orElseGet(() -> of(failure));
  }

  private Reason reason(Throwable failure) {
    if (isDiskFull(failure)) {
      return Reason.DISK_FULL;
    }
    if (isDamaged(failure)) {
      return Reason.DAMAGED;
    }
    return sql(failure)
        .map(refusal -> BY_STATE.getOrDefault(refusal.getSQLState(), Reason.OTHER))
        .orElse(Reason.OTHER);
  }

  private static boolean isDamaged(Throwable failure) {
    for (Throwable cause = failure; cause != null; cause = cause.getCause()) {
      if (cause instanceof MVStoreException storage && DAMAGE.contains(storage.getErrorCode())) {
        return true;
      }
    }
    return false;
  }

  /**
   * The operating system says so in its own language, so the space left is asked too when writing
   * failed.
   */
  private boolean isDiskFull(Throwable failure) {
    for (Throwable cause = failure; cause != null; cause = cause.getCause()) {
      if (cause instanceof IOException && (saysDiskFull(cause) || isSpaceUsedUp())) {
        return true;
      }
    }
    return false;
  }

  private static boolean saysDiskFull(Throwable cause) {
    String message = String.valueOf(cause.getMessage()).toLowerCase(Locale.ROOT);
    return message.contains("no space left")
        || message.contains("not enough space")
        || message.contains("quota exceeded");
  }

  private boolean isSpaceUsedUp() {
    Path folder = where.toAbsolutePath().getParent();
    return folder != null
        && folder.toFile().getTotalSpace() > 0
        && folder.toFile().getUsableSpace() < HARDLY_ANY_SPACE;
  }

  private static Optional<String> constraint(SQLException refusal) {
    Matcher named = CONSTRAINT.matcher(String.valueOf(refusal.getMessage()));
    return named.find() ? Optional.of(named.group(1).toLowerCase(Locale.ROOT)) : Optional.empty();
  }

  private static Optional<SQLException> sql(Throwable failure) {
    for (Throwable cause = failure; cause != null; cause = cause.getCause()) {
      if (cause instanceof SQLException refusal) {
        return Optional.of(refusal);
      }
    }
    return Optional.empty();
  }

  private static String detail(Throwable failure) {
    return sql(failure).map(Throwable::getMessage).orElseGet(() -> String.valueOf(failure));
  }
}
