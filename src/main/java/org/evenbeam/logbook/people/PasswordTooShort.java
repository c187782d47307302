package org.evenbeam.logbook.people;

import org.evenbeam.logbook.LogbookException;

/** A new password has fewer characters than are asked for. */
public final class PasswordTooShort extends LogbookException {
  private static final long serialVersionUID = 1L;

  PasswordTooShort(int shortest) {
    super("password-too-short", shortest);
  }
}
