package org.archspan.stability;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Locale;
import org.archspan.boundary.Parity;
import org.archspan.closure.CosmicRayClosure;
import org.archspan.disk.Disk;
import org.archspan.reference.DenseReference;
import org.archspan.reference.ShootingReference;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The solver against the full (X, Y, Z) problem by LAPACK's dggev, and against shooting with an ODE integrator. */
class ReferenceLibraryTest {
  /** law (see TestDisks), alpha, beta, gamma, kappa, ky H, kx H, parity. */
  @ParameterizedTest
  @CsvSource({
      "0, 1.0, 1.0, 1.00, Infinity, 0.0, 0.6, mirror", "0, 1.0, 1.0, 1.00, Infinity, 0.0, 0.6, flexing",
      "0, 1.0, 1.0, 1.00, 3e27, 1.5, 0.5, mirror", "0, 0.5, 1.0, 1.05, 1e27, 0.7, 0.4, flexing",
      "3, 1.0, 1.0, 1.00, 3e28, 0.0, 0.7, mirror", "3, 1.0, 0.5, 1.10, 0.0, 2.0, 0.8, flexing",
      "4, 2.0, 0.3, 1.00, 1e28, 1.0, 0.6, mirror", "5, 1.0, 1.0, 1.00, 3e27, 0.5, 0.5, flexing",
      "2, 1.0, 1.0, 1.00, 3e28, 1.0, 1.0, mirror", "6, 1.0, 0.5, 1.00, Infinity, 3.0, 0.9, flexing",
      "1, 1.0, 1.0, 1.00, 1e28, 0.0, 0.5, mirror"})
  void agreesWithLapackAndWithShooting(int law, double alpha, double beta, double gasIndex, double diffusivity,
      double across, double along, String parityName) {
    Parity parity = Parity.valueOf(parityName.toUpperCase(Locale.ROOT));
    Disk disk = TestDisks.isothermal(TestDisks.law(law), alpha, beta, gasIndex,
        new CosmicRayClosure(4.0 / 3.0, diffusivity), 4.0);
    ModeProblem flat = TestDisks.problem(disk, parity, 0.0, 1e-9);
    double height = flat.equilibrium().scaleHeight();
    double ky = across / height;
    double kx = along / height;
    ModeProblem problem = TestDisks.problem(disk, parity, ky, 1e-9);
    double ours = new BranchSolver(problem).growth(kx, 0).orElseThrow().growthRate();

    double[] lapack = new DenseReference(problem.equilibrium(), problem.gas(), problem.cosmicRays(), parity, 40)
        .growthRates(kx, ky);
    // 1e-7: asked of the comparison; the collocation itself is good to about 1e-9 on 40 points
    assertThat(ours).as("LAPACK").isCloseTo(lapack[0], within(1e-7 * lapack[0]));
    double shot = new ShootingReference(problem.equilibrium(), problem.gas(), problem.cosmicRays(), parity)
        .growthRate(kx, ky, 0);
    // 1e-8: the integrator's own tolerance leaves about 1e-10
    assertThat(ours).as("shooting").isCloseTo(shot, within(1e-8 * shot));
  }
}
