package org.evenbeam.wording;

import java.text.MessageFormat;
import java.util.EnumMap;
import java.util.Locale;
import java.util.Map;
import java.util.ResourceBundle;
import java.util.stream.Collectors;

/** Texts by key in one language, from resource bundles. */
public final class Words {
  /** The bundles, one for each kind of text. */
  public enum Bundle {
    /** What stands on screens: titles, labels, hints. */
    SCREEN,
    /** Findings, notes, verdicts and rules in words. */
    FINDING,
    /** What was refused or failed, and what to do. */
    PROBLEM,
    /** What stands on certificates beside findings. */
    CERTIFICATE,
    /** What the command line says. */
    COMMAND
  }

  private final Locale locale;
  private final Map<Bundle, ResourceBundle> bundles = new EnumMap<>(Bundle.class);

  /** Texts in that language, English where it has none. */
  public Words(Locale locale) {
    this.locale = locale;
    ResourceBundle.Control control =
        ResourceBundle.Control.getNoFallbackControl(ResourceBundle.Control.FORMAT_PROPERTIES);
    for (Bundle bundle : Bundle.values()) {
      String name = "org.evenbeam.wording." + bundle.name().toLowerCase(Locale.ROOT);
      bundles.put(bundle, ResourceBundle.getBundle(name, locale, control));
    }
  }

  /** The language. */
  public Locale locale() {
    return locale;
  }

  /**
   * The text of that key with its arguments in place; arguments are already text.
   *
   * @throws java.util.MissingResourceException when no bundle has the key
   */
  public String text(Bundle bundle, String key, String... arguments) {
    String pattern = bundles.get(bundle).getString(key);
    return new MessageFormat(pattern, locale).format(arguments);
  }

  /** Every text of a bundle that takes no argument, by its key. */
  public Map<String, String> all(Bundle bundle) {
    ResourceBundle texts = bundles.get(bundle);
    return texts.keySet().stream().collect(Collectors.toMap(key -> key, key -> text(bundle, key)));
  }

  /** The name of a constant, from the key {@code prefix.CONSTANT}. */
  public String name(Bundle bundle, String prefix, Enum<?> constant) {
    return text(bundle, prefix + "." + constant.name());
  }
}
