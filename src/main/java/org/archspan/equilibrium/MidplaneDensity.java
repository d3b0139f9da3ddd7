package org.archspan.equilibrium;

import java.util.Locale;
import java.util.function.DoubleFunction;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.archspan.disk.RefusedModelException;

/** The density at the lower end that belongs to a surface density. */
final class MidplaneDensity {
  private static final int MOST_EVALUATIONS = 200;

  private MidplaneDensity() {
  }

  /**
   * Solves for the density.
   *
   * @param surfaceDensity    total column, g cm^-2
   * @param state             stratification for a density at the lower end, g cm^-3
   * @param bottom            lower end, cm
   * @param aboutMidplane     whether both sides count
   * @param dispersionSquared of the gas, cm^2 s^-2
   * @param startingDensity   a first guess, g cm^-3
   * @return density, g cm^-3
   * @throws RefusedModelException when field and cosmic rays alone hold up more than that column
   */
  static double forSurfaceDensity(double surfaceDensity, DoubleFunction<? extends Stratification> state,
      double bottom, boolean aboutMidplane, double dispersionSquared, double startingDensity) {
    double sides = aboutMidplane ? 2.0 : 1.0;
    UnivariateFunction excess = logDensity -> Math.log(
        sides * state.apply(Math.exp(logDensity)).columnAbove(bottom) / surfaceDensity);
    double start = Math.log(startingDensity);
    double high = start;
    for (int step = 0; excess.value(high) < 0.0 && step < MOST_EVALUATIONS; step++) {
      high += 1.0;
    }
    double low = high - 1.0;
    while (excess.value(low) > 0.0) {
      low -= 2.0;
      if (low < start - 40.0) {
        throw new RefusedModelException(String.format(Locale.ROOT, "no state has the surface density %.4g g/cm^2 (%s):"
            + " field and cosmic rays of the given strength alone hold up more; raise gas.surface-density, lower"
            + " field.strength or cosmic-rays.pressure, or give their ratios", surfaceDensity,
            "gas.dispersion " + String.format(Locale.ROOT, "%.4g km/s", Math.sqrt(dispersionSquared) / 1e5)));
      }
    }
    double solved = new BrentSolver(1e-15, 1e-14, 1e-15).solve(MOST_EVALUATIONS, excess, low, high);
    return Math.exp(solved);
  }
}
