package org.archspan.linalg;

/**
 * Factors a symmetric tridiagonal matrix from both ends. The forward factorisation {@code L D L^T} counts negative
 * eigenvalues (Sylvester); where it meets the backward one, the twist gives the vector that a nearly singular matrix
 * almost annihilates (Fernando 1997, SIAM J. Matrix Anal. Appl. 18, 1013).
 *
 * <p>Owns its work arrays: one instance for one thread.
 */
public final class TwistedTridiagonal {
  private static final double TINY = 1e-290;

  private final double[] forward;
  private final double[] backward;
  private int size;
  private int twist;
  private double residual;

  /** Room for matrices of order up to {@code capacity}. */
  public TwistedTridiagonal(int capacity) {
    forward = new double[capacity];
    backward = new double[capacity];
  }

  /**
   * Number of negative eigenvalues. O(n), no allocation.
   *
   * @param diagonal    shape [from + n]
   * @param offDiagonal entry i couples i and i+1, shape [from + n - 1]
   * @param from        first row
   * @param n           order, at least 1
   */
  public int count(double[] diagonal, double[] offDiagonal, int from, int n) {
    size = n;
    int negative = 0;
    double pivot = 1.0;
    for (int i = 0; i < n; i++) {
      double entry = diagonal[from + i];
      if (i > 0) {
        double coupling = offDiagonal[from + i - 1];
        entry -= coupling * coupling / pivot;
      }
      pivot = Math.abs(entry) < TINY ? TINY : entry;
      forward[i] = pivot;
      if (pivot < 0.0) {
        negative++;
      }
    }
    return negative;
  }

  /**
   * After {@link #count} with the same arguments: finds x with {@code T x = r e_k}, x_k = 1 and the smallest relative |r|.
   * O(n), no allocation.
   *
   * @param x receives the vector, shape [from + n]; entries from {@code from} on are written
   */
  public void nullVector(double[] diagonal, double[] offDiagonal, int from, double[] x) {
    int n = size;
    for (int i = n - 1; i >= 0; i--) {
      double entry = diagonal[from + i];
      if (i < n - 1) {
        double coupling = offDiagonal[from + i];
        entry -= coupling * coupling / backward[i + 1];
      }
      backward[i] = Math.abs(entry) < TINY ? TINY : entry;
    }
    chooseTwist(diagonal, from);
    x[from + twist] = 1.0;
    for (int i = twist - 1; i >= 0; i--) {
      x[from + i] = -offDiagonal[from + i] * x[from + i + 1] / forward[i];
    }
    for (int i = twist + 1; i < n; i++) {
      x[from + i] = -offDiagonal[from + i - 1] * x[from + i - 1] / backward[i];
    }
  }

  /** The row that is nearest to singular relative to its own diagonal entry: rows differ in scale. */
  private void chooseTwist(double[] diagonal, int from) {
    double least = Double.POSITIVE_INFINITY;
    for (int i = 0; i < size; i++) {
      double candidate = forward[i] + backward[i] - diagonal[from + i];
      double relative = Math.abs(candidate) / (Math.abs(forward[i]) + Math.abs(backward[i]) + Math.abs(diagonal[from + i]));
      if (relative < least) {
        least = relative;
        residual = candidate;
        twist = i;
      }
    }
  }

  /** The r of the last {@link #nullVector}: also the quadratic form x^T T x, in the unit of the matrix. */
  public double residual() {
    return residual;
  }
}
