package org.archspan.equilibrium;

import static org.archspan.equilibrium.TestStates.DENSITY;
import static org.archspan.equilibrium.TestStates.DISPERSION;
import static org.archspan.equilibrium.TestStates.PC;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.special.Gamma;
import org.archspan.gravity.DiskAndHaloGravity;
import org.archspan.gravity.IsothermalSheetGravity;
import org.archspan.gravity.LinearGravity;
import org.archspan.gravity.TanhGravity;
import org.archspan.gravity.UniformGravity;
import org.archspan.units.Constants;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Densities and columns that are known in closed form; {@code C = (1 + alpha + beta) c^2} throughout. */
class ClosedFormTest {
  /** A few roundings: the column is integrated with a rule of degree 31 over panels of two e-foldings at most. */
  private static final double COLUMN = 1e-13;

  private static double support(double alpha, double beta) {
    return (1.0 + alpha + beta) * DISPERSION * DISPERSION;
  }

  /** Parker (1966), ApJ 145, 811: an exponential of scale height (1 + alpha + beta) c^2/g. */
  @ParameterizedTest
  @CsvSource({"0, 0, 1e-9", "1, 1, 2e-9", "0.2, 3, 5e-9", "50, 0, 1e-7"})
  void uniformGravityGivesAnExponential(double alpha, double beta, double strength) {
    double height = support(alpha, beta) / strength;
    Equilibrium state = TestStates.isothermal(alpha, beta, new UniformGravity(strength));
    assertThat(state.scaleHeight()).isCloseTo(height, within(COLUMN * height));
    assertThat(state.surfaceDensity()).isCloseTo(2.0 * DENSITY * height, within(COLUMN * 2.0 * DENSITY * height));
    assertFall(state, z -> z / height);
  }

  /** A Gaussian of variance C/gradient, whose half-column is sqrt(pi/2) of its standard deviation. */
  @ParameterizedTest
  @CsvSource({"0, 0, 7e-30", "1, 1, 7e-30", "10, 0.3, 1e-31"})
  void linearGravityGivesAGaussian(double alpha, double beta, double gradient) {
    double deviation = Math.sqrt(support(alpha, beta) / gradient);
    double height = Math.sqrt(0.5 * Math.PI) * deviation;
    Equilibrium state = TestStates.isothermal(alpha, beta, new LinearGravity(gradient));
    assertThat(state.scaleHeight()).isCloseTo(height, within(COLUMN * height));
    assertFall(state, z -> 0.5 * (z / deviation) * (z / deviation));
  }

  /**
   * {@code rho = rho_0 sech^n(z/h)} with {@code n = g h/C}; half-column
   * {@code h sqrt(pi)/2 Gamma(n/2)/Gamma((n+1)/2)} (DLMF 5.12.7).
   */
  @ParameterizedTest
  @CsvSource({"0, 0, 2.5e-9, 150", "1, 1, 2.5e-9, 150", "5, 2, 2e-9, 40", "0, 0, 2e-8, 800"})
  void tanhGravityGivesAPowerOfSech(double alpha, double beta, double strength, double parsecs) {
    double h = parsecs * PC;
    double power = strength * h / support(alpha, beta);
    Equilibrium state = TestStates.isothermal(alpha, beta, new TanhGravity(strength, h));
    assertSech(state, power, h);
  }

  /** Stars of the support of the gas, sigma^2 = C, and the gas lies among them as sech^2 (Spitzer 1942, ApJ 95, 329). */
  @ParameterizedTest
  @CsvSource({"0, 0, 0.01", "1, 0.5, 0.02"})
  void gasAmongStarsOfItsOwnSupportIsTheirSheet(double alpha, double beta, double surfaceDensity) {
    double h = support(alpha, beta) / (Math.PI * Constants.GRAVITATIONAL_CONSTANT * surfaceDensity);
    Equilibrium state = TestStates.isothermal(alpha, beta,
        new IsothermalSheetGravity(surfaceDensity, Math.sqrt(support(alpha, beta))));
    assertThat(state.scaleHeight()).isCloseTo(h, within(COLUMN * h));
    assertSech(state, 2.0, h);
  }

  private static void assertSech(Equilibrium state, double power, double h) {
    double height = 0.5 * h * Math.sqrt(Math.PI)
        * Math.exp(Gamma.logGamma(0.5 * power) - Gamma.logGamma(0.5 * (power + 1.0)));
    // 1e-12: rounding of the two logarithms of Gamma
    assertThat(state.scaleHeight()).isCloseTo(height, within(1e-12 * height));
    assertFall(state, z -> power * Math.log(Math.cosh(z / h)));
  }

  /** Without a halo {@code rho = rho_0 exp(-x [sqrt(1 + z^2/h^2) - 1])}, x = A h/C: half-column h e^x K_1(x). */
  @ParameterizedTest
  @CsvSource({"1, 0.6019072301972346", "2, 0.1398658818165224", "0.1, 9.853844780870606"})
  void diskGravityGivesABesselFunction(double x, double besselK1) {
    double h = 200.0 * PC;
    double strength = x * support(1.0, 0.0) / h;
    Equilibrium state = TestStates.isothermal(1.0, 0.0, new DiskAndHaloGravity(strength, h, 0.0));
    double height = h * Math.exp(x) * besselK1;
    // 1e-13: as any column; K_1 is given to sixteen digits (mpmath 1.3, besselk(1, x); Abramowitz & Stegun table 9.8)
    assertThat(state.scaleHeight()).isCloseTo(height, within(COLUMN * height));
  }

  private static void assertFall(Equilibrium state, DoubleUnaryOperator efoldings) {
    for (int i = 0; i <= 20; i++) {
      double z = state.top() * i / 20.0;
      double fall = state.at(0.0).logDensity() - state.at(z).logDensity();
      // 1e-13: rounding of ln rho, which is near -54 in CGS
      assertThat(fall).as("z = %s pc", z / PC)
          .isCloseTo(efoldings.applyAsDouble(z), within(1e-13 * (1.0 + efoldings.applyAsDouble(z))));
    }
  }
}
