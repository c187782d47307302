package org.evenbeam.store;

import java.util.Arrays;
import org.evenbeam.logbook.StoreFailed.Reason;
import org.evenbeam.store.rows.Failures;
import org.flywaydb.core.Flyway;
import org.flywaydb.core.api.FlywayException;
import org.flywaydb.core.api.MigrationInfo;

/** The schema of a database and its migrations. */
final class Schema {
  private final Flyway flyway;
  private final Failures failures;

  Schema(String url, String user, String password, Failures failures) {
    this.failures = failures;
    this.flyway =
        Flyway.configure()
            .dataSource(url, user, password)
            .locations("classpath:migrations/common", "classpath:migrations/h2")
            .table("schema_history")
            .failOnMissingLocations(true)
            .validateMigrationNaming(true)
            .cleanDisabled(true)
            .load();
  }

  /**
   * Brings the schema up to this program's. Nothing is written when it is there already, so that a
   * database can be opened while the disk is full.
   *
   * @throws org.evenbeam.logbook.StoreFailed NEWER_SCHEMA, with nothing changed, when a migration
   *     was applied that this program does not know
   */
  void migrate() {
    try {
      requireKnown();
      if (flyway.info().pending().length > 0) {
        flyway.migrate();
      } else {
        flyway.validate();
      }
    } catch (FlywayException refused) {
      throw failures.of(refused);
    }
  }

  /**
   * Asks for a database that holds a logbook.
   *
   * @throws org.evenbeam.logbook.StoreFailed DAMAGED when no migration was ever applied
   */
  void requireLogbook() {
    if (flyway.info().applied().length == 0) {
      throw failures.because(Reason.DAMAGED, new FlywayException("the database is empty"));
    }
  }

  private void requireKnown() {
    Arrays.stream(flyway.info().applied())
        .filter(migration -> !migration.getState().isResolved())
        .findFirst()
        .ifPresent(this::refuse);
  }

  private void refuse(MigrationInfo unknown) {
    String name = unknown.getVersion() + " " + unknown.getDescription();
    throw failures.because(
        Reason.NEWER_SCHEMA, new FlywayException("migration " + name + " is unknown"));
  }
}
