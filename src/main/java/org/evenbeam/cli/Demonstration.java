package org.evenbeam.cli;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.evenbeam.verification.Verdict;

/** The demonstration laboratory, as the command line sees it. */
public interface Demonstration {
  /**
   * A certificate written to a file.
   *
   * @param number the certificate's number
   * @param instrumentTag the instrument
   * @param verdict the run's verdict
   * @param file where it was written
   */
  record Written(String number, String instrumentTag, Optional<Verdict> verdict, Path file) {}

  /** Whether there is a display to open a window on. */
  boolean hasDisplay();

  /**
   * Opens the window on the demonstration laboratory; returns the exit status when it is closed.
   */
  int openWindow();

  /** Does the same job without a window: imports, evaluates and writes the certificates. */
  List<Written> writeCertificates();
}
