package org.evenbeam.logbook.run;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.evenbeam.fixture.TestLaboratory.POINT;

import java.util.List;
import org.evenbeam.fixture.TestLaboratory;
import org.evenbeam.logbook.LogbookException;
import org.evenbeam.metrology.DecimalSign;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class BenchTest {
  private final TestLaboratory laboratory = new TestLaboratory();

  @AfterEach
  void close() {
    laboratory.close();
  }

  private Bench bench() {
    return laboratory.logbook().bench();
  }

  private SheetCheckPoint point(long run) {
    return laboratory
        .logbook()
        .runs()
        .open(laboratory.technician(), run)
        .sheet()
        .checkPoint(POINT)
        .orElseThrow();
  }

  @Test
  void aReadingIsKeptExactlyAsTyped() {
    long run = laboratory.start();

    bench().enter(laboratory.technician(), run, POINT, " 20.00010 ");

    Reading kept = point(run).readings().get(0);
    assertThat(kept.value().text()).isEqualTo("20.00010");
    assertThat(kept.value().value()).isEqualTo("20.00010");
    assertThat(kept.position()).isEqualTo(1);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "twenty|NOT_A_NUMBER",
        "'1,234'|OTHER_DECIMAL_SIGN",
        "NaN|NOT_A_NUMBER",
        "1e400|OUT_OF_RANGE",
        "' '|EMPTY",
        "20.1.1|NOT_A_NUMBER"
      })
  void whatIsNoNumberIsRefusedAndTheReadingsBeforeAreKept(String typed, String reason) {
    long run = laboratory.measured("20.0001");

    assertThatThrownBy(() -> bench().enter(laboratory.technician(), run, POINT, typed))
        .isInstanceOf(RunRefused.class)
        .hasMessageContaining(reason);
    assertThat(point(run).counting()).hasSize(1);
  }

  @Test
  void aCommaLaboratoryReadsItsOwnSignOnly() {
    try (TestLaboratory commas = new TestLaboratory(new NoPress(), DecimalSign.COMMA)) {
      long run = commas.start();
      commas.logbook().bench().enter(commas.technician(), run, POINT, "20,0001");

      assertThatThrownBy(
              () -> commas.logbook().bench().enter(commas.technician(), run, POINT, "20.0001"))
          .hasMessageContaining("OTHER_DECIMAL_SIGN");
    }
  }

  @Test
  void moreReadingsThanPlannedAreRefused() {
    long run = laboratory.measured("20.0001", "20.0002", "20.0000", "20.0001");

    assertThatThrownBy(() -> bench().enter(laboratory.technician(), run, POINT, "20.0001"))
        .hasMessageContaining("run-all-readings-in");
  }

  @Test
  void aCorrectionIsANewEntryThatPointsAtTheOldOne() {
    long run = laboratory.measured("20.0100");
    long old = point(run).readings().get(0).id();

    bench().correct(laboratory.technician(), run, old, "20.0001", "one zero too few");

    assertThat(point(run).readings()).hasSize(2);
    assertThat(point(run).counting())
        .singleElement()
        .satisfies(reading -> assertThat(reading.value().text()).isEqualTo("20.0001"));
    assertThat(point(run).counting().get(0).position()).isEqualTo(1);
    assertThatThrownBy(() -> bench().correct(laboratory.technician(), run, old, "20.0002", "again"))
        .hasMessageContaining("run-reading-no-longer-counts");
  }

  @Test
  void aStruckReadingStaysVisibleAndIsReplaced() {
    long run = laboratory.measured("20.0001", "20.0002", "20.0100", "20.0001");
    long third = point(run).standing().get(2).id();

    bench().strike(laboratory.technician(), run, third, "draught shield open");
    bench().enter(laboratory.technician(), run, POINT, "20.0000");

    assertThat(point(run).standing()).hasSize(5);
    assertThat(point(run).counting()).hasSize(4);
    assertThat(point(run).standing().get(2).strike()).isPresent();
  }

  @ParameterizedTest
  @CsvSource({"''", "'  '"})
  void aStrikeNeedsItsCause(String cause) {
    long run = laboratory.measured("20.0001");
    long reading = point(run).readings().get(0).id();

    assertThatThrownBy(() -> bench().strike(laboratory.technician(), run, reading, cause))
        .hasMessageContaining("reason-missing");
  }

  @Test
  void aPastedColumnIsTakenWholeOrNotAtAll() {
    long run = laboratory.start();

    assertThatThrownBy(
            () ->
                bench()
                    .enterColumn(
                        laboratory.technician(), run, POINT, List.of("20.0001", "", "20.00o2")))
        .hasMessageContaining("reading-in-line-refused [3");
    assertThat(point(run).readings()).isEmpty();

    bench()
        .enterColumn(
            laboratory.technician(), run, POINT, List.of("20.0001", "", "20.0002", "20.0003"));
    assertThat(point(run).counting()).extracting(Reading::position).containsExactly(1, 2, 3);
  }

  @Test
  void aScratchIsOfferedAgainUntilItIsEntered() {
    long run = laboratory.start();
    bench().keepScratch(laboratory.technician(), run, POINT, "20.00");

    assertThat(laboratory.logbook().runs().open(laboratory.technician(), run).scratches())
        .singleElement()
        .satisfies(scratch -> assertThat(scratch.text()).isEqualTo("20.00"));

    bench().enter(laboratory.technician(), run, POINT, "20.0001");
    assertThat(laboratory.logbook().runs().open(laboratory.technician(), run).scratches())
        .isEmpty();
  }

  @Test
  void nobodyElseEntersIntoARun() {
    long run = laboratory.start();

    assertThatThrownBy(() -> bench().enter(laboratory.manager(), run, POINT, "20.0001"))
        .isInstanceOf(LogbookException.class)
        .hasMessageContaining("run-not-yours");
    assertThatThrownBy(() -> bench().enter(laboratory.auditor(), run, POINT, "20.0001"))
        .hasMessageContaining("not-allowed");
    assertThat(point(run).readings()).isEmpty();
  }
}
