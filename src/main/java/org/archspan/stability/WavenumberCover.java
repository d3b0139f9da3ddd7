package org.archspan.stability;

import java.util.OptionalDouble;

/**
 * Proves that a branch stays below a growth rate at every wavenumber of a range, not only at scanned ones: the range is
 * cut into intervals until the interval count (see {@link CondensedForm}) is small enough on each.
 */
final class WavenumberCover {
  private static final int MOST_INTERVALS = 4000;
  private static final double NARROWEST = 1e-7;

  private final ModeSolver solver;
  private final int order;
  private int intervals;

  WavenumberCover(ModeSolver solver, int order) {
    this.solver = solver;
    this.order = order;
  }

  /** Number of intervals that the last proof took. */
  int intervals() {
    return intervals;
  }

  /**
   * Marches over the range with intervals as wide as the proof allows.
   *
   * @param bound   growth rate to be proved
   * @param lowest  0 or more
   * @param highest finite
   * @return a wavenumber at which the branch grows faster than the bound; empty when the proof holds
   * @throws UnsolvedException when neither is found with the allowed number of intervals
   */
  OptionalDouble violation(double bound, double lowest, double highest) {
    intervals = 0;
    double from = lowest;
    double width = 0.25 * (highest - lowest);
    while (from < highest) {
      double to = Math.min(from + width, highest);
      if (below(bound, from, to)) {
        intervals++;
        from = to;
        width *= 1.6;
        continue;
      }
      width = 0.5 * (to - from);
      double middle = from + width;
      if (width < 0.02 * highest && middle > 0.0 && solver.count(bound, middle, middle) > order) {
        return OptionalDouble.of(middle);
      }
      if (width < NARROWEST * highest || intervals > MOST_INTERVALS) {
        return ahead(bound, middle, width, highest);
      }
    }
    return OptionalDouble.empty();
  }

  /** Where the branch rises through the bound, ever narrower intervals end before it does: the violation lies beyond. */
  private OptionalDouble ahead(double bound, double from, double width, double highest) {
    for (double step = width; from + step < highest; step *= 2.0) {
      if (solver.count(bound, from + step, from + step) > order) {
        return OptionalDouble.of(from + step);
      }
    }
    throw new UnsolvedException("could not prove that nothing grows faster than " + bound
        + " of the crossing rate near wavenumber " + from + " per scale height");
  }

  private boolean below(double bound, double from, double to) {
    return order == 0 ? solver.positive(bound, from, to) : solver.count(bound, from, to) <= order;
  }
}
