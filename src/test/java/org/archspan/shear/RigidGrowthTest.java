package org.archspan.shear;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.archspan.closure.CosmicRayClosure;
import org.archspan.closure.GasClosure;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.mesh.Mesh;
import org.archspan.reference.UniformAtmosphere;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Without shear the late growth is that of the fastest mode of a rigidly rotating atmosphere between walls. */
class RigidGrowthTest {
  static final int DEGREE = 10;

  /**
   * Omega, ky, s in units of c/H for alpha = beta = G = 1, L = 10, kx = 0.5: nine digits, from the closed form of the
   * condensed equation with constant coefficients, solved independently of this code.
   */
  @ParameterizedTest
  @CsvSource({"0, 0, 0.720201289", "0, 1, 0.789000737", "0.3, 0, 0.635136045", "0.3, 1, 0.710989814",
      "0.6, 0, 0.464876567", "0.6, 1, 0.539894680"})
  void lateGrowthIsTheEigenvalue(double angularSpeed, double ky, double expected) {
    WindingWave wave = wave(new CosmicRayClosure(4.0 / 3.0, Double.POSITIVE_INFINITY), 0.5, angularSpeed, 0.0,
        Composition.SIXTH_ORDER);
    double[] energy = new double[1501];
    boolean wellPosed = wave.run(lift(wave), ky * wave.column().length, 0.2, 1500,
        (step, now, state) -> energy[step] = wave.kineticEnergy(state));
    assertThat(wellPosed).isTrue();
    // 1e-7: steps of 0.2 at order 6; the fastest mode has outgrown the next one by then
    assertThat(0.5 * Math.log(energy[1500] / energy[1400]) / (100 * 0.2 * wave.column().time))
        .isCloseTo(expected, within(1e-7));
  }

  /** Units of this method: c = H = 1. */
  static WindingWave wave(CosmicRayClosure cosmicRays, double kx, double angularSpeed, double shear,
      Composition composition) {
    Equilibrium equilibrium = new UniformAtmosphere(1.0, 1.0, 1.0, 4.0 / 3.0, 0.0).equilibrium(10.0);
    double h = equilibrium.scaleHeight();
    double[] edges = new double[6];
    for (int i = 0; i < edges.length; i++) {
      edges[i] = equilibrium.bottom() / h + i * (equilibrium.top() - equilibrium.bottom()) / h / 5.0;
    }
    ShearingColumn column = new ShearingColumn(equilibrium, new GasClosure(1.0), cosmicRays, new Mesh(edges, DEGREE), kx,
        true);
    return new WindingWave(column, new DiskFlow(angularSpeed * column.time, shear * column.time), composition);
  }

  /** An upward velocity of vertical order 1, an exact part of the mode of that order. */
  static WaveState lift(WindingWave wave) {
    WaveState state = wave.rest();
    double[] height = wave.column().mesh.nodes();
    for (int i = 0; i < height.length; i++) {
      state.zVelocity[i] = Math.sin(Math.PI * (height[i] - height[0]) / (height[height.length - 1] - height[0]));
    }
    return state;
  }

  /** A random velocity of the lowest vertical orders. */
  static WaveState kick(WindingWave wave, int orders, long seed) {
    Random random = new Random(seed);
    WaveState state = wave.rest();
    double[] height = wave.column().mesh.nodes();
    for (int term = 1; term <= orders; term++) {
      double across = random.nextGaussian();
      double along = random.nextGaussian();
      double up = random.nextGaussian();
      for (int i = 0; i < height.length; i++) {
        double phase = term * Math.PI * (height[i] - height[0]) / (height[height.length - 1] - height[0]);
        state.xVelocity[i] += along * Math.sin(phase);
        state.yVelocity[i] += across * Math.sin(phase);
        state.zVelocity[i] += up * Math.sin(phase);
      }
    }
    return state;
  }
}
