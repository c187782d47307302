package org.evenbeam.picture;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import org.evenbeam.verification.Verdict;
import org.junit.jupiter.api.Test;

class VerdictMarkTest {
  @Test
  void shapesTellTheVerdictsApartWithoutColour() {
    List<Shape.Line> level = beams(Verdict.CONFORMS);
    assertThat(level).singleElement().matches(line -> line.y1() == line.y2());
    assertThat(beams(Verdict.DOES_NOT_CONFORM))
        .singleElement()
        .matches(line -> line.y2() - line.y1() > 5);
    assertThat(beams(Verdict.UNDECIDED)).hasSize(2);
  }

  @Test
  void noVerdictHasNoBeam() {
    Picture picture = VerdictMark.draw(Optional.empty(), 16, Questions.LABELS);
    assertThat(picture.shapes()).singleElement().isInstanceOf(Shape.Fulcrum.class);
    assertThat(picture.text()).isEqualTo("no verdict");
  }

  @Test
  void marksLieInside() {
    for (Verdict verdict : Verdict.values()) {
      Picture picture = VerdictMark.draw(Optional.of(verdict), 16, Questions.LABELS);
      assertThat(Box.faults(picture)).isEmpty();
      assertThat(picture.width()).isEqualTo(16 * VerdictMark.ASPECT);
    }
  }

  private static List<Shape.Line> beams(Verdict verdict) {
    Picture picture = VerdictMark.draw(Optional.of(verdict), 16, Questions.LABELS);
    return picture.shapes().stream()
        .filter(Shape.Line.class::isInstance)
        .map(Shape.Line.class::cast)
        .toList();
  }
}
