package org.archspan.reference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.hipparchus.complex.Complex;
import org.hipparchus.linear.Array2DRowFieldMatrix;
import org.hipparchus.linear.FieldLUDecomposition;
import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.RepetitionInfo;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Holds the closed forms to digits found otherwise, to their own determinant, and to published criteria. */
class UniformAtmosphereTest {
  private static final double INFINITE = Double.POSITIVE_INFINITY;

  /** Digits: two independent dense computations made for this project; alpha = beta = G = 1, L = 10 H. */
  @ParameterizedTest
  @CsvSource({"0, 1, 0.720201289", "0, 2, 0.589250073", "1, 1, 0.789000737", "3, 1, 0.818967681"})
  void growthRatesOfTheClassicalAtmosphere(double ky, int n, double expected) {
    // 5e-10: half a unit of the last digit quoted
    assertThat(classical().growthRate(0.5, ky, 10.0, n)).isCloseTo(expected, within(5e-10));
  }

  /** The 3 x 3 determinant in complex arithmetic, as it stands before any expansion, vanishes at the root. */
  @RepeatedTest(200)
  void rootsMakeTheDeterminantVanish(RepetitionInfo repetition) {
    Random random = new Random(repetition.getCurrentRepetition());
    double diffusivity = new double[] {0.0, INFINITE, Math.exp(random.nextGaussian())}[random.nextInt(3)];
    UniformAtmosphere atmosphere = new UniformAtmosphere(0.2 + 2.0 * random.nextDouble(),
        1.5 * random.nextDouble(), 0.6 + 0.6 * random.nextDouble(),
        4.0 / 3.0 * random.nextDouble(), diffusivity);
    double kx = 0.05 + 0.5 * random.nextDouble();
    double ky = random.nextInt(3) == 0 ? 0.0 : 4.0 * random.nextDouble();
    double kz = Math.PI / 10.0 * (1 + random.nextInt(3));
    double s = atmosphere.growthRate(kx, ky, kz);
    if (s == 0.0) {
      assertThat(determinant(atmosphere, 1e-9, kx, ky, kz)).isPositive();
      return;
    }
    // 1e-11 to both sides: the sign changes there, so that the root is good to that
    assertThat(determinant(atmosphere, s * (1.0 - 1e-11), kx, ky, kz)).isNegative();
    assertThat(determinant(atmosphere, s * (1.0 + 1e-11), kx, ky, kz)).isPositive();
    assertThat(s).isLessThan(atmosphere.acrossLimit(kx));
  }

  /** Parker (1966), ApJ 145, 811: along the field only if (1+a+b)^2 > G (1 + b + 3a/2), G = gamma here. */
  @ParameterizedTest
  @CsvSource({"1, 1", "0.5, 0.3", "2, 0", "0.1, 1.5"})
  void criterionAlongTheField(double alpha, double beta) {
    double g = 1.0 + alpha + beta;
    double critical = g * g / (1.0 + beta + 1.5 * alpha);
    assertThat(closure(alpha, beta, critical * 0.999).growthRate(1e-3, 0.0, 1e-3)).isPositive();
    assertThat(closure(alpha, beta, critical * 1.001).growthRate(1e-3, 0.0, 1e-3)).isZero();
  }

  /** Newcomb (1961), Phys. Fluids 4, 391; Parker (1967), ApJ 149, 535: in 3-D only if G < 1 + a + b. */
  @ParameterizedTest
  @CsvSource({"1, 1", "0.5, 0.3", "2, 0"})
  void criterionAcrossTheField(double alpha, double beta) {
    double g = 1.0 + alpha + beta;
    assertThat(closure(alpha, beta, g * 0.999).acrossLimit(1e-3)).isPositive();
    assertThat(closure(alpha, beta, g * 1.001).acrossLimit(1e-3)).isZero();
    assertThat(closure(alpha, beta, g * 0.999).growthRate(1e-3, 1e3, 0.1)).isPositive();
  }

  @ParameterizedTest
  @CsvSource({"0, 0.314", "0, 0", "2, 0.314", "0.1, 1"})
  void growthStopsAtTheMarginalWavenumber(double ky, double kz) {
    double margin = classical().marginalWavenumber(ky, kz);
    assertThat(classical().growthRate(margin * (1.0 - 1e-12), ky, kz)).isPositive();
    assertThat(classical().growthRate(margin * (1.0 + 1e-12), ky, kz)).isZero();
  }

  @Test
  void countOfModesIsTheNumberThatGrow() {
    int count = classical().unstableModes(0.5, 1.0, 10.0);
    assertThat(count).isPositive();
    assertThat(classical().growthRate(0.5, 1.0, 10.0, count)).isPositive();
    assertThat(classical().growthRate(0.5, 1.0, 10.0, count + 1)).isZero();
  }

  @Test
  void shortWavesAcrossTheFieldTendToTheirLimit() {
    // 1e-5: the approach goes as 1/ky^2 = 1e-6
    assertThat(classical().growthRate(0.5, 1e3, 0.3)).isCloseTo(classical().acrossLimit(0.5), within(1e-5));
  }

  private static UniformAtmosphere classical() {
    return closure(1.0, 1.0, 1.0);
  }

  private static UniformAtmosphere closure(double alpha, double beta, double gasIndex) {
    return new UniformAtmosphere(alpha, beta, gasIndex, 4.0 / 3.0, INFINITE);
  }

  private static double determinant(UniformAtmosphere atmosphere, double s, double kx, double ky, double kz) {
    double leak = atmosphere.diffusivity() * kx * kx;
    double share = Double.isInfinite(leak) ? 0.0 : s / (s + leak);
    double stiffness = atmosphere.gasIndex() + atmosphere.cosmicRayIndex() * atmosphere.beta() * share;
    double g = atmosphere.gravity();
    double tension = 2.0 * atmosphere.alpha();
    double w = s * s;
    Complex slope = new Complex(0.5, kz);
    // columns: X, Y, Z; d is the divergence, q the gas part and p the whole of the pressure perturbation
    Complex[] d = {new Complex(kx), new Complex(ky), slope};
    Complex[][] m = new Complex[3][3];
    for (int j = 0; j < 3; j++) {
      Complex q = d[j].multiply(stiffness).subtract(j == 2 ? g : 0.0);
      Complex p = q.add((j == 0 ? Complex.ZERO : d[j]).multiply(tension));
      m[0][j] = q.multiply(kx);
      m[1][j] = p.multiply(ky);
      m[2][j] = d[j].multiply(-g).subtract(p.multiply(new Complex(-0.5, kz)));
    }
    m[0][0] = m[0][0].add(w);
    m[1][1] = m[1][1].add(w + tension * kx * kx);
    m[2][2] = m[2][2].add(w + tension * kx * kx + g);
    return new FieldLUDecomposition<>(new Array2DRowFieldMatrix<>(m)).getDeterminant().getReal();
  }
}
