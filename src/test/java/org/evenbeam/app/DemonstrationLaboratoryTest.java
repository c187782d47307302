package org.evenbeam.app;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import org.evenbeam.certificate.TemplatePress;
import org.evenbeam.cli.Demonstration;
import org.evenbeam.cli.Demonstration.Written;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.StoreFailed;
import org.evenbeam.logbook.instruments.InstrumentStatus;
import org.evenbeam.logbook.open.OpenLogbook;
import org.evenbeam.logbook.run.NewRun;
import org.evenbeam.logbook.run.OpenSheet;
import org.evenbeam.logbook.run.RunKind;
import org.evenbeam.logbook.run.RunState;
import org.evenbeam.logbook.run.RunSummary;
import org.evenbeam.logbook.run.SheetCheckPoint;
import org.evenbeam.verification.Verdict;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class DemonstrationLaboratoryTest {
  private static final TemplatePress PRESS = new TemplatePress();

  @TempDir private static Path parent;
  private static Path folder;
  private static List<Written> written;

  @BeforeAll
  static void importOnce() {
    folder = parent.resolve("demonstration");
    Demonstration demonstration = new DemonstrationLaboratory(folder, false, PRESS);
    written = demonstration.writeCertificates();
  }

  private static List<OpenSheet> sheets(OpenLogbook logbook, Session session) {
    List<OpenSheet> sheets = new ArrayList<>();
    for (var instrument : logbook.instruments().all(session)) {
      for (RunSummary run :
          logbook.runs().ofInstrument(session, instrument.instrument().tag(), 1000)) {
        sheets.add(logbook.runs().open(session, run.number()));
      }
    }
    return sheets;
  }

  private static Session auditor(OpenLogbook logbook) {
    return signIn(logbook, "adela", "neaptide");
  }

  private static Session signIn(OpenLogbook logbook, String name, String password) {
    return logbook
        .people()
        .signIn(
            name,
            password.toCharArray(),
            logbook.laboratory().find().orElseThrow().zone(),
            Clock.systemUTC());
  }

  @Test
  void everyApprovedRunHasItsCertificateOnDisk() {
    assertThat(written).hasSizeGreaterThanOrEqualTo(20);
    assertThat(written).allSatisfy(w -> assertThat(w.file()).isNotEmptyFile());
    assertThat(written.stream().map(Written::verdict).collect(Collectors.toSet()))
        .containsExactlyInAnyOrder(
            Optional.of(Verdict.CONFORMS),
            Optional.of(Verdict.DOES_NOT_CONFORM),
            Optional.of(Verdict.UNDECIDED));
  }

  @Test
  void itHoldsWhatADemonstrationMustShow() {
    try (OpenLaboratory laboratory = OpenLaboratory.in(folder, PRESS, () -> false)) {
      OpenLogbook logbook = laboratory.logbook();
      Session session = auditor(logbook);
      List<OpenSheet> sheets = sheets(logbook, session);
      List<SheetCheckPoint> points =
          sheets.stream().flatMap(sheet -> sheet.sheet().checkPoints().stream()).toList();

      assertThat(logbook.people().all(session)).hasSizeGreaterThanOrEqualTo(3);
      assertThat(logbook.instruments().all(session)).hasSizeGreaterThanOrEqualTo(6);
      assertThat(sheets).hasSizeGreaterThanOrEqualTo(20);
      assertThat(sheets)
          .extracting(OpenSheet::state)
          .contains(RunState.DRAFT, RunState.SUBMITTED, RunState.APPROVED, RunState.ABANDONED);
      assertThat(sheets).anyMatch(sheet -> sheet.events().size() > 4);
      assertThat(points)
          .anyMatch(point -> point.readings().stream().anyMatch(r -> r.corrects().isPresent()))
          .anyMatch(point -> point.readings().stream().anyMatch(r -> r.strike().isPresent()));
      assertThat(logbook.instruments().all(session))
          .extracting(instrument -> instrument.status())
          .contains(
              InstrumentStatus.IN_SERVICE,
              InstrumentStatus.IN_SERVICE_WITH_RESTRICTION,
              InstrumentStatus.OUT_OF_SERVICE);
    }
  }

  @Test
  void itsExpiredStandardIsRefusedWithItsDate() {
    try (OpenLaboratory laboratory = OpenLaboratory.in(folder, PRESS, () -> false)) {
      Session technician = signIn(laboratory.logbook(), "nia", "springtide");

      assertThatThrownBy(
              () ->
                  laboratory
                      .logbook()
                      .runs()
                      .start(
                          technician,
                          new NewRun(
                              "SPC-01",
                              "Half-yearly filter check",
                              RunKind.AS_FOUND,
                              Optional.empty())))
          .hasMessageContaining("run-standard-expired")
          .hasMessageContaining("FLT-05")
          .hasMessageContaining("2026-09-21");
    }
  }

  @Test
  void aSecondStartFindsItAsItWasLeft() throws IOException {
    List<Written> again = new DemonstrationLaboratory(folder, false, PRESS).writeCertificates();

    assertThat(again).isEqualTo(written);
  }

  @Test
  void whatIsInUseIsNotPutBackToItsStart() {
    try (OpenLaboratory inUse = OpenLaboratory.in(folder, PRESS, () -> false)) {
      DemonstrationLaboratory again = new DemonstrationLaboratory(folder, true, PRESS);

      assertThatThrownBy(again::writeCertificates)
          .isInstanceOfSatisfying(
              StoreFailed.class,
              failed -> assertThat(failed.reason()).isEqualTo(StoreFailed.Reason.IN_USE));
      assertThat(auditor(inUse.logbook()).person().name()).isEqualTo("Adela Quistorp");
    }
    assertThat(written.get(0).file()).exists();
  }

  @Test
  void aFolderThatHoldsSomethingElseIsLeftAlone() throws IOException {
    Path other = Files.createDirectory(parent.resolve("other"));
    Path mine = Files.writeString(other.resolve("mine.txt"), "mine");

    assertThatThrownBy(() -> new DemonstrationLaboratory(other, true, PRESS).writeCertificates())
        .isInstanceOf(StoreFailed.class)
        .hasMessageContaining("something else");
    assertThat(mine).hasContent("mine");
  }
}
