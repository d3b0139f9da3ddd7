package org.archspan.linalg;

/** Legendre polynomials and the Gauss-Lobatto rule built on them. All numbers are dimensionless. */
public final class LegendreBasis {
  private static final int NEWTON_STEPS = 50;

  private LegendreBasis() {
  }

  /** Value of the Legendre polynomial of a degree at x in [-1, 1], dimensionless. O(degree). */
  public static double value(int degree, double x) {
    double previous = 0.0;
    double current = 1.0;
    for (int n = 1; n <= degree; n++) {
      double next = ((2 * n - 1) * x * current - (n - 1) * previous) / n;
      previous = current;
      current = next;
    }
    return current;
  }

  /**
   * The degree + 1 Gauss-Lobatto-Legendre nodes on [-1, 1], ascending: the ends and the zeros of P'_degree.
   *
   * @param degree at least 1
   */
  public static double[] lobattoNodes(int degree) {
    double[] nodes = new double[degree + 1];
    for (int i = 0; i <= degree; i++) {
      nodes[i] = -Math.cos(Math.PI * i / degree);
    }
    for (int i = 1; i < degree; i++) {
      nodes[i] = polish(degree, nodes[i]);
    }
    for (int i = 0; i <= degree / 2; i++) {
      double half = 0.5 * (nodes[degree - i] - nodes[i]);
      nodes[i] = -half;
      nodes[degree - i] = half;
    }
    return nodes;
  }

  /** Newton's method on P'_n, whose derivative follows from Legendre's equation. */
  private static double polish(int n, double start) {
    double x = start;
    for (int step = 0; step < NEWTON_STEPS; step++) {
      double p = value(n, x);
      double slope = n * (value(n - 1, x) - x * p) / (1.0 - x * x);
      double curvature = (2.0 * x * slope - n * (n + 1) * p) / (1.0 - x * x);
      double change = slope / curvature;
      x -= change;
      if (Math.abs(change) < 1e-16) {
        break;
      }
    }
    return x;
  }

  /**
   * Weights of the Gauss-Lobatto rule at the given nodes; exact for polynomials of degree 2 degree - 1.
   *
   * @param nodes from {@link #lobattoNodes}
   */
  public static double[] lobattoWeights(double[] nodes) {
    int degree = nodes.length - 1;
    double[] weights = new double[nodes.length];
    for (int i = 0; i <= degree; i++) {
      double p = value(degree, nodes[i]);
      weights[i] = 2.0 / (degree * (degree + 1) * p * p);
    }
    return weights;
  }

  /**
   * Differentiation on Gauss-Lobatto-Legendre nodes.
   *
   * @param nodes from {@link #lobattoNodes}, n of them
   * @return row-major n x n: entry (q, i) is the slope at node q of the polynomial that is 1 at node i, 0 at the others
   */
  public static double[] lobattoDerivative(double[] nodes) {
    int n = nodes.length;
    int degree = n - 1;
    double[] matrix = new double[n * n];
    for (int q = 0; q < n; q++) {
      double diagonal = 0.0;
      for (int i = 0; i < n; i++) {
        if (i != q) {
          double entry = value(degree, nodes[q]) / (value(degree, nodes[i]) * (nodes[q] - nodes[i]));
          matrix[q * n + i] = entry;
          diagonal -= entry;
        }
      }
      matrix[q * n + q] = diagonal;
    }
    return matrix;
  }
}
