package org.evenbeam.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assumptions.assumeThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.sql.SQLException;
import java.util.Arrays;
import java.util.List;
import org.evenbeam.logbook.Person;
import org.evenbeam.logbook.StoreFailed;
import org.evenbeam.logbook.StoreFailed.Reason;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class OpeningTest {
  private static final String DATABASE = "logbook.mv.db";
  private static final String PASSWORDS = "logbook-passwords.properties";

  @TempDir Path folder;

  @Test
  void whatWasKeptIsThereWhenOpenedAgain() {
    makeLogbook();
    try (LogbookStore store = open()) {
      assertThat(people(store)).isEqualTo(3);
      assertThat(TrailAndTables.check(store)).isEmpty();
    }
  }

  @Test
  void folderHoldsTheDatabaseAndPasswordsThatOnlyTheOwnerReads() throws IOException {
    makeLogbook();
    try (var files = Files.list(folder)) {
      assertThat(files.map(file -> file.getFileName().toString()))
          .containsExactlyInAnyOrder(DATABASE, PASSWORDS, "logbook.lock");
    }
    assertThat(PosixFilePermissions.toString(Files.getPosixFilePermissions(file(PASSWORDS))))
        .isEqualTo("rw-------");
  }

  @Test
  void relativeFolderIsTakenByItsAbsolutePath() {
    makeLogbook();
    Path relative = Path.of("").toAbsolutePath().relativize(folder.toAbsolutePath());
    try (LogbookStore store = LogbookStore.open(relative, () -> false)) {
      assertThat(people(store)).isEqualTo(3);
    }
  }

  @Test
  void halfMadeDatabaseIsMadeAnew() throws IOException {
    Files.writeString(file("logbook-new.mv.db"), "cut off by a crash");
    makeLogbook();
    assertThat(file("logbook-new.mv.db")).doesNotExist();
    assertThat(file(DATABASE)).exists();
  }

  @Test
  void missingFolderIsRefused() {
    refused(folder.resolve("none"), Reason.READ_ONLY, folder.resolve("none"));
  }

  @Test
  void fileInPlaceOfAFolderIsRefused() throws IOException {
    Path file = Files.createFile(folder.resolve("file"));
    refused(file, Reason.READ_ONLY, file);
  }

  @Test
  void folderThatCannotBeWrittenToIsRefused() {
    Path kernels = Path.of("/proc");
    assumeThat(kernels).isDirectory();
    refused(kernels, Reason.READ_ONLY, kernels);
  }

  @Test
  void folderWithASemicolonIsRefused() throws IOException {
    Path odd = Files.createDirectory(folder.resolve("a;b"));
    refused(odd, Reason.OTHER, odd);
  }

  @Test
  void newerSchemaIsRefusedAndLeftAsItIs() throws SQLException {
    makeLogbook();
    try (LogbookStore store = open()) {
      assertThat(people(store)).isEqualTo(3);
      new FolderStore(folder)
          .byOwner(
              "insert into \"schema_history\" select \"installed_rank\" + 100, '999',"
                  + " 'from the future', \"type\", \"script\", \"checksum\", \"installed_by\","
                  + " \"installed_on\", \"execution_time\", \"success\""
                  + " from \"schema_history\" where \"version\" = '002'");
    }
    StoreFailed failed = refused(folder, Reason.NEWER_SCHEMA, file(DATABASE));
    assertThat(failed.arguments().get(2).toString()).contains("999 from the future");
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "empty",
        "ten bytes",
        "header overwritten",
        "all overwritten",
        "headers alone left"
      })
  void damagedFileIsRefused(String damage) throws IOException {
    makeLogbook();
    byte[] bytes = Files.readAllBytes(file(DATABASE));
    Files.write(file(DATABASE), damaged(bytes, damage));
    refused(folder, Reason.DAMAGED, file(DATABASE));
  }

  @Test
  void anotherDatabasesFileIsRefused() throws IOException {
    makeLogbook();
    Files.writeString(file(DATABASE), "SQLite format 3\u0000".repeat(2000));
    refused(folder, Reason.DAMAGED, file(DATABASE));
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "owner=1", "owner=\\u00zz"})
  void unreadablePasswordsAreRefused(String text) throws IOException {
    makeLogbook();
    Files.writeString(file(PASSWORDS), text);
    refused(folder, Reason.DAMAGED, file(PASSWORDS));
  }

  @Test
  void missingPasswordsAreRefusedAndNotMadeAnew() throws IOException {
    makeLogbook();
    Files.delete(file(PASSWORDS));
    refused(folder, Reason.DAMAGED, file(PASSWORDS));
    assertThat(file(PASSWORDS)).doesNotExist();
  }

  @Test
  void passwordsOfAnotherLaboratoryAreRefused() throws IOException {
    makeLogbook();
    Passwords.random(file(PASSWORDS)).write();
    refused(folder, Reason.DAMAGED, file(PASSWORDS));
  }

  @Test
  void databaseIsUsableAfterARefusedOpening() throws IOException {
    makeLogbook();
    byte[] passwords = Files.readAllBytes(file(PASSWORDS));
    Passwords.random(file(PASSWORDS)).write();
    refused(folder, Reason.DAMAGED, file(PASSWORDS));
    Files.write(file(PASSWORDS), passwords);
    try (LogbookStore store = open()) {
      assertThat(people(store)).isEqualTo(3);
    }
  }

  private static byte[] damaged(byte[] bytes, String damage) {
    return switch (damage) {
      case "empty" -> new byte[0];
      case "ten bytes" -> Arrays.copyOf(bytes, 10);
      case "headers alone left" -> Arrays.copyOf(bytes, 8192);
      case "header overwritten" -> overwritten(bytes, 8192);
      default -> overwritten(bytes, bytes.length);
    };
  }

  private static byte[] overwritten(byte[] bytes, int length) {
    byte[] copy = bytes.clone();
    Arrays.fill(copy, 0, length, (byte) 7);
    return copy;
  }

  private void makeLogbook() {
    try (LogbookStore store = open()) {
      new Story(store).setUp();
    }
  }

  private LogbookStore open() {
    return LogbookStore.open(folder, () -> false);
  }

  private Path file(String name) {
    return folder.resolve(name);
  }

  private static int people(LogbookStore store) {
    List<Person> people = store.transactions().read(store.people()::all);
    return people.size();
  }

  private static StoreFailed refused(Path laboratory, Reason reason, Path named) {
    StoreFailed[] caught = new StoreFailed[1];
    assertThatThrownBy(() -> LogbookStore.open(laboratory, () -> false))
        .isInstanceOfSatisfying(
            StoreFailed.class,
            failed -> {
              assertThat(failed.reason()).as(failed.getMessage()).isEqualTo(reason);
              assertThat(failed.arguments().get(1)).isEqualTo(named.toString());
              caught[0] = failed;
            });
    return caught[0];
  }
}
