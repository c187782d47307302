package org.evenbeam.ui.certificates;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;

/** Writes a certificate's document to a file. */
final class DocumentFiles {
  private DocumentFiles() {}

  /** Into a new folder for temporary files, which nobody else can read. */
  static Path temporary(String number, byte[] document) {
    try {
      Path folder = Files.createTempDirectory("evenbeam-certificate");
      return write(folder.resolve(number + ".pdf"), document);
    } catch (IOException failed) {
      throw new UncheckedIOException(failed);
    }
  }

  /** Where the person wants it. */
  static Path write(Path file, byte[] document) {
    try {
      return Files.write(file, document);
    } catch (IOException failed) {
      throw new UncheckedIOException(failed);
    }
  }
}
