package org.archspan.uncertainty;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.apache.commons.math3.random.SobolSequenceGenerator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The values of the draws. */
class DrawDesignTest {
  private static final UncertainInput SHARE = new UncertainInput("x", uniform(), "", 1.0);

  private static Uncertainty uniform() {
    return new Uncertainty(Uncertainty.Shape.RANGE, 0.5, 0.5, 0.0, 1.0);
  }

  /** Any range of draws has the values that it has within a longer one. */
  @ParameterizedTest
  @ValueSource(booleans = {false, true})
  void aDrawDependsOnTheSeedAndItsIndexAlone(boolean sensitivities) {
    DrawDesign design = new DrawDesign(List.of(SHARE, SHARE, SHARE), 7, sensitivities);
    double[][] all = design.values(0, 3000);
    for (int first : new int[] {0, 1, 2, 63, 64, 1000, 2047, 2998}) {
      double[][] some = design.values(first, 2);
      assertThat(some[0]).isEqualTo(all[first]);
      assertThat(some[1]).isEqualTo(all[first + 1]);
    }
    assertThat(new DrawDesign(design.inputs(), 8, sensitivities).values(5, 1)[0]).isNotEqualTo(all[5]);
  }

  /** Skipping in the library's sequence is the same as going through it, far out too. */
  @Test
  void theSequenceCanBeEnteredAnywhere() {
    SobolSequenceGenerator walked = new SobolSequenceGenerator(4);
    for (int i = 0; i < 5000; i++) {
      assertThat(new SobolSequenceGenerator(4).skipTo(i)).isEqualTo(walked.nextVector());
    }
  }

  /** Every block of 2^m points at a multiple of 2^m has one point in each of 2^m equal intervals, shifted or not. */
  @ParameterizedTest
  @ValueSource(longs = {1, 2, -5, 123456789})
  void theShiftKeepsTheEvenness(long seed) {
    double[][] values = new DrawDesign(List.of(SHARE, SHARE), seed, false).values(4096, 1024);
    for (int dimension = 0; dimension < 2; dimension++) {
      boolean[] seen = new boolean[1024];
      for (double[] value : values) {
        assertThat(value[dimension]).isBetween(0.0, 1.0);
        seen[(int) (1024 * value[dimension])] = true;
      }
      assertThat(seen).doesNotContain(false);
    }
  }

  @Test
  void aGroupSharesItsValuesAsSensitivitiesNeed() {
    double[][] group = new DrawDesign(List.of(SHARE, SHARE), 3, true).values(400, 4);
    assertThat(group[2]).containsExactly(group[1][0], group[0][1]);
    assertThat(group[3]).containsExactly(group[0][0], group[1][1]);
  }

  /** shape; centre; spread; lowest; highest; share; value. Quantiles of the normal distribution: any table of it. */
  @ParameterizedTest
  @CsvSource(delimiter = ';', value = {"RANGE; 5; 2; 0; Infinity; 0.25; 4", "NORMAL; 5; 2; -Infinity; Infinity; 0.5; 5",
      "NORMAL; 5; 2; -Infinity; Infinity; 0.8413447460685429; 7", "FACTOR; 3; 2; 0; Infinity; 0.8413447460685429; 6",
      "FACTOR; 3; 2; 0; Infinity; 0.15865525393145707; 1.5", "NORMAL; 0; 1; 0; Infinity; 0.5; 0.6744897501960817",
      "FACTOR; 3; 2; 0; 3; 0.5; 1.8796613356"})
  void quantiles(Uncertainty.Shape shape, double centre, double spread, double lowest, double highest, double share,
      double value) {
    // 1e-7: the printed digits of the last case, 3 * 2^-0.67448975
    assertThat(new Uncertainty(shape, centre, spread, lowest, highest).quantile(share)).isCloseTo(value, within(1e-7));
  }

  @Test
  void aCutDistributionStaysWithinItsLimits() {
    Uncertainty cut = new Uncertainty(Uncertainty.Shape.NORMAL, 1.0, 3.0, 0.0, 4.0);
    for (double share = 1e-9; share < 1.0; share += 0.01) {
      assertThat(cut.quantile(share)).isBetween(0.0, 4.0);
    }
  }
}
