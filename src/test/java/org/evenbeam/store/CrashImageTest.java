package org.evenbeam.store;

import static java.nio.charset.StandardCharsets.US_ASCII;
import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.sql.SQLException;
import org.evenbeam.logbook.Role;
import org.evenbeam.logbook.Transaction;
import org.evenbeam.logbook.UseCase;
import org.evenbeam.logbook.people.NewPerson;
import org.evenbeam.logbook.people.PasswordHash;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * A copy of the file made at once after an acknowledgement is what a program killed at that moment
 * leaves. Each one has to end with the change acknowledged, wherever in the file the database put
 * it; a kill meets the rare bad moment only now and then.
 */
class CrashImageTest {
  /**
   * How long the database leaves pages that are out of date untouched: 45 s usually, after which it
   * writes into their place. In a test that is over in less, this makes a file of some age.
   */
  private static final int RETENTION_MILLIS = 10;

  /** What a write that was cut off leaves: no whole number of blocks, no end. */
  private static final byte[] TORN_WRITE = "chunk:1,block:2,".repeat(500).getBytes(US_ASCII);

  private static final int LIVES = 6;
  private static final int CHANGES_A_LIFE = 20;

  @TempDir Path directory;
  @TempDir Path elsewhere;

  @Test
  void everyAcknowledgedChangeIsInTheFileAsItIsAtThatMoment() throws Exception {
    LogbookFolder folder = LogbookFolder.at(directory);
    for (int life = 0; life < LIVES; life++) {
      try (LogbookStore store = LogbookStore.open(directory, () -> false)) {
        new FolderStore(directory).byOwner("set retention_time " + RETENTION_MILLIS);
        live(new Story(store), folder, life);
      }
      if (life % 2 == 1) {
        Files.copy(image(folder), folder.database(), StandardCopyOption.REPLACE_EXISTING);
      }
    }
  }

  private void live(Story story, LogbookFolder folder, int life) throws Exception {
    for (int change = 0; change < CHANGES_A_LIFE; change++) {
      String name = "person" + life + "at" + change;
      story.does(UseCase.ADD_PERSON, t -> add(story, t, name));
      String head = story.read(t -> story.store.trail().head(t).hash());
      Files.copy(folder.database(), image(folder), StandardCopyOption.REPLACE_EXISTING);
      endsWith(head, folder, "life " + life + ", change " + change);
      Files.write(image(folder), TORN_WRITE, StandardOpenOption.APPEND);
      endsWith(head, folder, "life " + life + ", change " + change + ", next write torn");
    }
  }

  private void endsWith(String head, LogbookFolder folder, String when) throws Exception {
    assertThat(headOf(image(folder), Passwords.read(folder.passwords()))).as(when).isEqualTo(head);
  }

  private static void add(Story story, Transaction transaction, String name) {
    long key = story.store.people().add(transaction, new NewPerson(name, name, Role.AUDITOR));
    PasswordHash hash = new PasswordHash("of " + name);
    story.store.people().setPassword(transaction, key, hash, Story.NOON);
  }

  private Path image(LogbookFolder folder) {
    return elsewhere.resolve(folder.database().getFileName());
  }

  private static String headOf(Path image, Passwords passwords) throws SQLException {
    String url = "jdbc:h2:" + LogbookFolder.withoutEnding(image) + ";ACCESS_MODE_DATA=r";
    try (OwnersConnection owner = OwnersConnection.open(url, passwords)) {
      return owner.head();
    }
  }
}
