package org.evenbeam.ui.common;

import java.nio.file.Path;

/** Hands a file to the machine's own viewer. */
@FunctionalInterface
public interface DocumentViewer {
  /** Shows the file; false where this machine has no viewer for it. */
  boolean show(Path file);
}
