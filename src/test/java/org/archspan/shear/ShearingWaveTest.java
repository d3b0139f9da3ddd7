package org.archspan.shear;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.archspan.closure.CosmicRayClosure;
import org.archspan.closure.GasClosure;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.mesh.Mesh;
import org.archspan.reference.UniformAtmosphere;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Shearing waves with closed forms. Isothermal gas without field that moves horizontally, the same at all heights, stays in
 * vertical balance: a sound wave of the plane, though the atmosphere is stratified.
 */
class ShearingWaveTest {
  /** Omega, dOmega/dlnR: k = 0 oscillates at the epicyclic frequency, kappa^2 = 4 Omega^2 + 2 Omega dOmega/dlnR. */
  @ParameterizedTest
  @CsvSource({"1, 0", "1, -1", "1, -1.5", "0.7, -0.2"})
  void withoutWavenumberTheGasIsEpicyclic(double angularSpeed, double shear) {
    WindingWave wave = wave(0.0, angularSpeed, shear);
    WaveState state = wave.rest();
    uniform(wave, state.yVelocity, 1.0);
    wave.run(state, 0.0, 0.05, 200, (step, ky, now) -> { });
    double kappa = Math.sqrt(4.0 * angularSpeed * angularSpeed + 2.0 * angularSpeed * shear);
    // 1e-8: order 6 at kappa h = 0.1
    assertThat(state.y[5]).isCloseTo(density(wave, 5) * Math.sin(10.0 * kappa) / kappa, within(1e-8));
    assertThat(state.x[5]).isCloseTo(
        density(wave, 5) * 2.0 * angularSpeed * (1.0 - Math.cos(10.0 * kappa)) / (kappa * kappa), within(1e-8));
  }

  /** The perturbation of vorticity over column density is kept (Goldreich and Lynden-Bell 1965, MNRAS 130, 125). */
  @Test
  void potentialVorticityIsKept() {
    WindingWave wave = wave(0.5, 1.0, -1.2);
    WaveState state = wave.rest();
    uniform(wave, state.yVelocity, 1.0);
    uniform(wave, state.xVelocity, -0.4);
    double[] vorticity = new double[401];
    wave.run(state, 4.0, 0.05, 400, (step, ky, now) -> vorticity[step] = vorticity(wave, ky, now));
    for (double now : vorticity) {
      // 1e-7: order 6 at c k h up to 0.4
      assertThat(now).isCloseTo(vorticity[0], within(1e-7 * Math.abs(vorticity[0])));
    }
    assertThat(vorticity[0]).isNotZero();
  }

  private static double vorticity(WindingWave wave, double ky, WaveState now) {
    double kx = wave.column().kx;
    DiskFlow flow = wave.flow();
    return kx * now.yVelocity[5] - ky * now.xVelocity[5] + flow.shear() * kx * now.x[5]
        + 2.0 * flow.angularSpeed() * (kx * now.x[5] + ky * now.y[5]);
  }

  /**
   * Wound up far enough, a sound wave without potential vorticity keeps its action, energy over frequency (Johnson and
   * Gammie 2005, ApJ 626, 978): its energy rises with the wavenumber.
   */
  @Test
  void soundWaveKeepsItsAction() {
    WindingWave wave = wave(0.5, 1.0, -1.5);
    double start = -10.0;
    double kx = wave.column().kx;
    WaveState state = wave.rest();
    uniform(wave, state.xVelocity, kx);
    uniform(wave, state.yVelocity, start);
    double[] energy = new double[1601];
    double[] action = new double[1601];
    wave.run(state, start, 0.02, 1600, (step, ky, now) -> {
      double divergence = kx * now.x[5] + ky * now.y[5];
      energy[step] = now.yVelocity[5] * now.yVelocity[5] + now.xVelocity[5] * now.xVelocity[5] + divergence * divergence;
      action[step] = energy[step] / Math.sqrt(kx * kx + ky * ky);
    });
    double early = mean(action, 100, 400);
    double late = mean(action, 1200, 1600);
    // 2 %: the frequency changes by 0.1 of itself in a radian, to the square
    assertThat(late / early).isCloseTo(1.0, within(0.02));
    assertThat(mean(energy, 1200, 1600) / mean(energy, 100, 400)).isGreaterThan(2.0);
  }

  private static double mean(double[] values, int from, int to) {
    return java.util.Arrays.stream(values, from, to).average().orElseThrow();
  }

  private static WindingWave wave(double kx, double angularSpeed, double shear) {
    Equilibrium equilibrium = new UniformAtmosphere(0.0, 0.0, 1.0, 4.0 / 3.0, 0.0).equilibrium(4.0);
    double h = equilibrium.scaleHeight();
    ShearingColumn column = new ShearingColumn(equilibrium, new GasClosure(1.0), CosmicRayClosure.instantDiffusion(),
        new Mesh(new double[] {0.0, 2.0 / h, 4.0 / h}, 10), kx / h, true);
    return new WindingWave(column, new DiskFlow(angularSpeed, shear), Composition.SIXTH_ORDER);
  }

  /** The root of the density at a node of an atmosphere of unit scale height. */
  private static double density(WindingWave wave, int node) {
    return Math.exp(-0.5 * wave.column().mesh.nodes()[node] * wave.column().length);
  }

  private static void uniform(WindingWave wave, double[] into, double value) {
    for (int i = 0; i < into.length; i++) {
      into[i] = value * density(wave, i);
    }
  }
}
