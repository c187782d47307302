package org.evenbeam.store;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.sql.SQLException;
import org.h2.mvstore.MVStoreException;
import org.h2.mvstore.MVStoreTool;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/**
 * Rewrites a closed database without the space that older versions of its pages took. Each change
 * writes some 40 kB of pages at the file's end, of which nearly all are out of date a moment later.
 *
 * <p>A copy is rewritten, since H2 removes the old file before the new one is on the disk. The copy
 * is on the disk and has been opened and compared before it takes the place of the old file, by one
 * renaming: a crash leaves one of the two, whole.
 */
final class Compaction {
  private static final Logger LOG = LoggerFactory.getLogger(Compaction.class);
  private static final long WORTH_IT_BYTES = 32L << 20;
  private static final int WORTH_IT_FILL_PERCENT = 50;

  private Compaction() {}

  /**
   * Whether rewriting gains anything worth its time, a second or so.
   *
   * @param bytes the file's size
   * @param fillPercent how much of it is in use, 0 to 100
   */
  static boolean isWorthIt(long bytes, int fillPercent) {
    return bytes > WORTH_IT_BYTES && fillPercent < WORTH_IT_FILL_PERCENT;
  }

  /**
   * Rewrites the database of a folder that this program holds and has closed. When that does not
   * succeed, as on a full disk, the old file stays and the log says why.
   *
   * @param head the hash in the chain's head, to be found again
   */
  static void run(LogbookFolder folder, Passwords passwords, String head) {
    Path rewritten = folder.newDatabase();
    try {
      Files.copy(folder.database(), rewritten, StandardCopyOption.REPLACE_EXISTING);
      rewrite(rewritten);
      if (!head.equals(headOf(rewritten, passwords))) {
        throw new IOException("the rewritten database has another head of its trail");
      }
      Files.move(rewritten, folder.database(), StandardCopyOption.ATOMIC_MOVE);
    } catch (IOException | SQLException | MVStoreException failed) {
      LOG.warn("The database was not compacted and stays as it was: {}", failed.toString());
    }
  }

  /** Rewrites a closed database that nothing depends on yet, and writes it through to the disk. */
  static void rewrite(Path database) throws IOException {
    MVStoreTool.compact(database.toString(), false);
    try (FileChannel channel = FileChannel.open(database, StandardOpenOption.WRITE)) {
      channel.force(true);
    }
  }

  private static String headOf(Path database, Passwords passwords) throws SQLException {
    String url = "jdbc:h2:" + LogbookFolder.withoutEnding(database) + ";IFEXISTS=TRUE";
    try (OwnersConnection owner = OwnersConnection.open(url, passwords)) {
      return owner.head();
    }
  }
}
