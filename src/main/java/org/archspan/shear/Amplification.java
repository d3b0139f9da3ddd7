package org.archspan.shear;

import java.util.List;
import org.archspan.boundary.Parity;

/**
 * A wave wound up by differential rotation, from the motion at the start that gains the most kinetic energy by the end.
 *
 * @param parity          symmetry about the midplane
 * @param wavenumber      along the field, which is the azimuth, cm^-1
 * @param shear           dOmega/dlnR, s^-1
 * @param time            since the start, s
 * @param winding         radial over azimuthal wavenumber at each time, dimensionless; positive: trailing
 * @param amplification   root of the kinetic energy over that at the start, dimensionless
 * @param densityContrast root mean square by mass of the density perturbation over the density, for a motion at the start
 *                        whose root mean square by mass is the isothermal speed at the lower end, dimensionless
 * @param error           relative, of the amplification at the end, dimensionless: halved steps and halved elements
 * @param starts          what other windings at the start would have gained
 * @param rigidGrowth     growth rate of the fastest mode of this parity without shear at zero radial wavenumber, s^-1; 0
 *                        where none grows, NaN where it oscillates
 * @param staticGrowth    the same without rotation, s^-1
 * @param limitGrowth     what infinitely short radial waves grow at without rotation, s^-1: where a wave tends that is wound
 *                        up for ever
 * @param warnings        what limits the answer
 */
public record Amplification(Parity parity, double wavenumber, double shear, double[] time, double[] winding,
    double[] amplification, double[] densityContrast, double error, List<StartGain> starts, double rigidGrowth,
    double staticGrowth, double limitGrowth, List<String> warnings) {
  /** Index of the time of the greatest amplification. */
  public int peak() {
    int best = 0;
    for (int i = 0; i < time.length; i++) {
      best = amplification[i] > amplification[best] ? i : best;
    }
    return best;
  }

  /** E-foldings gained by the end, dimensionless. */
  public double eFoldings() {
    return Math.log(amplification[time.length - 1]);
  }

  /** Whether the wave still grows when the time ends. */
  public boolean growsAtTheEnd() {
    return peak() == time.length - 1;
  }

  /**
   * Time at which the density contrast first reaches one, where linear theory ends, s; NaN where it never does.
   *
   * @param initialMach root mean square by mass of the velocity at the start over the isothermal speed, dimensionless
   */
  public double timeToUnitContrast(double initialMach) {
    for (int i = 0; i < time.length; i++) {
      if (initialMach * densityContrast[i] >= 1.0) {
        return time[i];
      }
    }
    return Double.NaN;
  }

  /** Span of time that is followed, s. */
  public double duration() {
    return time[time.length - 1];
  }

  /** Growth rate of the amplitude over the last tenth of the time, s^-1. */
  public double lateGrowth() {
    int last = time.length - 1;
    int before = last - Math.max(1, last / 10);
    return Math.log(amplification[last] / amplification[before]) / (time[last] - time[before]);
  }
}
