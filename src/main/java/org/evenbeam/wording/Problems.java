package org.evenbeam.wording;

import static org.evenbeam.wording.Words.Bundle.PROBLEM;

import java.util.List;

/** What was refused or failed, in words: what, where, what was kept, what to do. */
public final class Problems {
  private final Words words;

  /** Writes in those words. */
  public Problems(Words words) {
    this.words = words;
  }

  /**
   * The sentence of a refusal.
   *
   * @param key the refusal's key
   * @param arguments what it names: texts, numbers, dates, constants
   */
  public String sentence(String key, List<?> arguments) {
    return words.text(PROBLEM, key, arguments.stream().map(this::text).toArray(String[]::new));
  }

  private String text(Object argument) {
    return argument instanceof Enum<?> constant
        ? words.name(PROBLEM, constant.getDeclaringClass().getSimpleName(), constant)
        : argument.toString();
  }
}
