package org.evenbeam.logbook.signoff;

import org.evenbeam.logbook.LogbookException;
import org.evenbeam.logbook.run.RunState;

/** A run that cannot be approved or returned. It stays as it was. */
public final class SignOffRefused extends LogbookException {
  private static final long serialVersionUID = 1L;

  private SignOffRefused(String key, Object... arguments) {
    super(key, arguments);
  }

  static SignOffRefused ownRun(long run) {
    return new SignOffRefused("sign-off-own-run", run);
  }

  static SignOffRefused notSubmitted(long run, RunState state) {
    return new SignOffRefused("sign-off-not-submitted", run, state);
  }

  static SignOffRefused reasonNeeded(long run) {
    return new SignOffRefused("sign-off-reason-needed", run);
  }

  static SignOffRefused contentChanged(long run) {
    return new SignOffRefused("sign-off-content-changed", run);
  }
}
