package org.evenbeam.store;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.sql.SQLException;
import org.evenbeam.store.rows.Failures;

/**
 * How a database that closed itself is opened again, and looked at where it cannot be.
 *
 * @param url where it is
 * @param file its file
 * @param passwords of its users
 * @param failures names it
 */
record Reopening(String url, Path file, Passwords passwords, Failures failures) {
  /**
   * Opens it.
   *
   * @throws org.evenbeam.logbook.StoreFailed with the reason
   */
  Database open() {
    return Database.open(url, passwords, failures);
  }

  /**
   * Whether its file ends with that entry, looked at without writing, as a full disk asks for. If
   * so, the file is written through.
   *
   * @param head the hash looked for in the chain's head
   */
  boolean isKept(String head) throws SQLException, IOException {
    try (OwnersConnection owner =
        OwnersConnection.open(url + ";IFEXISTS=TRUE;ACCESS_MODE_DATA=r", passwords)) {
      if (!owner.head().equals(head)) {
        return false;
      }
    }
    try (FileChannel channel = FileChannel.open(file, StandardOpenOption.WRITE)) {
      channel.force(true);
      return true;
    }
  }
}
