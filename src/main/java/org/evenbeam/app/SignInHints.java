package org.evenbeam.app;

import java.util.List;
import java.util.Locale;
import org.evenbeam.wording.Words;

/** What stands below the sign-in card of the demonstration laboratory, where nothing is secret. */
final class SignInHints {
  private SignInHints() {}

  /** Names and passwords as in demo-data. */
  static List<String> ofDemonstration() {
    Words words = new Words(Locale.ENGLISH);
    return List.of(
        words.text(Words.Bundle.COMMAND, "demo.sign-in.technicians"),
        words.text(Words.Bundle.COMMAND, "demo.sign-in.others"));
  }
}
