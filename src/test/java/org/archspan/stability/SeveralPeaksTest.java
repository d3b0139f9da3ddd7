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
import org.archspan.disk.GasComponent;
import org.archspan.disk.Height;
import org.archspan.disk.MagneticField;
import org.archspan.gravity.LinearGravity;
import org.junit.jupiter.api.Test;

/** Growth curves with more than one hill: the faster one is found, whichever is met first. */
class SeveralPeaksTest {
  private static final int SCAN = 80;

  /** A step of the climb passes the higher hill and lands on the rising side of the lower one. */
  @Test
  void aClimbDoesNotStepOverItsHill() {
    Gas gas = new Gas.Components(List.of(new GasComponent("thin", 15.166e5, 4.5e-28),
        new GasComponent("hot", 33.323e5, 1.9685e-28), new GasComponent("cold", 8.2468e5, 3.8948e-26)));
    CosmicRayClosure slow = new CosmicRayClosure(4.0 / 3.0, 6.3835e27);
    Disk disk = new Disk(gas, new GasClosure(1.0), new MagneticField.ConstantRatio(0.050283),
        new CosmicRays.PressureRatio(2.686, slow), List.of(new LinearGravity(7.1617e-30)),
        Domain.aboutMidplane(Optional.of(Height.scaleHeights(4.2424)), TopBoundary.LID));
    requirePeakAboveScan(new ModeSolver(TestDisks.problem(disk, Parity.MIRROR, 0.0, 1e-8)), 5);
  }

  /** The proof stops where the branch rises through the bound: what lies beyond is a violation, not a failure. */
  @Test
  void aHillBeyondTheProofIsClimbed() {
    CosmicRayClosure slow = new CosmicRayClosure(4.0 / 3.0, 1.340198537074938E25);
    Disk disk = new Disk(new Gas.Isothermal(325874.5386756158, OptionalDouble.of(2.34e-24), OptionalDouble.empty()),
        new GasClosure(1.0), new MagneticField.ConstantRatio(25.446690137951002),
        new CosmicRays.PressureRatio(2.897797403249724, slow), List.of(new LinearGravity(1.51963400473474E-31)),
        Domain.aboutMidplane(Optional.of(Height.scaleHeights(3.5734012743130608)), TopBoundary.FREE));
    requirePeakAboveScan(new ModeSolver(TestDisks.problem(disk, Parity.FLEXING, 0.0, 1e-8)), 5);
  }

  private static void requirePeakAboveScan(ModeSolver solver, int order) {
    double peak = FastestMode.find(solver, order, 0.0, Double.POSITIVE_INFINITY, 0.0).root().orElseThrow().growth();
    double marginal = solver.marginalWavenumber(order);
    double fastest = 0.0;
    for (int i = 1; i < SCAN; i++) {
      fastest = Math.max(fastest, solver.growth(marginal * i / SCAN, order, Double.NaN).map(GrowthRoot::growth)
          .orElse(0.0));
    }
    // 1e-2: the gap that the proof leaves above branches of higher order; 5e-2: the scan passes beside the peak
    assertThat(peak).isBetween(fastest * (1.0 - 1e-2), fastest * (1.0 + 5e-2));
  }
}
