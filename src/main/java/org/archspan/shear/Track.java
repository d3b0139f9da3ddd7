package org.archspan.shear;

/** A wave followed from a motion at the start, in units of its column. */
final class Track {
  /** Enough for a curve and for the time of a peak; the steps themselves may be thousands. */
  private static final int MOST_SAMPLES = 400;

  private final WindingWave winding;
  private final double step;
  private final double start;
  private final boolean wellPosed;
  private final double[] energy;
  private final double[] contrast;

  /**
   * Follows a wave through so many steps.
   *
   * @param start ky at the first moment
   * @param step  length of a step
   * @param kick  the velocity at the start, as a wave at rest elsewhere; left alone
   */
  Track(WindingWave winding, double start, double step, int steps, WaveState kick) {
    this.winding = winding;
    this.start = start;
    this.step = step;
    energy = new double[steps + 1];
    contrast = new double[steps + 1];
    DensityContrast density = new DensityContrast(winding.column());
    wellPosed = winding.run(kick.copy(), start, step, steps, (at, ky, wave) -> {
      energy[at] = winding.kineticEnergy(wave);
      contrast[at] = density.halfSquare(wave, ky);
    });
  }

  /** Logarithm of the amplification of the velocity by the end. */
  double logGain() {
    return 0.5 * Math.log(energy[energy.length - 1] / energy[0]);
  }

  /** Whether every step was short enough to have a well-posed matrix. */
  boolean wellPosed() {
    return wellPosed;
  }

  WindingWave winding() {
    return winding;
  }

  /** The step of a sample: all of them, or an even choice that keeps both ends. */
  private int at(int sample) {
    return (int) Math.round((double) sample * (energy.length - 1) / (samples() - 1));
  }

  private int samples() {
    return Math.min(energy.length, MOST_SAMPLES + 1);
  }

  /** Times of the samples, s. */
  double[] times() {
    double[] times = new double[samples()];
    for (int i = 0; i < times.length; i++) {
      times[i] = at(i) * step * winding.column().time;
    }
    return times;
  }

  /** Radial over azimuthal wavenumber at the times, dimensionless. */
  double[] windings() {
    double kx = winding.column().kx;
    double[] windings = new double[samples()];
    for (int i = 0; i < windings.length; i++) {
      windings[i] = -start / kx - winding.flow().shear() * at(i) * step;
    }
    return windings;
  }

  /** Root of the kinetic energy over that at the start, dimensionless. */
  double[] amplification() {
    return roots(energy);
  }

  /** Density contrast for a start at the isothermal speed, dimensionless. */
  double[] densityContrast() {
    return roots(contrast);
  }

  private double[] roots(double[] halfSquares) {
    double[] roots = new double[samples()];
    for (int i = 0; i < roots.length; i++) {
      roots[i] = Math.sqrt(halfSquares[at(i)] / energy[0]);
    }
    return roots;
  }
}
