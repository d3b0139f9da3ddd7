package org.archspan.stability;

/**
 * Finds where the count of modes drops to a given order as a growth rate or a wavenumber rises: Newton's method on the
 * twisted residual, kept inside a bracket by the count, and accepted only when the count changes across it.
 */
final class RootFinder {
  private static final int MOST_STEPS = 150;
  /** A Newton correction this small (relative) leaves an error of its square. */
  private static final double SETTLED = 1e-7;
  private static final double NEARLY_THERE = 1e-2;
  private static final double SEPARATION = 1e-12;
  private static final double CLUSTER = 1e-10;
  private static final int PATIENCE = 6;

  private final Axis axis;
  private final int order;
  private double lower;
  private double upper;
  private int countBelow;
  private int countAbove;

  /** What is searched along: a count that never rises, and the Newton correction that belongs to the last count. */
  interface Axis {
    int count(double x);

    double newtonStep(double x);
  }

  private RootFinder(Axis axis, int order, double low, double high) {
    this.axis = axis;
    this.order = order;
    lower = low;
    upper = high;
    countBelow = -1;
    countAbove = -1;
  }

  /**
   * The root between two values; the vector of its last Newton step is left in the axis.
   *
   * @param order 0 for the fastest mode
   * @param low   lower end
   * @param high  where the count is known not to exceed {@code order}
   * @param guess where to start; ignored unless it lies between
   * @return the root; NaN when the count does not exceed {@code order} at {@code low} either
   * @throws UnsolvedException when the root does not settle
   */
  static double find(Axis axis, int order, double low, double high, double guess) {
    RootFinder finder = new RootFinder(axis, order, low, high);
    boolean guessed = guess > low && guess < high;
    if (!guessed && !finder.reachesLow()) {
      return Double.NaN;
    }
    return finder.search(guessed ? guess : 0.5 * (low + high));
  }

  private boolean reachesLow() {
    countBelow = axis.count(lower);
    return countBelow > order;
  }

  private double search(double start) {
    double x = start;
    double width = upper - lower;
    for (int step = 1; step <= MOST_STEPS; step++) {
      int count = axis.count(x);
      narrow(x, count);
      double change = count == DynamicStiffness.INFINITE ? Double.NaN : axis.newtonStep(x);
      double target = x + change;
      if (settled(x, change, target)) {
        return Double.isNaN(target) ? 0.5 * (lower + upper) : Math.min(upper, Math.max(lower, target));
      }
      boolean stalled = false;
      if (step % PATIENCE == 0) {
        stalled = upper - lower > 0.5 * width;
        width = upper - lower;
      }
      double next = stalled ? Double.NaN : beyond(x, change, count > order);
      if (!(next > lower && next < upper)) {
        if (countBelow < 0 && !reachesLow()) {
          return Double.NaN;
        }
        next = 0.5 * (lower + upper);
      }
      x = next;
    }
    throw new UnsolvedException("mode " + order + " did not settle within " + MOST_STEPS
        + " steps; its root lies between " + lower + " and " + upper
        + " in units of the scale height and the crossing time");
  }

  private void narrow(double x, int count) {
    if (count > order) {
      lower = x;
      countBelow = count;
    } else {
      upper = x;
      countAbove = count;
    }
  }

  /** Either exactly one root lies in the bracket and Newton has converged to it, or the bracket is closed. */
  private boolean settled(double x, double change, double target) {
    boolean isolated = countBelow == order + 1 && countAbove == order;
    boolean converged = Math.abs(change) <= SETTLED * x && target >= lower && target <= upper;
    return isolated && converged || countBelow > order && upper - lower <= CLUSTER * upper;
  }

  /** The Newton target, or a point just beyond it on the side where no count has been taken yet. */
  private static double beyond(double x, double change, boolean below) {
    double relative = Math.abs(change) / x;
    if (!(relative < NEARLY_THERE)) {
      return x + change;
    }
    double margin = Math.max(SEPARATION, 4.0 * relative * relative);
    return (x + change) * (below ? 1.0 + margin : 1.0 - margin);
  }
}
