package org.archspan.reference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Random;
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
import org.archspan.disk.SelfGravity;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.EquilibriumBuilder;
import org.archspan.gravity.GravityLaw;
import org.archspan.stability.BranchSolver;
import org.archspan.stability.GrowthPoint;
import org.archspan.stability.ModeProblem;
import org.archspan.stability.TestDisks;
import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.RepetitionInfo;

/** Self-gravitating disks, magnetized and with an external gravity, against LAPACK. */
class GravitatingReferenceTest {
  private static final int POINTS = 44;
  /** Modes with fewer zeros than this are resolved well by so many points. */
  private static final int RESOLVED = 9;
  /** Below this share of the fastest growth the dense eigenvalues, of s^2, lose half of their digits. */
  private static final double SLOW = 0.05;
  private static final double CLEAR = 0.2;

  private static Disk disk(Random random) {
    double density = Math.pow(10.0, -25.0 + 2.5 * random.nextDouble());
    List<GravityLaw> gravity = random.nextInt(3) == 0 ? List.of() : List.of(TestDisks.law(random.nextInt(7)));
    TopBoundary boundary = random.nextBoolean() ? TopBoundary.LID : TopBoundary.FREE;
    return new Disk(new Gas.Isothermal(6.4e5, OptionalDouble.of(density), OptionalDouble.empty()),
        new GasClosure(0.9 + 0.5 * random.nextDouble()), SelfGravity.FULL,
        new MagneticField.ConstantRatio(random.nextInt(4) == 0 ? 0.02 : 2.0 * random.nextDouble()),
        new CosmicRays.PressureRatio(random.nextDouble(), CosmicRayClosure.instantDiffusion()), gravity,
        Optional.empty(), Domain.aboutMidplane(Optional.of(Height.scaleHeights(2.0 + 2.0 * random.nextDouble())),
            boundary));
  }

  /** Every growing mode of random disks at a random wave: growth rates, and no mode more or less. */
  @RepeatedTest(40)
  void allModesAgreeWithTheDenseProblem(RepetitionInfo repetition) {
    Random random = new Random(repetition.getCurrentRepetition());
    Disk disk = disk(random);
    Equilibrium equilibrium = EquilibriumBuilder.build(disk, 1e-9);
    Parity parity = random.nextBoolean() ? Parity.MIRROR : Parity.FLEXING;
    double kx = (0.05 + 1.2 * random.nextDouble()) / equilibrium.scaleHeight();
    double ky = random.nextBoolean() ? 0.0 : 2.0 * random.nextDouble() / equilibrium.scaleHeight();
    BranchSolver solver = new BranchSolver(ModeProblem.of(disk, equilibrium, parity, ky, 1e-10));
    double[] expected =
        new GravitatingReference(equilibrium, disk.gasClosure(), parity, POINTS).growthRates(kx, ky);
    double unit = equilibrium.dispersion() / equilibrium.scaleHeight();
    for (int order = 0; order < Math.min(RESOLVED, expected.length) && expected[order] > SLOW * unit; order++) {
      GrowthPoint found = solver.growth(kx, order).orElseThrow();
      // 1e-7: collocation on 44 points over a few scale heights resolves the lower modes to about 1e-9 in s^2
      assertThat(found.growthRate()).as("order " + order).isCloseTo(expected[order],
          within(1e-7 * Math.max(expected[order], unit)));
    }
    if (expected.length > RESOLVED && expected[RESOLVED] > SLOW * unit) {
      return;
    }
    int slow = (int) java.util.Arrays.stream(expected).filter(s -> s > SLOW * unit).count();
    assertThat(solver.growth(kx, slow).filter(point -> point.growthRate() > (1.0 + 1e-6) * SLOW * unit)).isEmpty();
  }

  /** The same in a field that turns by up to some five radians over the domain, waves of any direction, heavy gas or light. */
  @RepeatedTest(24)
  void aTurningFieldAgreesToo(RepetitionInfo repetition) {
    Random random = new Random(1000 + repetition.getCurrentRepetition());
    Disk straight = disk(random);
    Equilibrium equilibrium = EquilibriumBuilder.build(straight, 1e-9);
    double rate = 1.5 * random.nextDouble() / equilibrium.scaleHeight();
    Disk disk = new Disk(straight.gas(), straight.gasClosure(), straight.selfGravity(), straight.field(), rate,
        straight.cosmicRays(), straight.gravity(), Optional.empty(), straight.domain());
    Parity parity = random.nextBoolean() ? Parity.MIRROR : Parity.FLEXING;
    double k = (0.05 + 1.5 * random.nextDouble()) / equilibrium.scaleHeight();
    double direction = Math.PI * (random.nextDouble() - 0.5);
    BranchSolver solver = new BranchSolver(ModeProblem.turning(disk, equilibrium, parity, direction, 1e-10));
    double[] expected = new GravitatingReference(equilibrium, disk.gasClosure(), parity, 64)
        .growthRates(k, direction, rate);
    double unit = equilibrium.dispersion() / equilibrium.scaleHeight();
    for (int order = 0; order < Math.min(2, expected.length) && expected[order] > CLEAR * unit; order++) {
      // 3e-6: slow and higher modes vary fast near the height where the wave runs across the field; the dense problem
      // needs twice the points for each, and is compared where 64 suffice (with 90 the others agreed as well)
      assertThat(solver.growth(k, order).orElseThrow().growthRate()).as("order " + order)
          .isCloseTo(expected[order], within(3e-6 * Math.max(expected[order], unit)));
    }
    if (expected.length < 2 || expected[1] < CLEAR * unit) {
      int slow = (int) java.util.Arrays.stream(expected).filter(s -> s > CLEAR * unit).count();
      assertThat(solver.growth(k, slow).filter(point -> point.growthRate() > (1.0 + 1e-6) * CLEAR * unit)).isEmpty();
    }
  }
}
