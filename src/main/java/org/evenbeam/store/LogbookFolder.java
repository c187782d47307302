package org.evenbeam.store;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.evenbeam.logbook.StoreFailed;
import org.evenbeam.logbook.StoreFailed.Reason;
import org.evenbeam.store.rows.Failures;

/** The files of the store in a laboratory's folder. */
record LogbookFolder(Path folder) {
  private static final String NAME = "logbook";
  private static final String NEW = "logbook-new";
  private static final String H2_ENDING = ".mv.db";

  /** The folder by its absolute path, which the database asks for. */
  static LogbookFolder at(Path folder) {
    return new LogbookFolder(folder.toAbsolutePath().normalize());
  }

  Path database() {
    return folder.resolve(NAME + H2_ENDING);
  }

  /** A database that is still being made; it gets its name when it is whole. */
  Path newDatabase() {
    return folder.resolve(NEW + H2_ENDING);
  }

  Path passwords() {
    return folder.resolve("logbook-passwords.properties");
  }

  /** The path as the database takes it, without the ending. */
  static String withoutEnding(Path database) {
    String path = database.toString();
    return path.substring(0, path.length() - H2_ENDING.length());
  }

  /**
   * Asks whether the folder can be worked in, by writing: a permission says less.
   *
   * @throws StoreFailed READ_ONLY when it is missing, no folder or cannot be written to
   */
  void requireUsable() {
    if (folder.toString().indexOf(';') >= 0) {
      throw refused(Reason.OTHER, new IOException("a folder's path may not hold a semicolon"));
    }
    if (!Files.isDirectory(folder)) {
      throw refused(Reason.READ_ONLY, new IOException("not a folder"));
    }
    try {
      Files.delete(Files.createTempFile(folder, "logbook-", ".probe"));
    } catch (IOException unwritable) {
      StoreFailed failed = new Failures(folder.resolve(NAME)).of(unwritable);
      throw failed.reason() == Reason.DISK_FULL ? failed : refused(Reason.READ_ONLY, unwritable);
    }
    if (Files.exists(database()) && !Files.isWritable(database())) {
      throw new Failures(database()).because(Reason.READ_ONLY, new IOException("read-only file"));
    }
  }

  private StoreFailed refused(Reason reason, IOException cause) {
    return new Failures(folder).because(reason, cause);
  }
}
