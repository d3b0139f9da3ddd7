package org.archspan.stability;

/**
 * Finds the growth rate of the mode of a given order on one mesh: Newton's method on the twisted residual, kept inside a
 * bracket by the count of modes, and accepted only when the count changes across it.
 */
final class RootFinder {
  private static final int MOST_STEPS = 120;
  private static final double NEARLY_THERE = 1e-6;
  private static final double SEPARATION = 1e-10;

  private final Discretisation discretisation;
  private final double ky;

  RootFinder(Discretisation discretisation, double ky) {
    this.discretisation = discretisation;
    this.ky = ky;
  }

  /**
   * The growth rate of a mode known to exist between two values; its displacement and slopes are left in the
   * discretisation.
   *
   * @param kx    wavenumber
   * @param order 0 for the fastest
   * @param low   a growth rate with more than {@code order} faster modes
   * @param high  a growth rate that at most {@code order} modes exceed
   * @param guess where to start; ignored unless it lies between
   */
  double find(double kx, int order, double low, double high, double guess) {
    double lower = low;
    double upper = high;
    double s = guess > low && guess < high ? guess : 0.5 * (low + high);
    double width = upper - lower;
    for (int step = 1; step <= MOST_STEPS; step++) {
      int count = discretisation.stiffness().count(s, kx, ky);
      boolean below = count > order;
      if (below) {
        lower = s;
      } else {
        upper = s;
      }
      double next = 0.5 * (lower + upper);
      boolean stalled = step % 4 == 0 && upper - lower > 0.5 * width && upper - lower > SEPARATION * upper;
      width = step % 4 == 0 ? upper - lower : width;
      if (count != DynamicStiffness.INFINITE && !stalled) {
        double change = discretisation.newtonStep(s, kx, ky);
        double target = s + change;
        if (upper - lower <= 4.0 * SEPARATION * upper) {
          return Math.min(upper, Math.max(lower, target));
        }
        if (target > lower && target < upper || Math.abs(change) < SEPARATION * s) {
          next = Math.abs(change) < NEARLY_THERE * s ? stepAcross(target, below, lower, upper) : target;
        }
      }
      s = next;
    }
    throw new UnsolvedException("the growth rate of mode " + order + " at wavenumber " + kx
        + " per scale height did not settle within " + MOST_STEPS + " steps; it lies between " + lower + " and "
        + upper + " in units of the crossing rate");
  }

  /** A point just beyond the predicted root, on the side where no count has been taken yet. */
  private static double stepAcross(double target, boolean below, double lower, double upper) {
    double beyond = below ? target * (1.0 + SEPARATION) : target * (1.0 - SEPARATION);
    if (beyond > lower && beyond < upper) {
      return beyond;
    }
    return 0.5 * (lower + upper);
  }
}
