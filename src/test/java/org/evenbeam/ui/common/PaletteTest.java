package org.evenbeam.ui.common;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.Map;
import java.util.TreeMap;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class PaletteTest {
  private static final Pattern TOKEN = Pattern.compile("-([a-z-]+): #([0-9A-F]{6});");

  /** WCAG 2.2, 1.4.3 asks 4.5 : 1 of text. */
  @ParameterizedTest
  @CsvSource({
    "light,ink", "light,quiet", "light,beam", "light,level", "light,tilt", "light,sway",
    "dark,ink", "dark,quiet", "dark,beam", "dark,level", "dark,tilt", "dark,sway"
  })
  void textIsReadableOnGroundAndSheet(String theme, String text) throws IOException {
    Map<String, Integer> colours = colours(theme);
    assertThat(contrast(colours.get(text), colours.get("ground"))).isGreaterThanOrEqualTo(4.5);
    assertThat(contrast(colours.get(text), colours.get("sheet"))).isGreaterThanOrEqualTo(4.5);
  }

  @ParameterizedTest
  @CsvSource({"light", "dark"})
  void theMainActionIsReadable(String theme) throws IOException {
    Map<String, Integer> colours = colours(theme);
    assertThat(contrast(colours.get("on-beam"), colours.get("beam"))).isGreaterThanOrEqualTo(4.5);
  }

  private static Map<String, Integer> colours(String theme) throws IOException {
    try (InputStream in = Theme.class.getResourceAsStream(theme + ".css")) {
      Matcher token = TOKEN.matcher(new String(in.readAllBytes(), StandardCharsets.UTF_8));
      Map<String, Integer> colours = new TreeMap<>();
      while (token.find()) {
        colours.put(token.group(1), Integer.parseInt(token.group(2), 16));
      }
      return colours;
    }
  }

  /** WCAG 2.2, definition of contrast ratio. */
  private static double contrast(int one, int other) {
    double a = luminance(one);
    double b = luminance(other);
    return (Math.max(a, b) + 0.05) / (Math.min(a, b) + 0.05);
  }

  /** WCAG 2.2, definition of relative luminance. */
  private static double luminance(int rgb) {
    return 0.2126 * linear(rgb >> 16 & 0xff)
        + 0.7152 * linear(rgb >> 8 & 0xff)
        + 0.0722 * linear(rgb & 0xff);
  }

  private static double linear(int channel) {
    double c = channel / 255.0;
    return c <= 0.04045 ? c / 12.92 : Math.pow((c + 0.055) / 1.055, 2.4);
  }
}
