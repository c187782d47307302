package org.evenbeam.logbook.people;

import org.evenbeam.logbook.LogbookException;

/** The password given with a signature is not the signer's. Nothing was signed. */
public final class PasswordWrong extends LogbookException {
  private static final long serialVersionUID = 1L;

  PasswordWrong() {
    super("password-wrong");
  }
}
