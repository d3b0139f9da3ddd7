package org.archspan.rivals;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import dev.ludovic.netlib.lapack.JavaLAPACK;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.netlib.util.intW;

/** Interface waves against closed forms and an independent solution between walls. */
class InterfaceWavesTest {
  private static final double INFINITE = Double.POSITIVE_INFINITY;

  private static LayerInterface layers(double below, double above, double tensionBelow, double tensionAbove, double shear,
      double gravity, double depthBelow, double depthAbove) {
    return new LayerInterface("test", below, above, Math.sqrt(4.0 * Math.PI * tensionBelow),
        Math.sqrt(4.0 * Math.PI * tensionAbove), shear, gravity, depthBelow, depthAbove);
  }

  /** Chandrasekhar (1961), ch. X: s^2 = g k (rho2 - rho1)/(rho2 + rho1) - (k.B)^2/[2 pi (rho1 + rho2)]; rho 1 under 3,
   * B^2/4 pi = 0.1, g = k = 1: s = 0.67082. */
  @Test
  void denseAboveLightWithField() {
    InterfaceWaves waves = new InterfaceWaves(layers(1, 3, 0.1, 0.1, 0, 1, INFINITE, INFINITE));
    // the digits of the reference value
    assertThat(waves.growthRate(1.0)).isCloseTo(0.67082, within(5e-6));
    assertThat(waves.deepCutoff()).isCloseTo(2.0 * Math.PI / 10.0, within(1e-14));
    assertThat(waves.cutoff()).isCloseTo(waves.deepCutoff(), within(1e-12));
    // a maximum's place is known to the root of the rounding error
    assertThat(waves.fastest()).isCloseTo(waves.deepFastest(), within(1e-6));
  }

  /** Chandrasekhar (1961), ch. XI: s = k dV sqrt(rho1 rho2)/(rho1 + rho2), without limit towards short waves. */
  @Test
  void shearAlone() {
    InterfaceWaves waves = new InterfaceWaves(layers(1, 4, 0, 0, 3, 0, INFINITE, INFINITE));
    // rounding
    assertThat(waves.growthRate(2.0)).isCloseTo(2.0 * 3.0 * 2.0 / 5.0, within(1e-14));
    assertThat(waves.unbounded()).isTrue();
    assertThat(waves.fastest()).isNaN();
  }

  /** Ch. XI, section 106: a field holds the shear of equal densities where dV is below twice the Alfven speed. */
  @ParameterizedTest
  @CsvSource({"1.99, false", "2.01, true"})
  void tensionHoldsShear(double shear, boolean unbounded) {
    InterfaceWaves waves = new InterfaceWaves(layers(1, 1, 1, 1, shear, 0, INFINITE, INFINITE));
    assertThat(waves.unbounded()).isEqualTo(unbounded);
    assertThat(waves.growthRate(1.0) > 0.0).isEqualTo(unbounded);
  }

  /** Ch. XI: light above dense, waves longer than 2 pi rho1 rho2 dV^2/[g (rho1^2 - rho2^2)] are held by gravity. */
  @Test
  void gravityHoldsLongWavesOfShear() {
    InterfaceWaves waves = new InterfaceWaves(layers(3, 1, 0, 0, 2, 1, INFINITE, INFINITE));
    // 1e-11: the root finder's
    assertThat(waves.cutoff()).isCloseTo(2.0 * Math.PI * 3.0 * 4.0 / 8.0, within(1e-11));
  }

  /** Depths that matter: the energy principle of section-wise uniform layers on finite elements, solved by LAPACK's dsygv. */
  @ParameterizedTest
  @CsvSource({"1, 3, 0.1, 0.02, 1, 0.5, 2", "1, 3, 0, 0, 0.7, 1, 0.4", "1, 2, 0.05, 0.1, 3, 2, 1",
      "1, 1.5, 0.01, 0.02, 2, 1, 0.3"})
  void finiteDepthsFollowAnIndependentSolution(double below, double above, double tensionBelow, double tensionAbove,
      double k, double depthBelow, double depthAbove) {
    double coarse = reference(below, above, tensionBelow, tensionAbove, k, depthBelow, depthAbove, 40);
    double fine = reference(below, above, tensionBelow, tensionAbove, k, depthBelow, depthAbove, 80);
    double extrapolated = fine + (fine - coarse) / 3.0;
    double squared = new InterfaceWaves(layers(below, above, tensionBelow, tensionAbove, 0, 1, depthBelow, depthAbove))
        .growthRateSquared(k);
    // linear elements, extrapolated once: fourth order in the 1/80 of a depth
    assertThat(squared).isCloseTo(extrapolated, within(1e-5));
  }

  /** Greatest s^2 of incompressible waves, X = -Z'/k: rho s^2 (Z'^2/k^2 + Z^2) + M (Z'^2 + k^2 Z^2) - g [rho] Z^2. */
  private static double reference(double below, double above, double tensionBelow, double tensionAbove, double k,
      double depthBelow, double depthAbove, int cells) {
    int n = 2 * cells - 1;
    double[] work = new double[n * n];
    double[] mass = new double[n * n];
    for (int e = 0; e < 2 * cells; e++) {
      boolean lower = e < cells;
      double h = (lower ? depthBelow : depthAbove) / cells;
      for (int i = 0; i < 2; i++) {
        for (int j = 0; j < 2; j++) {
          int row = e - 1 + i;
          int column = e - 1 + j;
          if (row >= 0 && row < n && column >= 0 && column < n) {
            double slopes = (i == j ? 1.0 : -1.0) / h;
            double values = h * (i == j ? 2.0 : 1.0) / 6.0;
            mass[row + n * column] += (lower ? below : above) * (slopes / (k * k) + values);
            work[row + n * column] -= (lower ? tensionBelow : tensionAbove) * (slopes + k * k * values);
          }
        }
      }
    }
    work[(cells - 1) * (n + 1)] += above - below;
    double[] values = new double[n];
    double[] scratch = new double[64 * n];
    intW info = new intW(0);
    JavaLAPACK.getInstance().dsygv(1, "N", "U", n, work, n, mass, n, values, scratch, scratch.length, info);
    assertThat(info.val).isZero();
    return values[n - 1];
  }

  @Test
  void layersFarShallowerThanTheWaveReachTheShallowLimits() {
    InterfaceWaves waves = new InterfaceWaves(layers(1, 3, 0.02, 0.02, 0, 1, 0.0201, 0.0203));
    // growth over k, to the next term of coth: (kh)^2/3
    assertThat(waves.growthRateSquared(1e-2)).isCloseTo(1e-4 * Math.pow(waves.shallowGrowthSpeed(), 2), within(1e-9));
    assertThat(waves.shallowCutoff()).isCloseTo(waves.cutoff(), within(0.01 * waves.cutoff()));
  }

  @Test
  void depthsAreForgottenByShortWaves() {
    double deep = new InterfaceWaves(layers(1, 3, 0.1, 0.1, 0.5, 1, INFINITE, INFINITE)).growthRateSquared(4.0);
    // coth(40) = 1 to rounding
    assertThat(new InterfaceWaves(layers(1, 3, 0.1, 0.1, 0.5, 1, 10, 10)).growthRateSquared(4.0))
        .isCloseTo(deep, within(1e-13));
  }

  /** Tension below holds the shear of deep layers; a shallow layer without field above is heavy to long waves,
   * which grow. */
  @Test
  void wallsMayLetLongWavesGrow() {
    LayerInterface shallowAbove = layers(1, 1, 1, 0, Math.sqrt(1.9), 0, 10, 0.1);
    InterfaceWaves waves = new InterfaceWaves(shallowAbove);
    assertThat(waves.deepCutoff()).isNaN();
    assertThat(waves.unbounded()).isFalse();
    // r1 = 1, r2 = coth(0.1 k) = y, 10 k far above 1: 1.9 y/(1 + y) = 1, y = 10/9, k = 10 artanh(0.9) = 5 ln 19;
    // 1e-9: the root finder's
    assertThat(2.0 * Math.PI / waves.cutoff()).isCloseTo(5.0 * Math.log(19.0), within(1e-9));
    assertThat(waves.fastest()).isGreaterThan(waves.cutoff());
  }
}
