package org.archspan.stability;

import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The fastest mode of one branch over a range of wavenumbers, with its proof. Works in {@link Scales}.
 *
 * @param root            the peak, on the checking mesh; empty when the branch grows nowhere, or nowhere faster than the
 *                        continuum
 * @param wavelengthError estimated relative error of its wavelength; NaN where the branch ends in the continuum
 * @param bound           growth rate that the branch exceeds nowhere in the range
 * @param intervals       intervals of wavenumber that the proof took
 */
record FastestMode(Optional<GrowthRoot> root, double wavelengthError, double bound, int intervals) {
  /** The proof leaves this relative gap above the peak of order 0; its cost rises as the logarithm of it. */
  private static final double GAP = 1e-6;
  /** The same where cosmic rays diffuse at a finite rate: they are taken as soft as at the short end of an interval. */
  private static final double DIFFUSING_GAP = 1e-4;
  /** For higher orders, whose interval bound is of first order, the cost rises as its inverse square root. */
  private static final double HIGHER_GAP = 1e-2;
  private static final double[] FIRST_TRIES = {0.5, 0.3, 0.7, 0.15, 0.85, 0.07, 0.03, 0.93, 0.015};
  private static final int MOST_CLIMBS = 30;

  /**
   * Finds it.
   *
   * @param order    0 for the fastest mode at each wavenumber
   * @param lowest   lowest wavenumber of the range, 0 or more
   * @param shortest highest; infinite for the marginal one
   * @param haloPeak greatest growth rate of the continuum above an open top, 0 where there is none
   * @throws UnsolvedException when a tolerance is missed
   */
  static FastestMode find(ModeSolver solver, int order, double lowest, double shortest, double haloPeak) {
    double end = Math.min(shortest, solver.marginalWavenumber(order));
    if (end <= lowest) {
      return new FastestMode(Optional.empty(), 0.0, 0.0, 0);
    }
    PeakSearch search = new PeakSearch(solver, order, lowest, end);
    WavenumberCover cover = new WavenumberCover(solver, order);
    Optional<GrowthRoot> peak = firstVisible(solver, order, lowest, end).map(search::climb);
    for (int climb = 0; climb < MOST_CLIMBS; climb++) {
      double known = Math.max(haloPeak, peak.map(GrowthRoot::growth).orElse(solver.slowest()));
      double bound = known * (1.0 + gap(solver, order));
      OptionalDouble better = cover.violation(bound, lowest, end);
      if (better.isEmpty()) {
        Optional<GrowthRoot> highest = known > haloPeak ? peak : highestHill(solver, order, lowest, end, search);
        return highest.isEmpty() ? new FastestMode(highest, 0.0, bound, cover.intervals())
            : polished(solver, order, highest.get(), bound, cover.intervals(), lowest, end);
      }
      peak = solver.growth(better.getAsDouble(), order, bound).map(search::climb);
    }
    throw new UnsolvedException("the growth curve of mode " + order + " has more than " + MOST_CLIMBS + " peaks");
  }

  private static double gap(ModeSolver solver, int order) {
    if (order > 0) {
      return HIGHER_GAP;
    }
    return solver.problem().cosmicRays().leaks() ? DIFFUSING_GAP : GAP;
  }

  private static Optional<GrowthRoot> firstVisible(ModeSolver solver, int order, double lowest, double end) {
    for (double share : FIRST_TRIES) {
      Optional<GrowthRoot> root = solver.growth(lowest + share * (end - lowest), order, Double.NaN);
      if (root.isPresent()) {
        return root;
      }
    }
    return Optional.empty();
  }

  /**
   * A branch that stays below the continuum's own peak is proved only to stay there; its highest hill is then sought from
   * every first try.
   */
  private static Optional<GrowthRoot> highestHill(ModeSolver solver, int order, double lowest, double end,
      PeakSearch search) {
    GrowthRoot highest = null;
    for (double share : FIRST_TRIES) {
      Optional<GrowthRoot> hill =
          solver.growth(lowest + share * (end - lowest), order, Double.NaN).map(search::climb);
      if (hill.isPresent() && (highest == null || hill.get().growth() > highest.growth())) {
        highest = hill.get();
      }
    }
    return Optional.ofNullable(highest);
  }

  /**
   * Refines the peak on the checking mesh; the shift it asks for is the error of the wavelength. A branch that still rises
   * where it ends in the continuum has no peak to refine, and the error is not known.
   */
  private static FastestMode polished(ModeSolver solver, int order, GrowthRoot peak, double bound, int intervals,
      double lowest, double end) {
    double k = peak.wavenumber();
    if (k <= lowest || k >= end) {
      return new FastestMode(Optional.of(peak), 0.0, bound, intervals);
    }
    double step = 1e-3 * k;
    Optional<GrowthRoot> beside = solver.growth(k - step, order, peak.growth())
        .or(() -> solver.growth(k + step, order, peak.growth()));
    GrowthRoot here = solver.growth(k, order, peak.growth()).orElse(peak);
    double workingSlope = solver.workingSlope();
    double curvature = beside.map(other -> (here.slope() - other.slope()) / (k - other.wavenumber())).orElse(0.0);
    double shift = -here.slope() / curvature;
    if (!(curvature < 0.0 && Math.abs(shift) <= step)) {
      return new FastestMode(Optional.of(here), Double.NaN, bound, intervals);
    }
    double error = Math.abs((workingSlope - here.slope()) / curvature) / k + Math.abs(shift) / k
        + here.error() * here.growth() / Math.abs(curvature * k * k);
    GrowthRoot polished = new GrowthRoot(k + shift, here.growth() + 0.5 * shift * here.slope(), 0.0, here.error());
    return new FastestMode(Optional.of(polished), error, bound, intervals);
  }
}
