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
  /** The peak of the exact dispersion relation (Parker 1966); value, place and honesty of both errors. */
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
    double peak = exactPeak(exact, top);
    double growth = found.root().get().growth() / solver.scales().time();
    double wavenumber = found.root().get().wavenumber() / solver.scales().length();
    double expected = exact.growthRate(peak, 0.0, top, 1);
    assertThat(Math.abs(growth / expected - 1.0)).isLessThan(3.0 * found.root().get().error() + 1e-14);
    assertThat(Math.abs(wavenumber / peak - 1.0)).isLessThan(3.0 * found.wavelengthError() + 1e-13);
    assertThat(solver.marginalWavenumber(0) / solver.scales().length()).isCloseTo(marginal, within(1e-8 * marginal));
  }

  /**
   * With x = s^2, K = kx^2, q = K + kz^2 + 1/4, A = G + 2 alpha, B = 2 alpha G, E = G (1 + beta + 3 alpha/2) - (1+alpha+beta)^2:
   * x^2 + A q x + K [B (K + kz^2) + E] = 0, and its derivative at the peak, A x + B (2 K + kz^2) + E = 0. Eliminating x
   * leaves a quadratic in K.
   */
  private static double exactPeak(UniformAtmosphere atmosphere, double top) {
    double g = atmosphere.gravity();
    double stiffness = atmosphere.gasIndex();
    double alpha = atmosphere.alpha();
    double a = stiffness + 2.0 * alpha;
    double b = 2.0 * alpha * stiffness;
    double e = stiffness * (1.0 + atmosphere.beta() + 1.5 * alpha) - g * g;
    double kz2 = Math.pow(Math.PI / top, 2);
    double u = 2.0 * b / a;
    double w = (b * kz2 + e) / a;
    double square = u * u - a * u + b;
    double linear = 2.0 * u * w - a * w - a * u * (kz2 + 0.25) + b * kz2 + e;
    double constant = w * w - a * w * (kz2 + 0.25);
    double root = Math.sqrt(linear * linear - 4.0 * square * constant);
    for (double k2 : new double[] {(-linear - root) / (2.0 * square), (-linear + root) / (2.0 * square)}) {
      if (k2 > 0.0 && -(u * k2 + w) > 0.0) {
        return Math.sqrt(k2);
      }
    }
    throw new AssertionError("no peak although the atmosphere is unstable");
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

  /** At most six factorisations a wavelength on a curve, its checks and first point included. */
  @RepeatedTest(20)
  void aCurveIsCheap(RepetitionInfo repetition) {
    long seed = repetition.getCurrentRepetition();
    BranchSolver solver = new BranchSolver(TestDisks.problem(TestDisks.random(seed), Parity.MIRROR, 0.0, 1e-8));
    double marginal = solver.marginalWavenumber(0);
    double[] wavenumbers = new double[100];
    for (int i = 0; i < 100; i++) {
      wavenumbers[i] = marginal * (0.05 + 0.9 * i / 100.0);
    }
    solver.curve(0, wavenumbers, false);
    long before = solver.factorisations();
    solver.curve(0, wavenumbers, false);
    assertThat(solver.factorisations() - before).isLessThanOrEqualTo(marginal > 0.0 ? 600 : 100);
  }
}
