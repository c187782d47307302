package org.evenbeam.logbook;

import java.util.List;

/**
 * The root of everything that the logbook refuses or cannot do. It carries a key and arguments,
 * from which {@code wording} makes the sentence for the person; its own message is for the log.
 */
public abstract class LogbookException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final String key;
  private final transient List<Object> arguments;

  /**
   * A refusal.
   *
   * @param key the sentence's key, such as {@code standard-expired}
   * @param arguments what the sentence names, in its order
   */
  protected LogbookException(String key, Object... arguments) {
    this(null, key, arguments);
  }

  /** A failure with its technical cause. */
  protected LogbookException(Throwable cause, String key, Object... arguments) {
    super(key + " " + List.of(arguments), cause);
    this.key = key;
    this.arguments = List.of(arguments);
  }

  /** The key of the sentence for the person. */
  public final String key() {
    return key;
  }

  /** What the sentence names: text, numbers, dates. */
  public final List<Object> arguments() {
    return arguments;
  }
}
