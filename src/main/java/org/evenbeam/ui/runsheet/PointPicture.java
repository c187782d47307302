package org.evenbeam.ui.runsheet;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.evenbeam.logbook.run.SheetCheckPoint;
import org.evenbeam.metrology.DecimalSign;
import org.evenbeam.metrology.NumberRefused;
import org.evenbeam.metrology.TypedDecimal;
import org.evenbeam.verification.CheckPointEvaluation;
import org.evenbeam.verification.CheckPointFindings;
import org.evenbeam.verification.CheckPointQuestion;

/**
 * What the pictures of a check point show.
 *
 * @param question what is asked
 * @param readings those that count, and the one being typed where it is a whole one
 * @param findings what these show
 * @param withTyped whether the one being typed is among them
 */
public record PointPicture(
    CheckPointQuestion question,
    List<BigDecimal> readings,
    Optional<CheckPointFindings> findings,
    boolean withTyped) {
  /** Keeps the readings unchangeable. */
  public PointPicture {
    readings = List.copyOf(readings);
  }

  static PointPicture of(SheetCheckPoint point, String typed, DecimalSign sign) {
    List<BigDecimal> readings =
        new ArrayList<>(point.counting().stream().map(r -> r.value().value()).toList());
    Optional<BigDecimal> whole =
        point.toGo() == 0 ? Optional.empty() : whole(typed, sign, point.question());
    whole.ifPresent(readings::add);
    return new PointPicture(
        point.question(),
        readings,
        readings.isEmpty()
            ? Optional.empty()
            : Optional.of(CheckPointEvaluation.of(point.question(), readings)),
        whole.isPresent());
  }

  /**
   * The number being typed, once it has all the decimals that the instrument shows: shorter ones
   * are a reading on its way, and would make the pictures jump.
   */
  private static Optional<BigDecimal> whole(
      String typed, DecimalSign sign, CheckPointQuestion question) {
    try {
      int decimals = question.resolution().map(BigDecimal::scale).orElse(0);
      return Optional.of(TypedDecimal.parse(typed, sign).value())
          .filter(value -> value.scale() >= decimals);
    } catch (NumberRefused notYet) {
      return Optional.empty();
    }
  }
}
