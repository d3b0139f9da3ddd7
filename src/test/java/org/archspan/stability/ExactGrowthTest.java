package org.archspan.stability;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Optional;
import java.util.Random;
import org.archspan.boundary.Parity;
import org.archspan.closure.CosmicRayClosure;
import org.archspan.closure.GasClosure;
import org.archspan.reference.UniformAtmosphere;
import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.RepetitionInfo;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The solver against the closed forms of an isothermal atmosphere in uniform gravity between walls (Parker 1966, 1967). */
class ExactGrowthTest {
  /** Values with nine digits, made in two independent ways from the dispersion relation: alpha = beta = G = 1, L = 10. */
  @ParameterizedTest
  @CsvSource({"0.5, 0, 0, 0.720201289", "0.5, 0, 1, 0.589250073", "0.5, 1, 0, 0.789000737", "0.5, 3, 0, 0.818967681"})
  void referenceDigits(double kx, double ky, int order, double expected) {
    UniformAtmosphere atmosphere = new UniformAtmosphere(1.0, 1.0, 1.0, 4.0 / 3.0, Double.POSITIVE_INFINITY);
    ModeSolver solver = solver(atmosphere, 10.0, ky, 1e-10);
    double unit = solver.scales().length();
    GrowthRoot root = solver.growth(kx * unit, order, Double.NaN).orElseThrow();
    // 1e-9: the digits given
    assertThat(root.growth() / solver.scales().time()).isCloseTo(expected, within(1e-9));
  }

  /** Random alpha, beta, indices, diffusivity, kx, ky, L and order: value, count and honesty of the error. */
  @RepeatedTest(300)
  void randomAtmospheres(RepetitionInfo repetition) {
    Random random = new Random(repetition.getCurrentRepetition());
    double alpha = Math.pow(10.0, -1.5 + 2.5 * random.nextDouble());
    double beta = random.nextInt(4) == 0 ? 0.0 : 2.0 * random.nextDouble();
    double gasIndex = 0.8 + 0.6 * random.nextDouble();
    double diffusivity = new double[] {0.0, Double.POSITIVE_INFINITY, Math.pow(10.0, -1.0 + 3.0 * random.nextDouble())}
        [random.nextInt(3)];
    double top = 2.0 + 28.0 * random.nextDouble();
    double ky = random.nextInt(3) == 0 ? 0.0 : Math.pow(10.0, -1.0 + 2.0 * random.nextDouble());
    UniformAtmosphere atmosphere = new UniformAtmosphere(alpha, beta, gasIndex, 4.0 / 3.0, diffusivity);
    double marginal = atmosphere.marginalWavenumber(ky, Math.PI / top);
    double kx = (0.02 + 0.95 * random.nextDouble()) * (marginal > 0.0 ? marginal : 0.5);
    int order = random.nextInt(3);

    ModeSolver solver = solver(atmosphere, top, ky, 1e-8);
    double scaled = kx * solver.scales().length();
    Optional<GrowthRoot> root = solver.growth(scaled, order, Double.NaN);
    double exact = atmosphere.growthRate(kx, ky, top, order + 1);

    assertThat(solver.unstableModes(scaled)).isEqualTo(atmosphere.unstableModes(kx, ky, top));
    assertThat(root.isPresent()).isEqualTo(exact > 0.0);
    if (root.isPresent()) {
      // 1e-10: what the checking mesh leaves; marginal modes lose digits as 1/s^2, which the stated error covers
      double found = root.get().growth() / solver.scales().time();
      assertThat(found).isCloseTo(exact, within(Math.max(1e-10 * exact, exact * root.get().error())));
      assertThat(Math.abs(found / exact - 1.0)).isLessThan(3.0 * root.get().error() + 1e-15);
    }
  }

  static ModeSolver solver(UniformAtmosphere atmosphere, double top, double ky, double tolerance) {
    return new ModeSolver(new ModeProblem(atmosphere.equilibrium(top), new GasClosure(atmosphere.gasIndex()),
        new CosmicRayClosure(atmosphere.cosmicRayIndex(), atmosphere.diffusivity()), Parity.FLOOR, ky, tolerance));
  }
}
