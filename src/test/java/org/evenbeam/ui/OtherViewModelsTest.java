package org.evenbeam.ui;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.evenbeam.logbook.Session;
import org.evenbeam.logbook.certificates.CertificateFacts;
import org.evenbeam.logbook.instruments.InstrumentEvent;
import org.evenbeam.logbook.instruments.InstrumentOverview;
import org.evenbeam.logbook.instruments.InstrumentStatus;
import org.evenbeam.logbook.run.RunKind;
import org.evenbeam.ui.bench.BenchViewModel;
import org.evenbeam.ui.certificates.CertificatesViewModel;
import org.evenbeam.ui.common.Background;
import org.evenbeam.ui.signin.SignInViewModel;
import org.evenbeam.ui.signoff.SignOffViewModel;
import org.evenbeam.ui.trail.TrailViewModel;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class OtherViewModelsTest {
  private static TestLaboratory laboratory;
  private final List<String> refusals = new ArrayList<>();
  private final List<Long> opened = new ArrayList<>();

  @BeforeAll
  static void open() {
    laboratory = new TestLaboratory();
  }

  @AfterAll
  static void close() {
    laboratory.close();
  }

  @Test
  void signingInNeedsTheRightPasswordAndForgetsItEitherWay() {
    List<Session> sessions = new ArrayList<>();
    SignInViewModel signIn =
        new SignInViewModel(
            laboratory.logbook().people(),
            Background.direct(),
            laboratory.texts(),
            laboratory.facts().zone(),
            laboratory.clock(),
            sessions::add);
    signIn.name().set(TestLaboratory.TECHNICIAN);
    signIn.password().set("ebb");
    signIn.signIn();
    assertThat(signIn.problem().get())
        .isEqualTo("Name and password do not go together. Try again.");
    assertThat(signIn.password().get()).isEmpty();
    assertThat(sessions).isEmpty();
    signIn.password().set(TestLaboratory.TECHNICIANS_PASSWORD);
    signIn.signIn();
    assertThat(signIn.problem().get()).isEmpty();
    assertThat(signIn.password().get()).isEmpty();
    assertThat(sessions).hasSize(1);
  }

  @Test
  void theBenchNarrowsAsOneTypes() {
    BenchViewModel bench = bench(laboratory.technician());
    bench.filter().set("WET lab");
    assertThat(bench.instruments())
        .isNotEmpty()
        .allMatch(one -> one.instrument().location().equals("wet laboratory"));
    bench.filter().set("");
    assertThat(bench.instruments()).hasSizeGreaterThan(5);
  }

  @Test
  void asLeftIsOfferedOnlyAfterAnAdjustmentThatFollowsAnAsFoundRun() {
    Session technician = laboratory.technician();
    BenchViewModel bench = bench(technician);
    bench.choose(instrument(bench, "PH-02"));
    bench.record(InstrumentEvent.Kind.ADJUSTMENT, "before the run", () -> {}, refusals::add);
    bench.start(bench.starts().get().plans().get(0), RunKind.AS_FOUND);
    assertThat(opened).hasSize(1);
    bench.choose(instrument(bench, "PH-02"));
    assertThat(bench.starts().get().kinds()).doesNotContain(RunKind.AS_LEFT);
    bench.record(InstrumentEvent.Kind.ADJUSTMENT, "slope set", () -> {}, refusals::add);
    assertThat(bench.starts().get().kinds()).contains(RunKind.AS_LEFT);
    bench.start(bench.starts().get().plans().get(0), RunKind.AS_LEFT);
    assertThat(opened).hasSize(2);
    assertThat(refusals).isEmpty();
  }

  @Test
  void anyoneStopsAnInstrumentAndOnlyAManagerReleasesIt() {
    BenchViewModel bench = bench(laboratory.technician());
    bench.choose(instrument(bench, "PIP-04"));
    bench.stop("tip cone cracked", () -> {}, refusals::add);
    assertThat(bench.chosen().get().status()).isEqualTo(InstrumentStatus.OUT_OF_SERVICE);
    bench.release("looks fine", "", () -> {}, refusals::add);
    assertThat(refusals).singleElement().asString().contains("whose rights do not include");
    BenchViewModel managers = bench(laboratory.manager());
    managers.choose(instrument(managers, "PIP-04"));
    managers.release("cone replaced", "", () -> {}, refusals::add);
    assertThat(managers.chosen().get().status()).isEqualTo(InstrumentStatus.IN_SERVICE);
  }

  @Test
  void aReturnedRunIsTakenUpAgain() {
    Session technician = laboratory.technician();
    long run = submitted(technician);
    SignOffViewModel signOff = signOff(laboratory.manager());
    choose(signOff, run);
    signOff.giveBack(TestLaboratory.MANAGERS_PASSWORD, "", () -> {}, refusals::add);
    assertThat(refusals).singleElement().asString().contains("A reason in words is needed");
    signOff.giveBack(TestLaboratory.MANAGERS_PASSWORD, "measure again", () -> {}, refusals::add);
    assertThat(signOff.queue()).noneMatch(one -> one.number() == run);
    BenchViewModel bench = bench(technician);
    bench.goOn(bench.mine().stream().filter(one -> one.number() == run).findFirst().orElseThrow());
    assertThat(opened).containsExactly(run);
  }

  @Test
  void approvingWithoutAVerdictNeedsAReasonAndIssuesTheCertificate() {
    long run = submitted(laboratory.technician());
    SignOffViewModel signOff = signOff(laboratory.manager());
    choose(signOff, run);
    assertThat(signOff.needsReason()).isTrue();
    signOff.approve(TestLaboratory.MANAGERS_PASSWORD, "", () -> {}, refusals::add);
    assertThat(refusals).singleElement().asString().contains("say what you decide and why");
    signOff.approve(TestLaboratory.MANAGERS_PASSWORD, "kept as a record", () -> {}, refusals::add);
    assertThat(signOff.certificate().get()).matches("2026-\\d{5}");
    assertThat(signOff.said().get()).contains(signOff.certificate().get());
    assertThat(refusals).hasSize(1);
  }

  @Test
  void aCertificateIsWrittenWhereThereIsNoViewer(@TempDir Path folder) throws Exception {
    CertificatesViewModel certificates =
        new CertificatesViewModel(
            laboratory.logbook(),
            laboratory.manager(),
            Background.direct(),
            laboratory.texts(),
            file -> false);
    certificates.load();
    certificates.filter().set("ph-02");
    assertThat(certificates.certificates())
        .isNotEmpty()
        .extracting(CertificateFacts::instrumentTag)
        .containsOnly("PH-02");
    String number = certificates.certificates().get(0).number();
    certificates.open(number);
    assertThat(certificates.problem().get()).contains(number, "no viewer");
    Path wanted = folder.resolve("kept.pdf");
    certificates.saveAs(number, wanted);
    assertThat(Files.readString(wanted)).isEqualTo(number);
    certificates.saveAs(number, folder.resolve("nowhere").resolve("kept.pdf"));
    assertThat(certificates.problem().get()).contains("could not be written");
  }

  @Test
  void theTrailIsReadNewestFirstAndItsChainChecked() {
    TrailViewModel trail =
        new TrailViewModel(
            laboratory.logbook(),
            laboratory.session("adela", "neaptide"),
            Background.direct(),
            laboratory.texts());
    trail.load();
    assertThat(trail.lines().get(0).number()).isGreaterThan(trail.lines().get(1).number());
    trail.check();
    assertThat(trail.said().get())
        .isEqualTo(
            "The chain is whole: "
                + trail.lines().get(0).number()
                + " entries, from the first to the head.");
  }

  private static long submitted(Session technician) {
    long run = laboratory.newRun(technician);
    laboratory.logbook().bench().enter(technician, run, "50 g", "50.0001");
    char[] password = TestLaboratory.TECHNICIANS_PASSWORD.toCharArray();
    laboratory.logbook().submissions().submit(technician, run, password, true);
    return run;
  }

  private BenchViewModel bench(Session session) {
    BenchViewModel bench =
        new BenchViewModel(
            laboratory.logbook(), session, Background.direct(), laboratory.texts(), opened::add);
    bench.load();
    return bench;
  }

  private static InstrumentOverview instrument(BenchViewModel bench, String tag) {
    return bench.instruments().stream()
        .filter(one -> one.instrument().tag().equals(tag))
        .findFirst()
        .orElseThrow();
  }

  private static SignOffViewModel signOff(Session session) {
    SignOffViewModel signOff =
        new SignOffViewModel(
            laboratory.logbook(), session, Background.direct(), laboratory.texts());
    signOff.load();
    return signOff;
  }

  private static void choose(SignOffViewModel signOff, long run) {
    signOff
        .chosen()
        .set(signOff.queue().stream().filter(one -> one.number() == run).findFirst().orElseThrow());
  }
}
