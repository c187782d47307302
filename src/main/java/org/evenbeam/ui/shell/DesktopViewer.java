package org.evenbeam.ui.shell;

import java.awt.Desktop;
import java.awt.GraphicsEnvironment;
import java.io.IOException;
import java.lang.System.Logger.Level;
import java.nio.file.Path;
import org.evenbeam.ui.common.DocumentViewer;

/** The desktop's own viewer. */
public final class DesktopViewer implements DocumentViewer {
  private static final System.Logger LOGGER = System.getLogger(DesktopViewer.class.getName());

  @Override
  public boolean show(Path file) {
    boolean can =
        !GraphicsEnvironment.isHeadless()
            && Desktop.isDesktopSupported()
            && Desktop.getDesktop().isSupported(Desktop.Action.OPEN);
    if (!can) {
      return false;
    }
    try {
      Desktop.getDesktop().open(file.toFile());
      return true;
    } catch (IOException noViewer) {
      LOGGER.log(Level.INFO, "No viewer for " + file, noViewer);
      return false;
    }
  }
}
