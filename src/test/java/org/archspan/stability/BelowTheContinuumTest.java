package org.archspan.stability;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.archspan.boundary.Parity;
import org.archspan.boundary.TopBoundary;
import org.archspan.closure.CosmicRayClosure;
import org.archspan.closure.GasClosure;
import org.archspan.disk.CosmicRays;
import org.archspan.disk.Disk;
import org.archspan.disk.Domain;
import org.archspan.disk.Gas;
import org.archspan.disk.GasComponent;
import org.archspan.disk.Height;
import org.archspan.disk.MagneticField;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.EquilibriumBuilder;
import org.archspan.gravity.UniformGravity;
import org.archspan.spacing.Arm;
import org.archspan.spacing.BranchPeak;
import org.archspan.spacing.HeldBy;
import org.archspan.spacing.SearchOptions;
import org.archspan.spacing.SpacingStudy;
import org.archspan.units.Constants;
import org.junit.jupiter.api.Test;

/** Branches beside the continuum of an open top; both models were found by a search among random ones. */
class BelowTheContinuumTest {
  /** A branch of two hills, both below the continuum's peak: the higher one is reported. */
  @Test
  void theHigherOfTwoHillsBelowTheContinuum() {
    Gas gas = new Gas.Components(List.of(new GasComponent("", 3.28783e5, 1.1128e-26),
        new GasComponent("", 1.18154e6, 3.2421e-28), new GasComponent("", 1.08427e6, 4.1012e-28)));
    Equilibrium low = EquilibriumBuilder.build(disk(gas, 600.0 * Constants.PARSEC), 1e-8);
    Disk disk = disk(gas, low.bottom() + 24.676 * low.scaleHeight());
    Equilibrium equilibrium = EquilibriumBuilder.build(disk, 1e-8);
    assertThat(equilibrium.topBoundary()).isEqualTo(TopBoundary.OPEN);
    BranchSolver solver = new BranchSolver(new ModeProblem(equilibrium, disk.gasClosure(), disk.cosmicRays().closure(),
        Parity.FLOOR, 0.01835 / equilibrium.scaleHeight(), 1e-8));
    double halo = solver.haloPeak(0.0, Double.POSITIVE_INFINITY).map(GrowthPoint::growthRate).orElse(0.0);
    for (int order = 0; order < 3; order++) {
      Optional<Peak> peak = solver.fastest(order, 0.0, Double.POSITIVE_INFINITY, halo);
      double marginal = solver.marginalWavenumber(order);
      double best = 0.0;
      for (int i = 1; i < 60; i++) {
        best = Math.max(best, solver.growth(marginal * i / 60.0, order).map(GrowthPoint::growthRate).orElse(0.0));
      }
      // 1e-2: what the proof of higher orders leaves open
      assertThat(peak.map(Peak::growthRate).orElse(0.0)).as("order " + order).isGreaterThanOrEqualTo(best * 0.99);
    }
  }

  private static Disk disk(Gas gas, double top) {
    return new Disk(gas, new GasClosure(1.12746), new MagneticField.ConstantRatio(0.0064225),
        new CosmicRays.PressureRatio(2.64660, new CosmicRayClosure(4.0 / 3.0, 9.9577e26)),
        List.of(new UniformGravity(1.3075e-9)), new Domain(Optional.of(Height.centimetres(465.352 * Constants.PARSEC)),
            Optional.of(Height.centimetres(top)), Optional.empty()));
  }

  /** A branch that hugs the continuum has its centroid far above the gas and is not called held by the disk. */
  @Test
  void aBranchThatMergesIsHeldByTheHalo() {
    Disk disk = new Disk(new Gas.Isothermal(12.106e5, OptionalDouble.of(1e-24), OptionalDouble.empty()),
        new GasClosure(1.3105), new MagneticField.ConstantRatio(3.799),
        new CosmicRays.PressureRatio(4.711, CosmicRayClosure.instantDiffusion()), List.of(new UniformGravity(3.0757e-9)),
        new Domain(Optional.empty(), Optional.empty(), Optional.empty()));
    SearchOptions options = new SearchOptions(Optional.empty(), Set.of(Parity.MIRROR, Parity.FLEXING), Optional.empty(),
        Optional.empty(), Height.scaleHeights(2.0), 1e-8, 3);
    for (BranchPeak peak : new SpacingStudy(disk, options, Arm.unknown()).solve().branches()) {
      if (peak.centroidHeight() > 100.0 * 3.0857e20) {
        assertThat(peak.heldBy()).isNotEqualTo(HeldBy.DISK);
      }
    }
  }
}
