package org.archspan.linalg;

/** LU of a tridiagonal matrix without symmetry, without pivoting; see {@link GeneralElimination} for where that is safe. */
public final class GeneralTridiagonal {
  private GeneralTridiagonal() {
  }

  /**
   * Factors in place. O(n), no allocation.
   *
   * @param lower    entry i couples row i+1 to column i; receives the multipliers
   * @param diagonal receives the pivots
   * @param upper    entry i couples row i to column i+1
   * @param from     first row
   * @param to       one past the last row
   * @return whether every pivot was positive
   */
  public static boolean factor(double[] lower, double[] diagonal, double[] upper, int from, int to) {
    boolean positive = true;
    for (int i = from; i < to; i++) {
      if (i > from) {
        lower[i - 1] /= diagonal[i - 1];
        diagonal[i] -= lower[i - 1] * upper[i - 1];
      }
      positive &= diagonal[i] > 0.0;
    }
    return positive;
  }

  /** Solves in place after {@link #factor}. O(n), no allocation. */
  public static void solve(double[] lower, double[] diagonal, double[] upper, int from, int to, double[] right) {
    for (int i = from + 1; i < to; i++) {
      right[i] -= lower[i - 1] * right[i - 1];
    }
    for (int i = to - 1; i >= from; i--) {
      double next = i + 1 < to ? upper[i] * right[i + 1] : 0.0;
      right[i] = (right[i] - next) / diagonal[i];
    }
  }
}
