package org.evenbeam.certificate;

import static org.evenbeam.wording.Words.Bundle.CERTIFICATE;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.evenbeam.verification.CheckPointFindings;
import org.evenbeam.wording.Figures;
import org.evenbeam.wording.Words;

/** The statistics of one check point, two names and values a row, to sensible digits. */
final class StatisticsRows {
  private record Entry(String name, String value) {}

  private final Words words;
  private final Figures figures;

  StatisticsRows(Words words, Figures figures) {
    this.words = words;
    this.figures = figures;
  }

  List<Map<String, String>> of(CheckPointFindings found, String unit) {
    List<Entry> entries = new ArrayList<>();
    moments(found, unit, entries);
    uncertainties(found, unit, entries);
    biasTests(found, unit, entries);
    spreadTests(found, unit, entries);
    List<Map<String, String>> rows = new ArrayList<>();
    for (int i = 0; i < entries.size(); i += 2) {
      Entry left = entries.get(i);
      Entry right = i + 1 < entries.size() ? entries.get(i + 1) : new Entry("", "");
      rows.add(
          Map.of(
              "name", left.name(),
              "value", left.value(),
              "nameRight", right.name(),
              "valueRight", right.value()));
    }
    return rows;
  }

  private void moments(CheckPointFindings found, String unit, List<Entry> entries) {
    int places = figures.biasPlaces(found);
    add(entries, "stat.n", Integer.toString(found.n()));
    add(entries, "stat.mean", figures.withUnit(figures.toPlaces(found.mean(), places), unit));
    found
        .standardDeviation()
        .ifPresent(s -> add(entries, "stat.s", figures.withUnit(figures.uncertainty(s), unit)));
    add(entries, "stat.bias", figures.withUnit(figures.signedToPlaces(found.bias(), places), unit));
  }

  private void uncertainties(CheckPointFindings found, String unit, List<Entry> entries) {
    double reference = found.question().reference().standardUncertainty();
    add(entries, "stat.u-reference", figures.withUnit(figures.uncertainty(reference), unit));
    found
        .biasFinding()
        .uncertainty()
        .ifPresent(
            u -> {
              add(
                  entries,
                  "stat.u-bias",
                  figures.withUnit(figures.uncertainty(u.standardUncertainty()), unit));
              add(entries, "stat.nu", figures.degreesOfFreedom(u.degreesOfFreedom()));
            });
  }

  private void biasTests(CheckPointFindings found, String unit, List<Entry> entries) {
    found
        .biasFinding()
        .test()
        .ifPresent(test -> add(entries, "stat.p-within", figures.probability(test.pNotWithin())));
    found
        .tTest()
        .ifPresent(
            test -> {
              add(entries, "stat.t", figures.significant(test.statistic(), 4));
              add(entries, "stat.t-p", figures.probability(test.pTwoSided()));
              add(
                  entries,
                  "stat.t-interval",
                  figures.signedInterval(
                      test.interval(), figures.placesBeside(test.standardError()), unit),
                  figures.percent(1 - found.question().criteria().alpha()));
            });
  }

  private void spreadTests(CheckPointFindings found, String unit, List<Entry> entries) {
    found
        .precisionFinding()
        .test()
        .ifPresent(
            test -> {
              add(
                  entries,
                  "stat.chi2",
                  figures.significant(test.statistic(), 4),
                  Integer.toString(found.n() - 1));
              add(entries, "stat.chi2-p", figures.probability(test.pUpper()));
            });
    found
        .precisionFinding()
        .bounds()
        .ifPresent(
            bounds ->
                add(
                    entries,
                    "stat.sigma-interval",
                    figures.uncertainty(bounds.interval().low())
                        + " … "
                        + figures.withUnit(figures.uncertainty(bounds.interval().high()), unit),
                    figures.percent(1 - bounds.alpha())));
  }

  private void add(List<Entry> entries, String key, String value, String... arguments) {
    entries.add(new Entry(words.text(CERTIFICATE, key, arguments), value));
  }
}
