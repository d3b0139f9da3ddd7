package org.archspan.shear;

import java.util.Random;

/**
 * The motion at the start, with nothing displaced yet, that gains the most kinetic energy by the end: power iteration with
 * the wave and its exact adjoint (Farrell and Ioannou 1996, J. Atmos. Sci. 53, 2025), from a fixed random motion.
 */
final class BestKick {
  private static final int TERMS = 8;
  private static final long SEED = 1;

  private final WindingWave winding;
  private final double start;
  private final double step;
  private final int steps;
  private WaveState kick;
  private double gain;
  private boolean wellPosed = true;

  /** A window of time in units of the column, from a ky on. */
  BestKick(WindingWave winding, double start, double step, int steps) {
    this.winding = winding;
    this.start = start;
    this.step = step;
    this.steps = steps;
    kick = noise();
  }

  /** Energy at the end over energy at the start of the latest kick. */
  double gain() {
    return gain;
  }

  /** The velocity at the start, as a wave at rest elsewhere. */
  WaveState kick() {
    return kick;
  }

  /** Whether all steps so far were short enough. */
  boolean wellPosed() {
    return wellPosed;
  }

  /**
   * Improves the kick until its gain stands still, relative to one, or so many times.
   *
   * @param tolerance dimensionless
   */
  void improve(double tolerance, int most) {
    for (int round = 0; round < most; round++) {
      double before = gain;
      improve();
      if (Math.abs(gain - before) <= tolerance * gain) {
        return;
      }
    }
  }

  private void improve() {
    double energy = winding.kineticEnergy(kick);
    WaveState wave = copy(kick.xVelocity, kick.yVelocity, kick.zVelocity, 1.0);
    wellPosed &= winding.run(wave, start, step, steps, (at, ky, state) -> { });
    double reached = winding.kineticEnergy(wave);
    gain = reached / energy;
    double scale = 1.0 / Math.sqrt(reached);
    WaveState adjoint = Kick.asAdjoint(copy(wave.xVelocity, wave.yVelocity, wave.zVelocity, scale), winding);
    winding.runBack(adjoint, start + winding.flow().shear() * winding.column().kx * step * steps, step, steps);
    kick = copy(adjoint.x, adjoint.y, adjoint.z, 1.0);
    kick = copy(kick.xVelocity, kick.yVelocity, kick.zVelocity, 1.0 / Math.sqrt(2.0 * winding.kineticEnergy(kick)));
  }

  private WaveState copy(double[] x, double[] y, double[] z, double scale) {
    WaveState wave = winding.rest();
    for (int i = 0; i < x.length; i++) {
      wave.xVelocity[i] = scale * x[i];
      wave.yVelocity[i] = scale * y[i];
      wave.zVelocity[i] = scale * z[i];
    }
    return wave;
  }

  /** A motion of the lowest vertical orders that obeys the ends. */
  private WaveState noise() {
    Random random = new Random(SEED);
    WaveState wave = winding.rest();
    double[] height = winding.column().mesh.nodes();
    double bottom = height[0];
    double depth = height[height.length - 1] - bottom;
    for (int term = 0; term < TERMS; term++) {
      double along = random.nextGaussian();
      double across = random.nextGaussian();
      double up = random.nextGaussian();
      for (int i = 0; i < height.length; i++) {
        double phase = term * Math.PI * (height[i] - bottom) / depth;
        double free = (term + 0.5) * Math.PI * (height[i] - bottom) / depth;
        wave.xVelocity[i] += along * Math.cos(phase);
        wave.yVelocity[i] += across * Math.cos(phase);
        wave.zVelocity[i] += up * upward(phase, free);
      }
    }
    return wave;
  }

  private double upward(double phase, double free) {
    ShearingColumn column = winding.column();
    if (column.bottomFixed) {
      return column.topFixed ? Math.sin(phase) : Math.sin(free);
    }
    return column.topFixed ? Math.cos(free) : Math.cos(phase);
  }
}
