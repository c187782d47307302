package org.evenbeam.picture;

import java.math.BigDecimal;

/** The texts on a picture, in one language and by one way to write figures. */
public interface Labels {
  /** Under the fulcrum. */
  String reference();

  /**
   * Under a post of the beam plot.
   *
   * @param bias the limit with its sign, in the unit of the readings
   */
  String biasLimit(BigDecimal bias);

  /**
   * At an end of the beam.
   *
   * @param bias the end of the interval
   * @param standardUncertainty of the bias, which settles the digits; may be 0
   */
  String biasEnd(double bias, double standardUncertainty);

  /**
   * Beside the arrow to readings that lie outside the picture.
   *
   * @param readings how many, 1 or more
   * @param farthest the reading farthest out, less the reference value
   */
  String readingsOutside(int readings, BigDecimal farthest);

  /** A standard deviation, an estimate or the end of its interval. */
  String standardDeviation(double value);

  /** Under the post of the spread bar. */
  String permitted(BigDecimal standardDeviation);

  /** The picture in words. */
  String describe(PictureContent content);
}
