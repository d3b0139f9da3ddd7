package org.archspan.stability;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.archspan.boundary.Parity;
import org.archspan.boundary.TopBoundary;
import org.archspan.closure.CosmicRayClosure;
import org.archspan.closure.GasClosure;
import org.archspan.disk.CosmicRays;
import org.archspan.disk.Disk;
import org.archspan.disk.Domain;
import org.archspan.disk.Gas;
import org.archspan.disk.Height;
import org.archspan.disk.MagneticField;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.gravity.IsothermalSheetGravity;
import org.archspan.reference.ShootingReference;
import org.junit.jupiter.api.Test;

/** Peaks among hundreds of modes, and branches that end in the continuum above an open top. */
class CrowdAndContinuumTest {
  private static final CosmicRayClosure INSTANT = CosmicRayClosure.instantDiffusion();

  /** The mesh is fine where the fastest mode lives and coarse elsewhere; the slow modes live everywhere. */
  @Test
  void aPeakAmongHundredsOfModesIsCounted() {
    Disk disk = new Disk(new Gas.Isothermal(3.587e5, OptionalDouble.of(2.34e-24), OptionalDouble.empty()),
        new GasClosure(0.5376), new MagneticField.ConstantRatio(7.9e-3), new CosmicRays.PressureRatio(2.481, INSTANT),
        List.of(new IsothermalSheetGravity(2.492e-3, 1.6625e6)), Domain.aboutMidplane(
            Optional.of(Height.scaleHeights(12.178)), TopBoundary.LID));
    ModeProblem problem = TestDisks.problem(disk, Parity.MIRROR, 0.0, 1e-8);
    Equilibrium equilibrium = problem.equilibrium();
    BranchSolver solver = new BranchSolver(problem);
    ShootingReference shooting = new ShootingReference(equilibrium, disk.gasClosure(), INSTANT, Parity.MIRROR);
    double slow = 1e-7 * equilibrium.dispersion() / equilibrium.scaleHeight();
    for (int order = 0; order < 6; order++) {
      Peak peak = solver.fastest(order, 0.0, Double.POSITIVE_INFINITY, 0.0).orElseThrow();
      int shot = shooting.fasterThan(slow, peak.wavenumber(), 0.0);
      assertThat(shot).isGreaterThan(100);
      assertThat(peak.unstableModes()).isEqualTo(shot);
    }
  }

  /** A branch that still rises where it ends has no peak: nothing may be extrapolated beyond its last mode. */
  @Test
  void aBranchThatEndsInTheContinuumIsNotExtrapolated() {
    Disk disk = new Disk(new Gas.Isothermal(5.5078e5, OptionalDouble.of(2.34e-24), OptionalDouble.empty()),
        new GasClosure(1.8035), new MagneticField.ConstantRatio(44.55), CosmicRays.none(),
        List.of(new IsothermalSheetGravity(6.532e-3, 8.564e5)), Domain.aboutMidplane(Optional.empty(), TopBoundary.OPEN));
    BranchSolver solver = new BranchSolver(TestDisks.problem(disk, Parity.FLEXING, 0.0, 1e-8));
    double halo = solver.haloPeak(0.0, Double.POSITIVE_INFINITY).orElseThrow().growthRate();
    Peak peak = solver.fastest(0, 0.0, Double.POSITIVE_INFINITY, halo).orElseThrow();
    assertThat(peak.wavelengthError()).isNaN();
    GrowthPoint mode = solver.growth(peak.wavenumber(), 0).orElseThrow();
    // 1e-8: the tolerance; an extrapolated peak was 45 per cent above the mode at its wavenumber or above no mode at all
    assertThat(Math.abs(peak.growthRate() / mode.growthRate() - 1.0)).isLessThan(1e-8);
  }
}
