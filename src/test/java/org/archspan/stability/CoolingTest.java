package org.archspan.stability;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.archspan.boundary.Parity;
import org.archspan.closure.CosmicRayClosure;
import org.archspan.closure.GasClosure;
import org.archspan.disk.Disk;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.EquilibriumBuilder;
import org.archspan.reference.UniformAtmosphere;
import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.RepetitionInfo;
import org.junit.jupiter.api.Test;

/** Newtonian cooling: between the adiabatic and the isothermal gas, and exact where the dispersion relation is. */
class CoolingTest {
  /**
   * Uniform gravity between walls (Parker 1966) with the index taken at the growth rate itself: growth falls with the
   * index and the index rises with growth, so that s(gamma(x)) - x has one root, found by bisection.
   */
  @RepeatedTest(60)
  void exactGrowthOfACoolingAtmosphere(RepetitionInfo repetition) {
    Random random = new Random(repetition.getCurrentRepetition());
    double alpha = 0.3 + 2.0 * random.nextDouble();
    double beta = random.nextDouble();
    double index = 1.0 + 0.6 * random.nextDouble();
    double coolingTime = Math.pow(10.0, -2.0 + 4.0 * random.nextDouble());
    double top = 5.0 + 8.0 * random.nextDouble();
    double ky = random.nextBoolean() ? 0.0 : 2.0 * random.nextDouble();
    double kx = 0.2 + 0.4 * random.nextDouble();
    double low = 0.0;
    double high = growth(alpha, beta, 1.0, kx, ky, top);
    for (int step = 0; step < 200; step++) {
      double s = 0.5 * (low + high);
      double effective = (index * s * coolingTime + 1.0) / (s * coolingTime + 1.0);
      if (growth(alpha, beta, effective, kx, ky, top) > s) {
        low = s;
      } else {
        high = s;
      }
    }
    UniformAtmosphere state = new UniformAtmosphere(alpha, beta, 1.0, 4.0 / 3.0, Double.POSITIVE_INFINITY);
    BranchSolver solver = new BranchSolver(new ModeProblem(state.equilibrium(top), new GasClosure(index, coolingTime),
        CosmicRayClosure.instantDiffusion(), Parity.FLOOR, ky, 1e-9));
    double found = solver.growth(kx, 0).map(GrowthPoint::growthRate).orElse(0.0);
    // 1e-9: the tolerance; near the margin s^2 is good to 1e-14
    assertThat(found).isCloseTo(low, within(Math.max(1e-9 * low, 1e-7 * (low < 1e-3 ? 1.0 : 0.0))));
  }

  private static double growth(double alpha, double beta, double index, double kx, double ky, double top) {
    return new UniformAtmosphere(alpha, beta, index, 4.0 / 3.0, Double.POSITIVE_INFINITY).growthRate(kx, ky, top, 1);
  }

  @RepeatedTest(10)
  void bothLimitsAndTheWayBetween(RepetitionInfo repetition) {
    Disk disk = TestDisks.isothermal(TestDisks.law(repetition.getCurrentRepetition()), 1.0, 1.0, 1.3,
        new CosmicRayClosure(4.0 / 3.0, 3e27), 5.0);
    Equilibrium equilibrium = EquilibriumBuilder.build(disk, 1e-8);
    double crossing = equilibrium.scaleHeight() / equilibrium.dispersion();
    double adiabatic = growth(disk, equilibrium, new GasClosure(1.3));
    double isothermal = growth(disk, equilibrium, new GasClosure(1.0));
    // 1e-6: cooling a million times slower, or faster, than the crossing time
    assertThat(growth(disk, equilibrium, new GasClosure(1.3, 1e7 * crossing))).isCloseTo(adiabatic,
        within(1e-6 * adiabatic));
    assertThat(growth(disk, equilibrium, new GasClosure(1.3, 1e-7 * crossing))).isCloseTo(isothermal,
        within(1e-6 * isothermal));
    double last = isothermal;
    for (double time : new double[] {0.01, 0.1, 1.0, 10.0, 100.0}) {
      double s = growth(disk, equilibrium, new GasClosure(1.3, time * crossing));
      assertThat(s).isBetween(adiabatic * (1.0 - 1e-8), last * (1.0 + 1e-8));
      last = s;
    }
  }

  private static double growth(Disk disk, Equilibrium equilibrium, GasClosure gas) {
    return new BranchSolver(new ModeProblem(equilibrium, gas, disk.cosmicRays().closure(), Parity.MIRROR, 0.0, 1e-8))
        .growth(0.5 / equilibrium.scaleHeight(), 0).map(GrowthPoint::growthRate).orElse(0.0);
  }

  @Test
  void refusesImpossibleCooling() {
    assertThatThrownBy(() -> new GasClosure(1.2, 0.0)).hasMessageContaining("cooling time must be positive");
    assertThatThrownBy(() -> new GasClosure(0.9, 1.0)).hasMessageContaining("at least 1");
  }
}
