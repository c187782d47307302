package org.evenbeam.store;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.concurrent.atomic.AtomicLong;
import org.h2.store.fs.FileBase;
import org.h2.store.fs.FilePath;
import org.h2.store.fs.FilePathWrapper;

/** A file system of H2 on which only so many bytes can be written. */
public final class FullDisk extends FilePathWrapper {
  static final String SCHEME = "fulldisk";

  private static final AtomicLong LEFT = new AtomicLong(Long.MAX_VALUE);

  private static final AtomicInteger FAILING_FORCES = new AtomicInteger();

  /** Made by H2 too, through a prototype. */
  public FullDisk() {}

  static void register() {
    FilePath.register(new FullDisk());
  }

  static void leave(long bytes) {
    LEFT.set(bytes);
  }

  static void free() {
    LEFT.set(Long.MAX_VALUE);
    FAILING_FORCES.set(0);
  }

  /** The next writing through fails, as where space is given out late; what was written stays. */
  static void failOneForce() {
    FAILING_FORCES.set(1);
  }

  @Override
  public String getScheme() {
    return SCHEME;
  }

  @Override
  public FileChannel open(String mode) throws IOException {
    return new Channel(getBase().open(mode));
  }

  /** Takes from what is left; a write that does not fit is written in part, as by a real disk. */
  private static int fitting(int wanted) {
    long before = LEFT.getAndUpdate(left -> Math.max(0, left - wanted));
    return (int) Math.min(before, wanted);
  }

  private static final class Channel extends FileBase {
    private final FileChannel file;

    Channel(FileChannel file) {
      this.file = file;
    }

    @Override
    public synchronized int write(ByteBuffer source, long position) throws IOException {
      ByteBuffer part = fittingPart(source);
      int written = file.write(part, position);
      return after(source, part, written);
    }

    @Override
    public int write(ByteBuffer source) throws IOException {
      ByteBuffer part = fittingPart(source);
      int written = file.write(part);
      return after(source, part, written);
    }

    private static ByteBuffer fittingPart(ByteBuffer source) {
      ByteBuffer part = source.duplicate();
      part.limit(source.position() + fitting(source.remaining()));
      return part;
    }

    private static int after(ByteBuffer source, ByteBuffer part, int written) throws IOException {
      source.position(part.position());
      if (source.hasRemaining()) {
        throw new IOException("No space left on device");
      }
      return written;
    }

    @Override
    public FileChannel truncate(long size) throws IOException {
      file.truncate(size);
      return this;
    }

    @Override
    public int read(ByteBuffer target) throws IOException {
      return file.read(target);
    }

    @Override
    public synchronized int read(ByteBuffer target, long position) throws IOException {
      return file.read(target, position);
    }

    @Override
    public long position() throws IOException {
      return file.position();
    }

    @Override
    public FileChannel position(long position) throws IOException {
      file.position(position);
      return this;
    }

    @Override
    public long size() throws IOException {
      return file.size();
    }

    @Override
    public void force(boolean metadata) throws IOException {
      if (FAILING_FORCES.getAndUpdate(left -> Math.max(0, left - 1)) > 0) {
        throw new IOException("No space left on device");
      }
      file.force(metadata);
    }

    @Override
    public FileLock tryLock(long position, long size, boolean shared) throws IOException {
      return file.tryLock(position, size, shared);
    }

    @Override
    protected void implCloseChannel() throws IOException {
      file.close();
    }
  }
}
