package org.evenbeam.store;

import java.io.IOException;
import java.io.StringReader;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.FileAttribute;
import java.nio.file.attribute.PosixFilePermissions;
import java.security.SecureRandom;
import java.util.HexFormat;
import java.util.Properties;
import java.util.regex.Pattern;
import org.evenbeam.logbook.StoreFailed.Reason;
import org.evenbeam.store.rows.Failures;

/**
 * The passwords of the database's two users, each 64 hexadecimal digits. They are made at random
 * when a laboratory is set up, and kept in its folder in a file that only its owner reads. They
 * keep a program that reaches the database by the everyday user from doing more than that user may;
 * they do not keep out whoever can read the folder.
 *
 * @param file where they are kept
 * @param owner of the user who owns tables and guards
 * @param everyday of the user by whom every use case works
 */
record Passwords(Path file, String owner, String everyday) {
  private static final Pattern FORM = Pattern.compile("[0-9a-f]{64}");

  /** New ones, to be kept in that file. */
  static Passwords random(Path file) {
    return new Passwords(file, randomDigits(), randomDigits());
  }

  /**
   * Reads them from the file.
   *
   * @throws org.evenbeam.logbook.StoreFailed DAMAGED when it is missing or holds something else
   */
  static Passwords read(Path file) {
    Properties properties = new Properties();
    try {
      properties.load(new StringReader(Files.readString(file)));
    } catch (IOException | IllegalArgumentException unreadable) {
      throw new Failures(file).because(Reason.DAMAGED, unreadable);
    }
    return new Passwords(
        file, digits(file, properties, "owner"), digits(file, properties, "everyday"));
  }

  /** Keeps them in their file, which is there whole or not at all. */
  void write() throws IOException {
    Path part = file.resolveSibling(file.getFileName() + ".part");
    Files.deleteIfExists(part);
    Files.createFile(part, ownerOnly());
    try (FileChannel channel = FileChannel.open(part, StandardOpenOption.WRITE)) {
      String text = "owner=" + owner + "\neveryday=" + everyday + "\n";
      ByteBuffer bytes = StandardCharsets.US_ASCII.encode(text);
      while (bytes.hasRemaining()) {
        channel.write(bytes);
      }
      channel.force(true);
    }
    Files.move(part, file, StandardCopyOption.ATOMIC_MOVE);
  }

  @Override
  public String toString() {
    return "Passwords";
  }

  private static String digits(Path file, Properties properties, String name) {
    String digits = properties.getProperty(name, "");
    if (!FORM.matcher(digits).matches()) {
      throw new Failures(file)
          .because(Reason.DAMAGED, new IOException("no 64 hexadecimal digits for " + name));
    }
    return digits;
  }

  private static String randomDigits() {
    byte[] bytes = new byte[32];
    new SecureRandom().nextBytes(bytes);
    return HexFormat.of().formatHex(bytes);
  }

  private static FileAttribute<?>[] ownerOnly() {
    boolean posix = FileSystems.getDefault().supportedFileAttributeViews().contains("posix");
    return posix
        ? new FileAttribute<?>[] {
          PosixFilePermissions.asFileAttribute(PosixFilePermissions.fromString("rw-------"))
        }
        : new FileAttribute<?>[0];
  }
}
