package org.evenbeam.app;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Stream;
import org.evenbeam.exchange.LaboratoryImport;
import org.evenbeam.logbook.StoreFailed;
import org.evenbeam.logbook.certificates.CertificatePress;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/**
 * The folder of the demonstration laboratory. It is imported under another name and moved into
 * place when it is whole, so that a half import is never taken for one.
 */
final class DemonstrationFolder {
  private static final Logger LOG = LoggerFactory.getLogger(DemonstrationFolder.class);
  private static final String MARK = "demonstration-laboratory";

  private final Path folder;
  private final CertificatePress press;

  DemonstrationFolder(Path folder, CertificatePress press) {
    this.folder = folder.toAbsolutePath().normalize();
    this.press = press;
  }

  /** Where it lies. */
  Path path() {
    return folder;
  }

  /**
   * Imports the laboratory where there is none yet.
   *
   * @param fresh whether to put an existing one back to its start
   * @throws StoreFailed when the folder cannot be written to, holds something else or is in use
   */
  void prepare(boolean fresh) {
    Path beside = folder.resolveSibling(folder.getFileName() + "-import");
    try {
      if (Files.exists(folder.resolve(MARK)) && !fresh) {
        return;
      }
      requireOurs();
      requireNotInUse();
      remove(beside);
      Files.createDirectories(beside);
      importInto(beside);
      Files.createFile(beside.resolve(MARK));
      remove(folder);
      Files.move(beside, folder, StandardCopyOption.ATOMIC_MOVE);
    } catch (IOException failed) {
      throw new StoreFailed(StoreFailed.Reason.READ_ONLY, folder, failed.toString(), failed);
    }
  }

  private void importInto(Path beside) {
    try (OpenLaboratory laboratory = OpenLaboratory.in(beside, press, () -> false)) {
      laboratory.inBulk(
          () ->
              DemonstrationData.read(
                  tables -> new LaboratoryImport(tables).into(laboratory.logbook())));
    }
  }

  /** What another program works on is not put back to its start; what is damaged may well be. */
  private void requireNotInUse() {
    if (!Files.exists(folder.resolve(MARK))) {
      return;
    }
    try {
      OpenLaboratory.in(folder, press, () -> false).close();
    } catch (StoreFailed failed) {
      if (failed.reason() == StoreFailed.Reason.IN_USE) {
        throw failed;
      }
      LOG.info("A demonstration laboratory that does not open is replaced", failed);
    }
  }

  /** A folder that holds anything but a demonstration laboratory is left alone. */
  private void requireOurs() throws IOException {
    if (!Files.exists(folder) || Files.exists(folder.resolve(MARK))) {
      return;
    }
    try (Stream<Path> content = Files.list(folder)) {
      if (content.findAny().isPresent()) {
        throw new IOException("it holds something else than a demonstration laboratory");
      }
    }
  }

  private static void remove(Path tree) throws IOException {
    if (!Files.exists(tree)) {
      return;
    }
    List<Path> content;
    try (Stream<Path> walk = Files.walk(tree)) {
      content = walk.sorted(Comparator.reverseOrder()).toList();
    }
    for (Path path : content) {
      Files.delete(path);
    }
  }
}
