package org.archspan.stability;

/**
 * A growth rate from a good guess with as few factorisations as can be certified: Newton on the working mesh, then one
 * evaluation on the checking mesh on the far side of the root. The two counts enclose exactly one root; the difference of
 * the two meshes is its error.
 */
final class WarmStart {
  private static final int MOST_STEPS = 4;
  private static final int MOST_CHECKS = 2;
  private static final double SMALLEST_MARGIN = 1e-11;
  private static final double SETTLED = 1e-6;

  private final Discretisation working;
  private final Discretisation checking;
  private final double ky;
  private final double tolerance;
  /** Relative difference of the two meshes at the latest root: it changes little from one wavelength to the next. */
  private double shift;

  WarmStart(Discretisation working, Discretisation checking, double ky, double tolerance) {
    this.working = working;
    this.checking = checking;
    this.ky = ky;
    this.tolerance = tolerance;
  }

  /**
   * The root near a guess.
   *
   * @param floor   a growth rate below which no discrete mode is sought
   * @param ceiling a growth rate that no mode exceeds
   * @return null when the guess does not lead to an isolated root of that order
   */
  GrowthRoot find(double kx, int order, double floor, double ceiling, double guess) {
    double close = 0.1 * Math.sqrt(tolerance);
    double x = guess;
    for (int step = 0; step < MOST_STEPS; step++) {
      if (!(x > floor && x < ceiling)) {
        return null;
      }
      int count = working.stiffness().count(x, kx, ky);
      if (count == DynamicStiffness.INFINITE || working.stiffness().anyCrowded()) {
        return null;
      }
      double change = working.newtonStep(x, kx, ky);
      double relative = Math.abs(change) / x;
      if (relative <= close) {
        boolean below = count == order + 1;
        return below || count == order ? check(kx, order, x + change, below, relative * relative) : null;
      }
      x += change;
    }
    return null;
  }

  private GrowthRoot check(double kx, int order, double target, boolean below, double remainder) {
    double margin = Math.max(Math.max(SMALLEST_MARGIN, 0.3 * tolerance), 4.0 * remainder);
    double from = target * (1.0 + shift);
    for (int attempt = 0; attempt < MOST_CHECKS; attempt++) {
      double y = from * (below ? 1.0 + margin : 1.0 - margin);
      int count = checking.stiffness().count(y, kx, ky);
      if (count == DynamicStiffness.INFINITE) {
        return null;
      }
      double change = checking.newtonStep(y, kx, ky);
      double root = y + change;
      boolean enclosed = below ? count == order && root <= y : count == order + 1 && root >= y;
      if (enclosed && Math.abs(change) <= SETTLED * y) {
        shift = (root - target) / target;
        double error = Math.abs(root - target) / root + remainder + checking.displacement().rounding(root);
        return new GrowthRoot(kx, root, checking.slope(), error);
      }
      from = root;
    }
    return null;
  }
}
