package org.evenbeam.ui.common;

import atlantafx.base.theme.PrimerDark;
import atlantafx.base.theme.PrimerLight;
import java.util.Locale;
import java.util.Objects;
import javafx.application.Application;
import javafx.scene.Scene;

/** Light or dark: the program's own colours over the controls' own lay-out. */
public enum Theme {
  /** Dark ink on light ground. */
  LIGHT,
  /** Light ink on dark ground. */
  DARK;

  /** Dresses a scene. */
  public void dress(Scene scene) {
    Application.setUserAgentStylesheet(
        this == LIGHT
            ? new PrimerLight().getUserAgentStylesheet()
            : new PrimerDark().getUserAgentStylesheet());
    scene.getStylesheets().setAll(sheet(name().toLowerCase(Locale.ROOT)), sheet("evenbeam"));
  }

  /** The other one. */
  public Theme other() {
    return this == LIGHT ? DARK : LIGHT;
  }

  private static String sheet(String name) {
    String file = "/org/evenbeam/ui/common/" + name + ".css";
    return Objects.requireNonNull(Theme.class.getResource(file), file).toExternalForm();
  }
}
