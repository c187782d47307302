package org.evenbeam.ui.signin;

import java.time.Clock;
import java.time.ZoneId;
import java.util.function.Consumer;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.people.People;
import org.evenbeam.ui.common.Background;
import org.evenbeam.ui.common.ScreenTexts;

/** Name and password, and the session that they open. */
public final class SignInViewModel {
  private final People people;
  private final Background background;
  private final ScreenTexts texts;
  private final ZoneId zone;
  private final Clock clock;
  private final Consumer<Session> signedIn;
  private final StringProperty name = new SimpleStringProperty("");
  private final StringProperty password = new SimpleStringProperty("");
  private final StringProperty problem = new SimpleStringProperty("");
  private final BooleanProperty busy = new SimpleBooleanProperty();

  /**
   * Signs people in at a laboratory.
   *
   * @param signedIn takes the session
   */
  public SignInViewModel(
      People people,
      Background background,
      ScreenTexts texts,
      ZoneId zone,
      Clock clock,
      Consumer<Session> signedIn) {
    this.people = people;
    this.background = background;
    this.texts = texts;
    this.zone = zone;
    this.clock = clock;
    this.signedIn = signedIn;
  }

  /** Checks name and password; afterwards the password is gone either way. */
  public void signIn() {
    if (busy.get()) {
      return;
    }
    problem.set("");
    busy.set(true);
    String who = name.get();
    char[] secret = password.get().toCharArray();
    password.set("");
    background.run(
        () -> people.signIn(who, secret, zone, clock),
        session -> {
          busy.set(false);
          signedIn.accept(session);
        },
        thrown -> {
          busy.set(false);
          problem.set(texts.problem(thrown));
        });
  }

  /** The sign-in name. */
  public StringProperty name() {
    return name;
  }

  /** The password. */
  public StringProperty password() {
    return password;
  }

  /** What went wrong; empty for nothing. */
  public StringProperty problem() {
    return problem;
  }

  /** Whether name and password are being checked. */
  public BooleanProperty busy() {
    return busy;
  }
}
