package org.evenbeam.ui.common;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.Objects;
import javafx.scene.text.Font;
import javafx.scene.text.FontWeight;

/** The program's own font, the same on screen and paper whatever the machine has. */
public final class Fonts {
  /** The family's name. */
  public static final String FAMILY = "Liberation Sans";

  private static final List<String> FILES =
      List.of("/liberation/LiberationSans-Regular.ttf", "/liberation/LiberationSans-Bold.ttf");

  private Fonts() {}

  /** Loads it; to be called before anything else of the toolkit, which fails without any font. */
  public static void load() {
    FILES.forEach(Fonts::load);
  }

  /** The font in that size. */
  static Font of(double size, boolean bold) {
    return Font.font(FAMILY, bold ? FontWeight.BOLD : FontWeight.NORMAL, size);
  }

  private static void load(String file) {
    try (InputStream in = Fonts.class.getResourceAsStream(file)) {
      Font font = Font.loadFont(Objects.requireNonNull(in, file), 13);
      Objects.requireNonNull(font, file);
    } catch (IOException unreadable) {
      throw new UncheckedIOException(unreadable);
    }
  }
}
