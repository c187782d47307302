package org.evenbeam.ui.shell;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Optional;
import java.util.concurrent.TimeoutException;
import javafx.scene.AccessibleRole;
import javafx.scene.Node;
import javafx.scene.input.KeyCode;
import org.evenbeam.logbook.certificates.CertificateFacts;
import org.evenbeam.logbook.run.RunState;
import org.evenbeam.ui.TestLaboratory;
import org.evenbeam.verification.Verdict;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

class WholeJobByKeyboardTest {
  private static final String[] READINGS = {
    "1000.00", "1000.01", "1000.00", "999.99", "1000.00", "1000.01"
  };

  private WindowOnLaboratory window;

  @BeforeEach
  void open() throws TimeoutException {
    window = new WindowOnLaboratory(1280, 800);
  }

  @AfterEach
  void close() throws TimeoutException {
    window.close();
  }

  @Test
  void measuredSubmittedApprovedAndCertified() {
    window.signIn(TestLaboratory.TECHNICIAN, TestLaboratory.TECHNICIANS_PASSWORD);
    startOnSecondBalance();
    assertRolesAndTexts();
    for (String reading : READINGS) {
      window.type(reading);
      window.press(KeyCode.ENTER);
    }
    recordTemperature();
    window.press(KeyCode.CONTROL, KeyCode.ENTER);
    window.type(TestLaboratory.TECHNICIANS_PASSWORD);
    window.press(KeyCode.ENTER);
    window.waitForFocus("filter");
    signOut();
    window.signIn(TestLaboratory.MANAGER, TestLaboratory.MANAGERS_PASSWORD);
    window.waitForFocus("queue");
    window.press(KeyCode.DOWN);
    window.press(KeyCode.CONTROL, KeyCode.ENTER);
    window.type(TestLaboratory.MANAGERS_PASSWORD);
    window.press(KeyCode.ENTER);
    window.waitForFocus("open-certificate");
    CertificateFacts newest = newestCertificate();
    assertThat(newest.instrumentTag()).isEqualTo("BAL-02");
    assertThat(newest.verdict()).isEqualTo(Optional.of(Verdict.CONFORMS));
  }

  @Test
  void aManagerCannotApproveByTheScreenWhatTheySubmitted() {
    window.signIn(TestLaboratory.MANAGER, TestLaboratory.MANAGERS_PASSWORD);
    window.press(KeyCode.CONTROL, KeyCode.DIGIT1);
    startOnSecondBalance();
    window.type(READINGS[0]);
    window.press(KeyCode.ENTER);
    window.press(KeyCode.CONTROL, KeyCode.ENTER);
    window.type(TestLaboratory.MANAGERS_PASSWORD);
    window.press(KeyCode.ENTER);
    window.waitForFocus("filter");
    window.press(KeyCode.CONTROL, KeyCode.DIGIT2);
    window.waitForFocus("queue");
    window.press(KeyCode.DOWN);
    window.press(KeyCode.CONTROL, KeyCode.ENTER);
    window.type("fit for use");
    window.press(KeyCode.ENTER);
    window.type(TestLaboratory.MANAGERS_PASSWORD);
    window.press(KeyCode.ENTER);
    window.waitUntil(
        () -> window.robot().lookup(".problem").queryAll().stream().anyMatch(this::saysOwnRun));
    assertThat(window.laboratory().logbook().signOff().queue(window.laboratory().manager()))
        .extracting(run -> run.state())
        .containsOnly(RunState.SUBMITTED)
        .hasSize(2);
  }

  private boolean saysOwnRun(Node node) {
    return ((javafx.scene.control.Label) node).getText().contains("was submitted by you");
  }

  private void startOnSecondBalance() {
    window.waitForFocus("filter");
    window.type("bal-02");
    window.press(KeyCode.ENTER);
    window.press(KeyCode.ENTER);
    window.waitForFocus("reading");
  }

  private void recordTemperature() {
    while (!"condition-TEMPERATURE".equals(window.focused())) {
      window.press(KeyCode.SHIFT, KeyCode.TAB);
    }
    window.type("20.6");
    window.press(KeyCode.ENTER);
  }

  private void signOut() {
    while (!"sign-out".equals(window.focused())) {
      window.press(KeyCode.TAB);
    }
    window.press(KeyCode.SPACE);
  }

  private void assertRolesAndTexts() {
    assertThat(window.node("reading", Node.class).getAccessibleRole())
        .isEqualTo(AccessibleRole.TEXT_FIELD);
    assertThat(window.node("reading", Node.class).getAccessibleText()).isEqualTo("Reading 1 of 6");
    assertThat(window.node("readings", Node.class).getAccessibleRole())
        .isEqualTo(AccessibleRole.LIST_VIEW);
    assertThat(window.node("beam-plot", Node.class).getAccessibleRole())
        .isEqualTo(AccessibleRole.IMAGE_VIEW);
    assertThat(window.node("beam-plot", Node.class).getAccessibleText())
        .startsWith("Bias: the limits are")
        .endsWith("No readings yet.");
    assertThat(window.node("spread-bar", Node.class).getAccessibleText())
        .startsWith("Standard deviation:");
    assertThat(window.node("condition-TEMPERATURE", Node.class).getAccessibleText())
        .isEqualTo("Temperature in °C");
    assertThat(window.node("submit", Node.class).getAccessibleRole())
        .isEqualTo(AccessibleRole.BUTTON);
  }

  private CertificateFacts newestCertificate() {
    TestLaboratory laboratory = window.laboratory();
    return laboratory.logbook().certificates().history(laboratory.manager(), 1).get(0);
  }
}
