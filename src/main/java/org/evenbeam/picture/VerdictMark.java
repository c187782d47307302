package org.evenbeam.picture;

import java.util.List;
import java.util.Optional;
import org.evenbeam.verification.Verdict;

/**
 * The marks of the verdicts, told apart by their shape: a level beam on its fulcrum for CONFORMS, a
 * tilted one for DOES NOT CONFORM, a broken one for UNDECIDED, the fulcrum without a beam for no
 * verdict. The level beam in ink is also the program's mark.
 */
public final class VerdictMark {
  /** A mark is so many times as wide as it is high. */
  public static final double ASPECT = 2;

  private VerdictMark() {}

  /** The mark of a verdict, or of none yet. */
  public static Picture draw(Optional<Verdict> verdict, double height, Labels labels) {
    List<Shape> shapes =
        verdict
            .map(
                v ->
                    switch (v) {
                      case CONFORMS -> level(height, Role.LEVEL);
                      case DOES_NOT_CONFORM -> tilted(height);
                      case UNDECIDED -> broken(height);
                    })
            .orElseGet(() -> List.of(fulcrum(height, Role.QUIET)));
    String words = labels.describe(new PictureContent.Mark(verdict));
    return new Picture(height * ASPECT, height, shapes, words);
  }

  /** The program's mark. */
  public static Picture program(double height, String name) {
    return new Picture(height * ASPECT, height, level(height, Role.INK), name);
  }

  private static List<Shape> level(double h, Role role) {
    return List.of(beam(h, 0.1, 0.3, 1.9, 0.3, role), fulcrum(h, role));
  }

  private static List<Shape> tilted(double h) {
    return List.of(beam(h, 0.14, 0.08, 1.86, 0.52, Role.TILT), fulcrum(h, Role.TILT));
  }

  private static List<Shape> broken(double h) {
    return List.of(
        beam(h, 0.14, 0.56, 0.8, 0.16, Role.SWAY),
        beam(h, 1.2, 0.16, 1.86, 0.56, Role.SWAY),
        fulcrum(h, Role.SWAY));
  }

  private static Shape beam(double h, double x1, double y1, double x2, double y2, Role role) {
    return new Shape.Line(x1 * h, y1 * h, x2 * h, y2 * h, 0.14 * h, role);
  }

  private static Shape fulcrum(double h, Role role) {
    return new Shape.Fulcrum(h, 0.46 * h, 0.7 * h, 0.5 * h, role);
  }
}
