package org.evenbeam.certificate;

import java.math.BigDecimal;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.evenbeam.logbook.run.RunSheet;
import org.evenbeam.logbook.run.SheetCheckPoint;
import org.evenbeam.picture.BeamPlot;
import org.evenbeam.picture.Picture;
import org.evenbeam.picture.Size;
import org.evenbeam.picture.SpreadBar;
import org.evenbeam.picture.TextMeasure;
import org.evenbeam.picture.VerdictMark;
import org.evenbeam.wording.Figures;
import org.evenbeam.wording.PictureWords;
import org.evenbeam.wording.UnitSymbols;
import org.evenbeam.wording.Words;

/** A certificate's pictures by the names that the template uses; sizes in points. */
final class CertificatePictures {
  private static final double WIDTH = 490;
  private static final double TEXT = 8;
  private static final Size BEAM = new Size(WIDTH, 100, TEXT);
  private static final Size SPREAD = new Size(WIDTH, 50, TEXT);
  private static final double MARK_HEIGHT = 26;

  private final Map<String, Picture> pictures = new LinkedHashMap<>();

  CertificatePictures(RunSheet sheet, Words words, Figures figures, TextMeasure measure) {
    PictureWords labels =
        new PictureWords(words, figures, UnitSymbols.of(sheet.instrument().unit()));
    pictures.put("mark", VerdictMark.draw(sheet.findings().verdict(), MARK_HEIGHT, labels));
    for (int i = 0; i < sheet.checkPoints().size(); i++) {
      SheetCheckPoint point = sheet.checkPoints().get(i);
      List<BigDecimal> readings =
          point.counting().stream().map(reading -> reading.value().value()).toList();
      pictures.put(
          beam(i),
          BeamPlot.draw(point.question(), readings, point.findings(), BEAM, labels, measure));
      pictures.put(
          spread(i), SpreadBar.draw(point.question(), point.findings(), SPREAD, labels, measure));
    }
  }

  /** The pictures by name. */
  Map<String, Picture> byName() {
    return pictures;
  }

  /** The name of a check point's beam plot. */
  static String beam(int checkPoint) {
    return "beam-" + checkPoint;
  }

  /** The name of a check point's spread bar. */
  static String spread(int checkPoint) {
    return "spread-" + checkPoint;
  }
}
