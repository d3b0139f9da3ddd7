package org.archspan.stability;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.archspan.boundary.Parity;
import org.archspan.equilibrium.EquilibriumBuilder;
import org.archspan.disk.Disk;
import org.archspan.reference.UniformAtmosphere;
import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.RepetitionInfo;

/** The fastest mode and the proof that nothing is faster. */
class FastestModeTest {
  /** The peak of the exact dispersion relation (Parker 1966), found by golden section; value, place and honesty. */
  @RepeatedTest(200)
  void exactPeakOfTheUniformAtmosphere(RepetitionInfo repetition) {
    Random random = new Random(1000 + repetition.getCurrentRepetition());
    double alpha = Math.pow(10.0, -0.7 + 1.5 * random.nextDouble());
    double beta = random.nextDouble();
    double index = 0.9 + 0.25 * random.nextDouble();
    double top = 6.0 + 10.0 * random.nextDouble();
    UniformAtmosphere exact = new UniformAtmosphere(alpha, beta, index, 4.0 / 3.0, Double.POSITIVE_INFINITY);
    double marginal = exact.marginalWavenumber(0.0, Math.PI / top);
    ModeSolver solver = ExactGrowthTest.solver(exact, top, 0.0, 1e-8);
    FastestMode found = FastestMode.find(solver, 0, 0.0, Double.POSITIVE_INFINITY, 0.0);
    assertThat(found.root().isPresent()).isEqualTo(marginal > 0.0);
    if (found.root().isEmpty()) {
      return;
    }
    double peak = goldenSection(exact, top, marginal);
    double growth = found.root().get().growth() / solver.scales().time();
    double wavenumber = found.root().get().wavenumber() / solver.scales().length();
    double expected = exact.growthRate(peak, 0.0, top, 1);
    assertThat(Math.abs(growth / expected - 1.0)).isLessThan(3.0 * found.root().get().error() + 1e-14);
    // 2e-7: golden section on function values cannot place a maximum better than the root of the rounding error
    assertThat(wavenumber).isCloseTo(peak, within(2e-7 * peak));
    assertThat(solver.marginalWavenumber(0) / solver.scales().length()).isCloseTo(marginal, within(1e-8 * marginal));
  }

  private static double goldenSection(UniformAtmosphere exact, double top, double marginal) {
    double low = 0.0;
    double high = marginal;
    double ratio = 0.5 * (Math.sqrt(5.0) - 1.0);
    for (int step = 0; step < 60; step++) {
      double a = high - ratio * (high - low);
      double b = low + ratio * (high - low);
      if (exact.growthRate(a, 0.0, top, 1) < exact.growthRate(b, 0.0, top, 1)) {
        low = a;
      } else {
        high = b;
      }
    }
    return 0.5 * (low + high);
  }

  /** No wavenumber of a dense scan grows faster than the proved bound, and the peak itself is reached. */
  @RepeatedTest(40)
  void nothingOnADenseScanIsFaster(RepetitionInfo repetition) {
    long seed = repetition.getCurrentRepetition();
    Disk disk = TestDisks.random(seed);
    double across = (seed % 4) / EquilibriumBuilder.build(disk, 1e-8).scaleHeight();
    ModeSolver solver = new ModeSolver(TestDisks.problem(disk, seed % 2 == 0 ? Parity.MIRROR : Parity.FLEXING, across,
        1e-8));
    for (int order = 0; order < 2; order++) {
      FastestMode found = FastestMode.find(solver, order, 0.0, Double.POSITIVE_INFINITY, 0.0);
      double best = 0.0;
      double marginal = solver.marginalWavenumber(order);
      for (int i = 1; i < 200; i++) {
        best = Math.max(best, solver.growth(marginal * i / 200.0, order, Double.NaN).map(GrowthRoot::growth).orElse(0.0));
      }
      if (found.root().isEmpty()) {
        assertThat(best).isZero();
      } else {
        assertThat(best).isLessThanOrEqualTo(found.bound());
        assertThat(found.root().get().growth()).isGreaterThanOrEqualTo(best * (1.0 - 1e-2));
        if (order == 0) {
          assertThat(found.root().get().growth()).isGreaterThanOrEqualTo(best * (1.0 - 1e-6));
        }
      }
    }
  }

  /** The interval form never counts fewer modes than any wavenumber inside has. */
  @RepeatedTest(60)
  void intervalCountsAreUpperBounds(RepetitionInfo repetition) {
    Random random = new Random(repetition.getCurrentRepetition());
    Disk disk = TestDisks.random(repetition.getCurrentRepetition());
    double height = EquilibriumBuilder.build(disk, 1e-8).scaleHeight();
    ModeSolver solver = new ModeSolver(TestDisks.problem(disk, Parity.FLEXING, 3.0 * random.nextDouble() / height, 1e-8));
    double low = random.nextDouble();
    double high = low + 0.5 * random.nextDouble();
    double s = solver.fastestPossible() * (0.05 + 0.9 * random.nextDouble());
    int bound = solver.count(s, low, high);
    boolean positive = solver.positive(s, low, high);
    for (int i = 0; i <= 20; i++) {
      double k = low + (high - low) * i / 20.0;
      int count = solver.count(s, k, k);
      assertThat(count).isLessThanOrEqualTo(bound);
      if (positive) {
        assertThat(count).isZero();
      }
    }
  }
}
