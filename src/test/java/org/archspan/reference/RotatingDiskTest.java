package org.archspan.reference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.archspan.boundary.Parity;
import org.archspan.closure.CosmicRayClosure;
import org.archspan.closure.GasClosure;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.EquilibriumBuilder;
import org.archspan.stability.ModeProblem;
import org.archspan.stability.RotatingCount;
import org.archspan.stability.RotatingMode;
import org.archspan.stability.RotatingSolver;
import org.archspan.stability.TestDisks;
import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.RepetitionInfo;

/** Rotating disks in every gravity law against the dense quadratic eigenproblem, linearised, by LAPACK. */
class RotatingDiskTest {
  private static final int POINTS = 42;

  /** All modes that grow faster than a tenth of the bound, and no more. */
  @RepeatedTest(14)
  void allModesAgreeWithTheDenseProblem(RepetitionInfo repetition) {
    Random random = new Random(repetition.getCurrentRepetition());
    boolean leaks = random.nextInt(3) == 0;
    CosmicRayClosure cosmicRays = new CosmicRayClosure(4.0 / 3.0, leaks ? 1e27 * Math.pow(10.0, random.nextDouble())
        : random.nextBoolean() ? 0.0 : Double.POSITIVE_INFINITY);
    GasClosure gas = new GasClosure(0.95 + 0.1 * random.nextDouble());
    Equilibrium equilibrium = EquilibriumBuilder.build(TestDisks.isothermal(TestDisks.law(random.nextInt(7)),
        0.5 + random.nextDouble(), random.nextDouble(), gas.adiabaticIndex(), cosmicRays, 3.0), 1e-8);
    Parity parity = random.nextBoolean() ? Parity.MIRROR : Parity.FLEXING;
    double kx = (0.2 + 0.6 * random.nextDouble()) / equilibrium.scaleHeight();
    double ky = random.nextBoolean() ? 0.0 : random.nextDouble() / equilibrium.scaleHeight();
    double angularSpeed = 0.6 * random.nextDouble() * equilibrium.dispersion() / equilibrium.scaleHeight();
    RotatingCount count = new RotatingSolver(new ModeProblem(equilibrium, gas, cosmicRays, parity, ky, 1e-9),
        angularSpeed).modes(kx);
    double slowest = 2.0 * count.edge();
    double[][] expected = new DenseReference(equilibrium, gas, cosmicRays, parity, POINTS)
        .rotatingGrowth(kx, ky, angularSpeed, count.radius() > 0.0 ? slowest : 1e-2 * equilibrium.dispersion()
            / equilibrium.scaleHeight());
    RotatingMode[] found = count.modes().stream().filter(mode -> mode.growthRate() > slowest)
        .toArray(RotatingMode[]::new);
    assertThat(found).hasSameSizeAs(expected);
    for (int i = 0; i < found.length; i++) {
      // 1e-5 of the bound: Chebyshev points over three scale heights (thirty miss the highest order by a thousandth of
      // itself), and eigenvalues of a matrix that is not symmetric
      assertThat(found[i].growthRate()).isCloseTo(expected[i][0], within(1e-5 * count.radius()));
      assertThat(found[i].frequency()).isCloseTo(expected[i][1], within(1e-5 * count.radius()));
    }
  }
}
