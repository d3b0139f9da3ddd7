package org.archspan.stability;

/**
 * Finds where the count of modes drops to a given order as a growth rate or a wavenumber rises: Newton's method on the
 * twisted residual, kept inside a bracket by the count, and accepted only when the count changes across it.
 */
final class RootFinder {
  private static final int MOST_STEPS = 150;
  private static final double NEARLY_THERE = 1e-6;
  private static final double SEPARATION = 1e-10;

  private RootFinder() {
  }

  /** What is searched along: a count that never rises, and the Newton correction that belongs to the last count. */
  interface Axis {
    int count(double x);

    double newtonStep(double x);
  }

  /**
   * The root between two values; the vector of its last Newton step is left in the axis.
   *
   * @param order 0 for the fastest mode
   * @param low   where the count exceeds {@code order}
   * @param high  where it does not
   * @param guess where to start; ignored unless it lies between
   * @throws UnsolvedException when the root does not settle
   */
  static double find(Axis axis, int order, double low, double high, double guess) {
    double lower = low;
    double upper = high;
    double x = guess > low && guess < high ? guess : 0.5 * (low + high);
    double width = upper - lower;
    for (int step = 1; step <= MOST_STEPS; step++) {
      int count = axis.count(x);
      boolean below = count > order;
      lower = below ? x : lower;
      upper = below ? upper : x;
      boolean stalled = false;
      if (step % 4 == 0) {
        stalled = upper - lower > 0.5 * width;
        width = upper - lower;
      }
      double next = 0.5 * (lower + upper);
      if (count != DynamicStiffness.INFINITE) {
        double change = axis.newtonStep(x);
        double target = x + change;
        if (upper - lower <= 4.0 * SEPARATION * upper) {
          return Math.min(upper, Math.max(lower, target));
        }
        if (Math.abs(change) < NEARLY_THERE * x) {
          next = stepAcross(target, below, lower, upper);
        } else if (target > lower && target < upper && !stalled) {
          next = target;
        }
      }
      x = next;
    }
    throw new UnsolvedException("mode " + order + " did not settle within " + MOST_STEPS + " steps; its root lies between "
        + lower + " and " + upper + " in units of the scale height and the crossing time");
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
