package org.evenbeam.store;

import java.io.Closeable;
import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.Set;
import java.util.concurrent.ConcurrentHashMap;
import org.evenbeam.logbook.StoreFailed;
import org.evenbeam.logbook.StoreFailed.Reason;
import org.evenbeam.store.rows.Failures;

/**
 * Holds a laboratory's folder for one program. The database locks its own file, but on Linux that
 * lock is gone as soon as this program opens and closes the file once more, as a copy does. Nothing
 * ever reads this one, save a program that was refused and wants to know by whom.
 */
final class FolderLock implements Closeable {
  /** Behind any content, so that the content stays readable where locks are mandatory. */
  private static final long LOCKED_BYTE = Long.MAX_VALUE - 1;

  /** The folders held by this program: a second channel to a lock's file would release the lock. */
  private static final Set<Path> HELD = ConcurrentHashMap.newKeySet();

  private final Path file;
  private final FileChannel channel;

  private FolderLock(Path file, FileChannel channel) {
    this.file = file;
    this.channel = channel;
  }

  /**
   * Takes the folder.
   *
   * @throws StoreFailed IN_USE, naming the database and the process that holds it
   */
  static FolderLock take(LogbookFolder folder) {
    Failures failures = new Failures(folder.database());
    try {
      Path file = folder.folder().toRealPath().resolve("logbook.lock");
      if (!HELD.add(file)) {
        throw inUse(failures, Long.toString(ProcessHandle.current().pid()));
      }
      return lock(file, failures);
    } catch (IOException failed) {
      throw failures.of(failed);
    }
  }

  /** Gives the folder free. */
  @Override
  public void close() throws IOException {
    if (channel.isOpen()) {
      channel.close();
      HELD.remove(file);
    }
  }

  private static FolderLock lock(Path file, Failures failures) throws IOException {
    FileChannel channel = null;
    boolean locked = false;
    try {
      channel = FileChannel.open(file, StandardOpenOption.CREATE, StandardOpenOption.WRITE);
      locked = channel.tryLock(LOCKED_BYTE, 1, false) != null;
      if (!locked) {
        throw inUse(failures, Files.readString(file, StandardCharsets.US_ASCII).strip());
      }
      channel.truncate(0);
      String process = Long.toString(ProcessHandle.current().pid());
      channel.write(ByteBuffer.wrap(process.getBytes(StandardCharsets.US_ASCII)));
      return new FolderLock(file, channel);
    } finally {
      if (!locked) {
        HELD.remove(file);
        if (channel != null) {
          channel.close();
        }
      }
    }
  }

  private static StoreFailed inUse(Failures failures, String process) {
    return failures.because(Reason.IN_USE, new IOException("in use by process " + process));
  }
}
