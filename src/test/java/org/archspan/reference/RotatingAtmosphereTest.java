package org.archspan.reference;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.apache.commons.math3.complex.Complex;
import org.archspan.boundary.Parity;
import org.archspan.closure.CosmicRayClosure;
import org.archspan.closure.GasClosure;
import org.archspan.stability.BranchSolver;
import org.archspan.stability.ModeProblem;
import org.archspan.stability.RotatingCount;
import org.archspan.stability.RotatingMode;
import org.archspan.stability.RotatingSolver;
import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.RepetitionInfo;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Rotation in a uniform atmosphere between rigid walls: every growing mode against the exact polynomial. */
class RotatingAtmosphereTest {
  private static RotatingSolver solver(UniformAtmosphere atmosphere, double wallDistance, double ky, double angularSpeed) {
    return new RotatingSolver(new ModeProblem(atmosphere.equilibrium(wallDistance), new GasClosure(atmosphere.gasIndex()),
        new CosmicRayClosure(atmosphere.cosmicRayIndex(), atmosphere.diffusivity()), Parity.FLOOR, ky, 1e-10),
        angularSpeed);
  }

  /** alpha = beta = G = 1, L = 10, kx = 0.5: nine digits made independently in two ways. */
  @ParameterizedTest
  @CsvSource({"0.3, 0, 0.635136045", "0.3, 1, 0.710989814", "0.6, 0, 0.464876567", "0.6, 1, 0.539894680"})
  void theKnownValuesAreMet(double angularSpeed, double ky, double growth) {
    UniformAtmosphere atmosphere = new UniformAtmosphere(1.0, 1.0, 1.0, 4.0 / 3.0, Double.POSITIVE_INFINITY);
    RotatingCount count = solver(atmosphere, 10.0, ky, angularSpeed).modes(0.5);
    // half a unit of the last digit, and a little for rounding
    assertThat(count.modes().get(0).growthRate()).isCloseTo(growth, within(6e-10));
  }

  /** Random atmospheres, waves and rotation rates: all modes faster than the edge, to 1e-9, and no more and no fewer. */
  @RepeatedTest(40)
  void everyModeIsFoundAndCounted(RepetitionInfo repetition) {
    Random random = new Random(repetition.getCurrentRepetition());
    double diffusivity = random.nextBoolean() ? 0.0 : Double.POSITIVE_INFINITY;
    UniformAtmosphere atmosphere = new UniformAtmosphere(0.3 + 2.0 * random.nextDouble(), random.nextDouble(),
        0.9 + 0.2 * random.nextDouble(), 0.3, diffusivity);
    double wallDistance = 4.0 + 6.0 * random.nextDouble();
    double ky = random.nextBoolean() ? 0.0 : 2.0 * random.nextDouble();
    double kx = 0.1 + 0.5 * random.nextDouble();
    double angularSpeed = 0.8 * random.nextDouble();
    RotatingCount count = solver(atmosphere, wallDistance, ky, angularSpeed).modes(kx);
    double stiffness = atmosphere.gasIndex() + (diffusivity == 0.0 ? 0.3 * atmosphere.beta() : 0.0);
    RotatingAtmosphere exact = new RotatingAtmosphere(atmosphere.alpha(), atmosphere.beta(), stiffness, angularSpeed);
    int expected = 0;
    for (int n = 1; n <= 60 && count.radius() > 0.0; n++) {
      expected += exact.count(kx, ky, n * Math.PI / wallDistance, count.edge(), count.radius());
    }
    assertThat(count.number()).isEqualTo(expected);
    assertThat(count.modes().stream().mapToInt(mode -> mode.frequency() > 0.0 ? 2 : 1).sum()).isEqualTo(expected);
    for (RotatingMode mode : count.modes()) {
      Complex root = new Complex(mode.growthRate(), mode.frequency());
      // 1e-7 in the number of half-waves: near a double root it moves as the square root of s, which is good to 1e-9 or better
      assertThat(exact.mismatch(root, kx, ky, wallDistance)).isLessThan(1e-7);
    }
  }

  /** Without rotation the modes are those of the symmetric solver. */
  @RepeatedTest(6)
  void slowRotationMeetsTheSymmetricSolver(RepetitionInfo repetition) {
    Random random = new Random(repetition.getCurrentRepetition());
    UniformAtmosphere atmosphere = new UniformAtmosphere(0.5 + random.nextDouble(), 1.0, 1.0, 1.0,
        0.3 + random.nextDouble());
    double ky = random.nextDouble();
    RotatingSolver rotating = solver(atmosphere, 8.0, ky, 0.0);
    BranchSolver still = new BranchSolver(rotating.problem());
    RotatingCount count = rotating.modes(0.3);
    for (int order = 0; order < count.modes().size(); order++) {
      assertThat(count.modes().get(order).frequency()).isZero();
      double expected = still.growth(0.3, order).orElseThrow().growthRate();
      assertThat(count.modes().get(order).growthRate()).isCloseTo(expected, within(3e-10 * (1.0 + expected)));
    }
  }
}
