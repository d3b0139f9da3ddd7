package org.archspan.uncertainty;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Collections;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Sensitivities against a function whose indices are known in closed form. */
class SobolIndicesTest {
  private static final UncertainInput ANGLE = new UncertainInput("x",
      new Uncertainty(Uncertainty.Shape.RANGE, 0.0, Math.PI, -4.0, 4.0), "", 1.0);

  /** sin x1 + 7 sin^2 x2 + 0.1 x3^4 sin x1 (Ishigami and Homma 1990). */
  private static double ishigami(double[] x) {
    return Math.sin(x[0]) * (1.0 + 0.1 * Math.pow(x[2], 4)) + 7.0 * Math.pow(Math.sin(x[1]), 2);
  }

  private static SobolIndices indices(long seed, int groups, double offset) {
    DrawDesign design = new DrawDesign(Collections.nCopies(3, ANGLE), seed, true);
    SobolIndices indices = new SobolIndices(3);
    double[][] values = design.values(0, groups * design.groupSize());
    for (int i = 0; i < values.length; i++) {
      indices.add(i % design.groupSize(), offset + ishigami(values[i]));
    }
    return indices;
  }

  /**
   * With a = 7 and b = 0.1: V1 = (1 + b pi^4/5)^2/2, V2 = a^2/8, V13 = b^2 pi^8 (1/18 - 1/50), hence first-order
   * 0.3139, 0.4424, 0 and total 0.5576, 0.4424, 0.2437.
   */
  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3})
  void ishigamiFunction(long seed) {
    double p4 = Math.pow(Math.PI, 4);
    double v1 = 0.5 * Math.pow(1.0 + 0.02 * p4, 2);
    double v2 = 49.0 / 8.0;
    double v13 = 0.01 * p4 * p4 * (1.0 / 18.0 - 1.0 / 50.0);
    double v = v1 + v2 + v13;
    for (double offset : new double[] {0.0, 1e4}) {
      SobolIndices found = indices(seed, 8192, offset);
      double[] first = {v1 / v, v2 / v, 0.0};
      double[] total = {(v1 + v13) / v, v2 / v, v13 / v};
      for (int j = 0; j < 3; j++) {
        // the error that the estimate itself gives, three times; for even draws it is an upper one
        assertThat(found.first(j)).isCloseTo(first[j], within(3.0 * found.firstError(j)));
        assertThat(found.total(j)).isCloseTo(total[j], within(3.0 * found.totalError(j)));
        assertThat(found.firstError(j)).isBetween(1e-4, 0.03);
        assertThat(found.totalError(j)).isBetween(1e-4, 0.03);
      }
    }
  }

  @Test
  void aGroupWithoutAnAnswerIsLeftOutAndHalfAGroupIsNone() {
    SobolIndices indices = new SobolIndices(1);
    // the last draw of a group that began in another part
    indices.add(2, 5.0);
    for (double[] group : List.of(new double[] {1.0, 2.0, 2.0}, new double[] {1.0, Double.NaN, 2.0},
        new double[] {3.0, 1.0, 1.0})) {
      for (int role = 0; role < 3; role++) {
        indices.add(role, group[role]);
      }
    }
    assertThat(indices.groups()).isEqualTo(2);
    assertThat(indices.leftOut()).isEqualTo(1);
  }
}
