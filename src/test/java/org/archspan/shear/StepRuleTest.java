package org.archspan.shear;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.archspan.closure.CosmicRayClosure;
import org.archspan.reference.UniformAtmosphere;
import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.RepetitionInfo;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

/** What the rule of stepping promises: its order, its invariant, and relaxing pressures with their growth rates. */
class StepRuleTest {
  private static final CosmicRayClosure PARKER = new CosmicRayClosure(4.0 / 3.0, Double.POSITIVE_INFINITY);
  private static final CosmicRayClosure DIFFUSING = new CosmicRayClosure(4.0 / 3.0, 3.0);

  /** Halving the step divides the error by two to the power of the order. */
  @ParameterizedTest
  @EnumSource(Composition.class)
  void errorFallsWithTheOrder(Composition composition) {
    int steps = composition == Composition.MIDPOINT ? 400 : 40;
    double coarse = energy(composition, steps);
    double middle = energy(composition, 2 * steps);
    double fine = energy(composition, 4 * steps);
    // a quarter of an order: the next term of the error is not yet nothing at these steps
    assertThat(Math.log((coarse - middle) / (middle - fine)) / Math.log(2.0)).isCloseTo(composition.order(), within(0.25));
  }

  private static double energy(Composition composition, int steps) {
    WindingWave wave = RigidGrowthTest.wave(PARKER, 0.5, 0.5, -0.4, composition);
    WaveState state = RigidGrowthTest.kick(wave, 3, 1);
    wave.run(state, 2.0, 8.0 / steps, steps, (step, ky, now) -> { });
    return Math.log(wave.kineticEnergy(state));
  }

  /**
   * The product of a wave with an adjoint one is kept to rounding at any step, shear and relaxation included: what stands
   * at the end against a velocity stands at the start against the velocity of the kick.
   */
  @RepeatedTest(8)
  void adjointIsExactAtAnyStep(RepetitionInfo repetition) {
    int seed = repetition.getCurrentRepetition();
    boolean relaxing = seed % 2 == 0;
    WindingWave wave = RigidGrowthTest.wave(relaxing ? DIFFUSING : PARKER, 0.3 + 0.1 * seed, 0.6, -0.1 * seed,
        relaxing ? Composition.MIDPOINT : Composition.SIXTH_ORDER);
    double start = 3.0;
    double step = 0.3;
    int steps = 20;
    WaveState kick = RigidGrowthTest.kick(wave, 4, seed);
    WaveState forward = RigidGrowthTest.kick(wave, 4, seed);
    wave.run(forward, start, step, steps, (at, ky, state) -> { });
    WaveState target = RigidGrowthTest.kick(wave, 4, 100 + seed);
    WaveState back = Kick.asAdjoint(target, wave);
    wave.runBack(back, start + wave.flow().shear() * wave.column().kx * step * steps, step, steps);
    double atEnd = Kick.product(wave.column(), target.xVelocity, target.yVelocity, target.zVelocity, forward);
    double atStart = Kick.product(wave.column(), back.x, back.y, back.z, kick);
    // 1e-10: rounding of some hundred factorisations
    assertThat(atStart).isCloseTo(atEnd, within(1e-10 * Math.abs(atEnd)));
  }

  /** kx, ky, diffusivity in c H: growth of diffusing cosmic rays against the closed form (Parker 1966, with kappa). */
  @ParameterizedTest
  @CsvSource({"0.5, 0, 0.3", "0.5, 0, 3", "0.4, 0, 30", "0.5, 1, 300"})
  void diffusingCosmicRaysGrowAsTheirClosedForm(double kx, double ky, double diffusivity) {
    WindingWave wave = RigidGrowthTest.wave(new CosmicRayClosure(4.0 / 3.0, diffusivity), kx, 0.0, 0.0,
        Composition.MIDPOINT);
    double[] energy = new double[5001];
    wave.run(RigidGrowthTest.lift(wave), ky * wave.column().length, 0.01, 5000,
        (step, now, state) -> energy[step] = wave.kineticEnergy(state));
    double growth = 0.5 * Math.log(energy[5000] / energy[4000]) / (10.0 * wave.column().time);
    double exact = new UniformAtmosphere(1.0, 1.0, 1.0, 4.0 / 3.0, diffusivity).growthRate(kx, ky, 10.0, 1);
    // 2e-5: the midpoint rule grows by s (s h)^2/12 too fast
    assertThat(growth).isCloseTo(exact, within(2e-5));
  }
}
