package org.evenbeam.logbook.people;

import org.evenbeam.logbook.LogbookException;

/** Name and password do not go together; which of the two is wrong is not said. */
public final class SignInRefused extends LogbookException {
  private static final long serialVersionUID = 1L;

  SignInRefused() {
    super("sign-in-refused");
  }
}
