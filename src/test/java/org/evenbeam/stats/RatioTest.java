package org.evenbeam.stats;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigInteger;
import org.junit.jupiter.api.Test;

class RatioTest {
  private static final BigInteger FAR = BigInteger.TWO.pow(300);

  /** Halfway between two doubles, the even one being the smaller. */
  private static final BigInteger HALFWAY = BigInteger.TWO.pow(53).add(BigInteger.ONE);

  @Test
  void aHalfwayRatioGoesToTheEvenDoubleAndAnythingAboveItUp() {
    BigInteger half = HALFWAY.multiply(FAR);

    assertThat(new Ratio(half, FAR).toDouble()).isEqualTo(0x1p53);
    assertThat(new Ratio(half.add(BigInteger.ONE), FAR).toDouble()).isEqualTo(0x1p53 + 2);
    assertThat(new Ratio(half.negate(), FAR).toDouble()).isEqualTo(-0x1p53);
  }

  @Test
  void aHalfwayRootGoesToTheEvenDoubleAndAnythingAboveItUp() {
    BigInteger square = HALFWAY.multiply(HALFWAY).multiply(FAR);

    assertThat(new Ratio(square, FAR).sqrtToDouble()).isEqualTo(0x1p53);
    assertThat(new Ratio(square.add(BigInteger.ONE), FAR).sqrtToDouble()).isEqualTo(0x1p53 + 2);
  }

  @Test
  void zeroIsZero() {
    assertThat(new Ratio(BigInteger.ZERO, FAR).toDouble()).isZero();
    assertThat(new Ratio(BigInteger.ZERO, FAR).sqrtToDouble()).isZero();
  }
}
