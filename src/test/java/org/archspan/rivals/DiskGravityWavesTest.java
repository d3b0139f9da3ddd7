package org.archspan.rivals;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Random;
import org.archspan.units.Constants;
import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.RepetitionInfo;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Gravity in the plane of the disk against closed forms. Units 2 pi G = 1 are made by the surface densities. */
class DiskGravityWavesTest {
  private static final double UNIT = 1.0 / (2.0 * Math.PI * Constants.GRAVITATIONAL_CONSTANT);

  /** One thin fluid: w^2 = kappa^2 - 2 pi G Sigma k + c^2 k^2, fastest k = pi G Sigma/c^2 (Toomre 1964; gas:
   * Goldreich and Lynden-Bell 1965). */
  @ParameterizedTest
  @CsvSource({"1, 1, 0.3", "2, 0.5, 0", "1, 3, 0.16"})
  void oneThinFluidFollowsTheClosedForm(double column, double speed, double kappa) {
    DiskGravityWaves waves = new DiskGravityWaves(List.of(new PlaneFluid(column * UNIT, speed, 0.0)), kappa);
    double fastest = 0.5 * column / (speed * speed);
    // 1e-6: a maximum is flat, so its place is known to the root of the rounding error
    assertThat(waves.fastestWavenumber()).isCloseTo(fastest, within(1e-6 * fastest));
    assertThat(waves.growthRateSquared(fastest)).isCloseTo(
        0.25 * column * column / (speed * speed) - kappa * kappa, within(1e-13));
    // Q = kappa c/(pi G Sigma); rounding of the maximum
    double q = 2.0 * kappa * speed / column;
    if (q > 0.0) {
      assertThat(waves.stabilityParameter()).isCloseTo(q, within(1e-10 * q));
      double root = Math.sqrt(1.0 - q * q);
      assertThat(waves.longestUnstable()).isCloseTo(2.0 * Math.PI / (fastest * (1.0 - root)), within(1e-9 / fastest));
      assertThat(waves.shortestUnstable()).isCloseTo(2.0 * Math.PI / (fastest * (1.0 + root)), within(1e-9 / fastest));
    } else {
      assertThat(waves.longestUnstable()).isInfinite();
    }
  }

  /** The biquadratic of Jog and Solomon (1984), ApJ 276, 114, with the thickness factor on either fluid's gravity. */
  @RepeatedTest(30)
  void twoFluidsFollowTheBiquadratic(RepetitionInfo repetition) {
    Random random = new Random(repetition.getCurrentRepetition());
    PlaneFluid gas = new PlaneFluid(UNIT * (0.1 + random.nextDouble()), 0.2 + random.nextDouble(), random.nextDouble());
    PlaneFluid stars = new PlaneFluid(UNIT * 5.0 * (0.1 + random.nextDouble()), 0.5 + 4.0 * random.nextDouble(),
        random.nextDouble());
    double kappa = 2.0 * random.nextDouble();
    double k = Math.exp(6.0 * random.nextDouble() - 3.0);
    double pullGas = gas.surfaceDensity() / UNIT * k / (1.0 + k * gas.height());
    double pullStars = stars.surfaceDensity() / UNIT * k / (1.0 + k * stars.height());
    double alone = kappa * kappa + gas.speed() * gas.speed() * k * k - pullGas;
    double others = kappa * kappa + stars.speed() * stars.speed() * k * k - pullStars;
    double expected = -0.5 * (alone + others
        - Math.sqrt((alone - others) * (alone - others) + 4.0 * pullGas * pullStars));
    // 1e-11 of the terms that cancel in the closed form
    assertThat(new DiskGravityWaves(List.of(gas, stars), kappa).growthRateSquared(k))
        .isCloseTo(expected, within(1e-11 * (Math.abs(alone) + Math.abs(others) + pullGas + pullStars)));
  }

  @Test
  void anotherFluidAndLessThicknessDestabilise() {
    PlaneFluid gas = new PlaneFluid(UNIT, 1.0, 0.5);
    PlaneFluid stars = new PlaneFluid(4.0 * UNIT, 3.0, 1.0);
    double alone = new DiskGravityWaves(List.of(gas), 1.0).stabilityParameter();
    double thick = new DiskGravityWaves(List.of(gas, stars), 1.0).stabilityParameter();
    double thin = new DiskGravityWaves(List.of(gas.thin(), stars.thin()), 1.0).stabilityParameter();
    assertThat(thin).isLessThan(thick);
    assertThat(thick).isLessThan(alone);
    // Romeo and Wiegert (2011) state their thick parameter to be within some ten per cent of the exact one (from memory)
    assertThat(TwoComponentParameter.thick(gas, stars, 1.0)).isCloseTo(thick, within(0.25 * thick));
  }

  /** A self-gravitating sheet without field stops growing at kH = 1 exactly (Ledoux 1951); with
   * c^2 = pi G Sigma H the factor 1/(1 + kH) gives kH (1 + kH) = 2, the same. */
  @Test
  void theThicknessFactorKeepsTheMarginalWaveOfTheIsothermalSheet() {
    PlaneFluid sheet = new PlaneFluid(2.0 * UNIT, 1.0, 1.0);
    // 1e-10: the root finder's
    assertThat(new DiskGravityWaves(List.of(sheet), 0.0).shortestUnstable()).isCloseTo(2.0 * Math.PI, within(1e-10));
  }

  /** Toomre (1964): the critical wavelength is 4 pi^2 G Sigma/kappa^2, and fastest wave of Q = 1 is half of it. */
  @Test
  void swingParameterCountsCriticalWavelengths() {
    double critical = SwingAmplification.criticalWavelength(UNIT, 1.0);
    // rounding
    assertThat(critical).isCloseTo(2.0 * Math.PI, within(1e-14 * critical));
    double radius = 8.0;
    double arms = 2.0;
    double published = radius / (2.0 * Math.PI * Constants.GRAVITATIONAL_CONSTANT * UNIT * arms);
    assertThat(SwingAmplification.parameter(2.0 * Math.PI * radius / arms, UNIT, 1.0)).isCloseTo(published,
        within(1e-13 * published));
  }

  /** At the Jeans length uniform gas is neutral: 4 pi G rho = c^2 k^2 (Jeans 1902). */
  @Test
  void jeansLengthIsNeutral() {
    double k = 2.0 * Math.PI / JeansScale.length(3.0, 0.2);
    double growth = JeansScale.fastestGrowth(0.2);
    assertThat(growth * growth).isCloseTo(9.0 * k * k, within(1e-14 * growth * growth));
  }
}
