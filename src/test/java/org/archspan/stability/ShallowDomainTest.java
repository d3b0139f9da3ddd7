package org.archspan.stability;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.archspan.boundary.Parity;
import org.archspan.closure.CosmicRayClosure;
import org.archspan.disk.Disk;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.reference.ShootingReference;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Domains lower than the first element would like to be, between a fixed bottom and a lid. */
class ShallowDomainTest {
  @ParameterizedTest
  @CsvSource({"1, 0.5, 1.0, 10.0, 0.0", "1, 1.4, 1.0, 2.0, 0.0", "1, 1.9, 0.3, 2.0, 3.0", "0, 0.7, 0.1, 4.0, 0.0",
      "5, 1.2, 0.2, 3.0, 1.0"})
  void growthAndMarginAgreeWithShooting(int law, double top, double alpha, double beta, double across) {
    CosmicRayClosure instant = CosmicRayClosure.instantDiffusion();
    Disk disk = TestDisks.isothermal(TestDisks.law(law), alpha, beta, 1.0, instant, top);
    ModeProblem problem = TestDisks.problem(disk, Parity.MIRROR, 0.0, 1e-8);
    Equilibrium equilibrium = problem.equilibrium();
    double ky = across / equilibrium.scaleHeight();
    BranchSolver solver = new BranchSolver(new ModeProblem(equilibrium, disk.gasClosure(), instant, Parity.MIRROR, ky,
        1e-8));
    ShootingReference shooting = new ShootingReference(equilibrium, disk.gasClosure(), instant, Parity.MIRROR);
    double margin = solver.marginalWavenumber(0);
    assertThat(margin).isPositive();
    // 1e-3: shooting counts at a growth of 1e-5 crossing rates, where the margin has moved by far less
    double slow = 1e-5 * equilibrium.dispersion() / equilibrium.scaleHeight();
    assertThat(shooting.fasterThan(slow, margin * 0.999, ky)).isEqualTo(1);
    assertThat(shooting.fasterThan(slow, margin * 1.001, ky)).isZero();
    double s = solver.growth(0.6 * margin, 0).orElseThrow().growthRate();
    // 1e-8: the tolerance asked for
    assertThat(s).isCloseTo(shooting.growthRate(0.6 * margin, ky, 0), within(1e-8 * s));
  }
}
