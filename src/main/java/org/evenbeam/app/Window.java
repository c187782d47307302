package org.evenbeam.app;

import java.nio.file.Path;
import org.evenbeam.logbook.certificates.CertificatePress;

/** The program's window on a laboratory's folder. */
final class Window {
  Window(Path folder, CertificatePress press, boolean demonstration) {}

  int open() {
    return 2;
  }
}
