package org.archspan.linalg;

/**
 * Factors a symmetric block tridiagonal matrix of 2 x 2 blocks from both ends: the block form of {@link TwistedTridiagonal}.
 *
 * <p>A diagonal block is stored as (11, 12, 22), a coupling of block i with block i+1 row by row. Owns its work arrays: one
 * instance for one thread.
 */
public final class TwistedBlockTridiagonal {
  /** A pivot block whose determinant is smaller than this share of its entries is taken as this share. */
  private static final double TINY = 1e-30;
  private final double[] forward;
  private final double[] backward;
  private final double[] pivot = new double[3];
  private int size;
  private double residual;

  /** Room for so many blocks. */
  public TwistedBlockTridiagonal(int capacity) {
    forward = new double[3 * capacity];
    backward = new double[3 * capacity];
  }

  /**
   * Number of negative eigenvalues. O(n), no allocation.
   *
   * @param diagonal    shape [3 n]
   * @param offDiagonal shape [4 (n - 1)]
   * @param n           number of blocks, at least 1
   */
  public int count(double[] diagonal, double[] offDiagonal, int n) {
    size = n;
    int negative = 0;
    for (int i = 0; i < n; i++) {
      System.arraycopy(diagonal, 3 * i, pivot, 0, 3);
      if (i > 0) {
        subtractBelow(forward, 3 * (i - 1), offDiagonal, 4 * (i - 1));
      }
      System.arraycopy(pivot, 0, forward, 3 * i, 3);
      double determinant = determinant(forward, 3 * i);
      negative += determinant < 0.0 ? 1 : pivot[0] + pivot[2] < 0.0 ? 2 : 0;
    }
    return negative;
  }

  private static double determinant(double[] block, int at) {
    double product = block[at] * block[at + 2];
    double square = block[at + 1] * block[at + 1];
    double determinant = product - square;
    double least = TINY * (Math.abs(product) + square);
    return Math.abs(determinant) < least ? least : determinant;
  }

  /** pivot -= B^T P^-1 B. */
  private void subtractBelow(double[] block, int at, double[] coupling, int from) {
    double b11 = coupling[from];
    double b12 = coupling[from + 1];
    double b21 = coupling[from + 2];
    double b22 = coupling[from + 3];
    subtract(block, at, b11, b21, b12, b22);
  }

  /** pivot -= B P^-1 B^T. */
  private void subtractAbove(double[] block, int at, double[] coupling, int from) {
    subtract(block, at, coupling[from], coupling[from + 1], coupling[from + 2], coupling[from + 3]);
  }

  /** pivot -= (u, v)^T P^-1 (u, v) for two columns u and v. */
  private void subtract(double[] block, int at, double u1, double u2, double v1, double v2) {
    double inverse = 1.0 / determinant(block, at);
    double x1 = (block[at + 2] * u1 - block[at + 1] * u2) * inverse;
    double x2 = (block[at] * u2 - block[at + 1] * u1) * inverse;
    double y1 = (block[at + 2] * v1 - block[at + 1] * v2) * inverse;
    double y2 = (block[at] * v2 - block[at + 1] * v1) * inverse;
    pivot[0] -= u1 * x1 + u2 * x2;
    pivot[1] -= u1 * y1 + u2 * y2;
    pivot[2] -= v1 * y1 + v2 * y2;
  }

  /**
   * After {@link #count} with the same arguments: a vector that the matrix almost annihilates, all of whose residual lies
   * in one block. O(n), no allocation.
   *
   * @param x receives the vector, shape [2 n]
   */
  public void nullVector(double[] diagonal, double[] offDiagonal, double[] x) {
    for (int i = size - 1; i >= 0; i--) {
      System.arraycopy(diagonal, 3 * i, pivot, 0, 3);
      if (i < size - 1) {
        subtractAbove(backward, 3 * (i + 1), offDiagonal, 4 * i);
      }
      System.arraycopy(pivot, 0, backward, 3 * i, 3);
    }
    int twist = chooseTwist(diagonal, x);
    for (int i = twist - 1; i >= 0; i--) {
      int b = 4 * i;
      double right1 = offDiagonal[b] * x[2 * i + 2] + offDiagonal[b + 1] * x[2 * i + 3];
      double right2 = offDiagonal[b + 2] * x[2 * i + 2] + offDiagonal[b + 3] * x[2 * i + 3];
      solve(forward, 3 * i, -right1, -right2, x, 2 * i);
    }
    for (int i = twist + 1; i < size; i++) {
      int b = 4 * (i - 1);
      double right1 = offDiagonal[b] * x[2 * i - 2] + offDiagonal[b + 2] * x[2 * i - 1];
      double right2 = offDiagonal[b + 1] * x[2 * i - 2] + offDiagonal[b + 3] * x[2 * i - 1];
      solve(backward, 3 * i, -right1, -right2, x, 2 * i);
    }
  }

  private static void solve(double[] block, int at, double right1, double right2, double[] x, int to) {
    double inverse = 1.0 / determinant(block, at);
    x[to] = (block[at + 2] * right1 - block[at + 1] * right2) * inverse;
    x[to + 1] = (block[at] * right2 - block[at + 1] * right1) * inverse;
  }

  /** The block nearest to singular relative to its own entries; its null vector goes into x. */
  private int chooseTwist(double[] diagonal, double[] x) {
    double least = Double.POSITIVE_INFINITY;
    int twist = 0;
    for (int i = 0; i < size; i++) {
      double candidate = Math.abs(smallest(diagonal, 3 * i));
      if (candidate < least) {
        least = candidate;
        twist = i;
      }
    }
    place(diagonal, 3 * twist, x, 2 * twist);
    return twist;
  }

  /** The eigenvalue of least magnitude of a twisted block, both of whose rows are scaled by their own magnitude. */
  private double smallest(double[] diagonal, int at) {
    double s1 = scale(diagonal, at);
    double s2 = scale(diagonal, at + 2);
    double p = twisted(diagonal, at) / s1;
    double r = twisted(diagonal, at + 2) / s2;
    double q = twisted(diagonal, at + 1) / Math.sqrt(s1 * s2);
    double mean = 0.5 * (p + r);
    double radius = Math.hypot(0.5 * (p - r), q);
    double greatest = mean >= 0.0 ? mean + radius : mean - radius;
    return greatest == 0.0 ? 0.0 : (p * r - q * q) / greatest;
  }

  private double twisted(double[] diagonal, int at) {
    return forward[at] + backward[at] - diagonal[at];
  }

  private double scale(double[] diagonal, int at) {
    return Math.abs(forward[at]) + Math.abs(backward[at]) + Math.abs(diagonal[at]);
  }

  private void place(double[] diagonal, int at, double[] x, int to) {
    double s1 = Math.sqrt(scale(diagonal, at));
    double s2 = Math.sqrt(scale(diagonal, at + 2));
    double eigenvalue = smallest(diagonal, at);
    double p = twisted(diagonal, at) / (s1 * s1) - eigenvalue;
    double r = twisted(diagonal, at + 2) / (s2 * s2) - eigenvalue;
    double q = twisted(diagonal, at + 1) / (s1 * s2);
    boolean upper = Math.abs(p) >= Math.abs(r);
    double v1 = upper ? -q : r;
    double v2 = upper ? p : -q;
    double norm = Math.hypot(v1, v2);
    if (norm == 0.0) {
      v1 = 1.0;
      norm = 1.0;
    }
    x[to] = v1 / (norm * s1);
    x[to + 1] = v2 / (norm * s2);
    residual = eigenvalue;
  }

  /** The quadratic form of the last {@link #nullVector}, in the unit of the matrix. */
  public double residual() {
    return residual;
  }
}
