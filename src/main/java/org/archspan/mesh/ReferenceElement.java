package org.archspan.mesh;

import org.archspan.linalg.LegendreBasis;

/**
 * The interval [-1, 1] with Gauss-Lobatto-Legendre nodes, which serve both as interpolation and as quadrature points.
 * All numbers are dimensionless. Immutable; arrays are shared and must not be written.
 */
public final class ReferenceElement {
  /** Lowest degree offered. */
  public static final int LOWEST_DEGREE = 2;

  /** Highest degree offered. */
  public static final int HIGHEST_DEGREE = 24;

  private static final ReferenceElement[] ALL = all();

  private final int degree;
  private final double[] nodes;
  private final double[] weights;
  private final double[] derivative;
  private final int[] pairFirst;
  private final int[] pairSecond;
  private final double[] pairSlope;
  private final double[] pairSlopeReversed;
  private final double[] slopeProducts;
  private final double[] slopeGram;
  private final double[] legendreTail;

  private ReferenceElement(int degree) {
    this.degree = degree;
    this.nodes = LegendreBasis.lobattoNodes(degree);
    this.weights = LegendreBasis.lobattoWeights(nodes);
    this.derivative = LegendreBasis.lobattoDerivative(nodes);
    int[] order = eliminationOrder(degree);
    int n = degree + 1;
    this.pairFirst = new int[n * (n + 1) / 2];
    this.pairSecond = new int[pairFirst.length];
    this.pairSlope = new double[pairFirst.length];
    this.pairSlopeReversed = new double[pairFirst.length];
    int at = 0;
    for (int i = 0; i < n; i++) {
      for (int j = i; j < n; j++) {
        pairFirst[at] = order[i];
        pairSecond[at] = order[j];
        pairSlope[at] = derivative[order[i] * n + order[j]];
        pairSlopeReversed[at++] = derivative[order[j] * n + order[i]];
      }
    }
    this.slopeProducts = products();
    this.slopeGram = gram();
    this.legendreTail = tail();
  }

  private static ReferenceElement[] all() {
    ReferenceElement[] elements = new ReferenceElement[HIGHEST_DEGREE + 1];
    for (int degree = LOWEST_DEGREE; degree <= HIGHEST_DEGREE; degree++) {
      elements[degree] = new ReferenceElement(degree);
    }
    return elements;
  }

  /**
   * The element of a degree.
   *
   * @param degree between {@link #LOWEST_DEGREE} and {@link #HIGHEST_DEGREE}
   * @throws IllegalArgumentException outside that range
   */
  public static ReferenceElement ofDegree(int degree) {
    if (degree < LOWEST_DEGREE || degree > HIGHEST_DEGREE) {
      throw new IllegalArgumentException("degree must lie between " + LOWEST_DEGREE + " and " + HIGHEST_DEGREE
          + ", found " + degree);
    }
    return ALL[degree];
  }

  /** Polynomial degree p. */
  public int degree() {
    return degree;
  }

  /** Nodes on [-1, 1], ascending, shape [p+1]. */
  public double[] nodes() {
    return nodes;
  }

  /** Quadrature weights, dimensionless, shape [p+1]. */
  public double[] weights() {
    return weights;
  }

  /** Differentiation matrix, row-major, shape [p+1][p+1]. */
  public double[] derivative() {
    return derivative;
  }

  /**
   * The order in which an element's nodes are eliminated: the inner ones first, then the left end, then the right end.
   * Pairs (i, j >= i) in this order, row by row, are the packed form of an element matrix.
   */
  public static int[] eliminationOrder(int degree) {
    int[] order = new int[degree + 1];
    for (int i = 0; i < degree - 1; i++) {
      order[i] = i + 1;
    }
    order[degree - 1] = 0;
    order[degree] = degree;
    return order;
  }

  /** First node of each packed pair, in elimination order; shape [(p+1)(p+2)/2]. */
  public int[] pairFirst() {
    return pairFirst;
  }

  /** Second node of each packed pair; shape [(p+1)(p+2)/2]. */
  public int[] pairSecond() {
    return pairSecond;
  }

  /** Slope {@code D_ij} of each packed pair (i, j), shape [(p+1)(p+2)/2]. */
  public double[] pairSlope() {
    return pairSlope;
  }

  /** Slope {@code D_ji} of each packed pair (i, j), shape [(p+1)(p+2)/2]. */
  public double[] pairSlopeReversed() {
    return pairSlopeReversed;
  }

  /** Products of slopes {@code D_qi D_qj} for each node q over the packed pairs, shape [p+1][(p+1)(p+2)/2]. */
  public double[] slopeProducts() {
    return slopeProducts;
  }

  /**
   * Weights that turn nodal values into the value at a point, by the barycentric formula for these nodes (Wang, Huybrechs
   * and Vandewalle 2014, Math. Comp. 83, 2893: alternating signs times the root of the quadrature weight).
   *
   * @param x       point in [-1, 1], dimensionless
   * @param weights receives p+1 weights that add up to 1
   */
  public void interpolate(double x, double[] weights) {
    double sum = 0.0;
    for (int i = 0; i <= degree; i++) {
      double distance = x - nodes[i];
      if (distance == 0.0) {
        java.util.Arrays.fill(weights, 0.0);
        weights[i] = 1.0;
        return;
      }
      weights[i] = (i % 2 == 0 ? 1.0 : -1.0) * Math.sqrt(this.weights[i]) / distance;
      sum += weights[i];
    }
    for (int i = 0; i <= degree; i++) {
      weights[i] /= sum;
    }
  }

  /**
   * Rows that turn nodal values into the two highest Legendre coefficients, shape [2][p+1]: degree p-1 first, then p.
   * A smooth function has small ones.
   */
  public double[] legendreTail() {
    return legendreTail;
  }

  /** Integrals of products of slopes, {@code Sum_q w_q D_qi D_qj}, row-major, shape [(p+1)(p+1)]. */
  public double[] slopeGram() {
    return slopeGram;
  }

  private double[] gram() {
    int n = degree + 1;
    double[] gram = new double[n * n];
    for (int q = 0; q < n; q++) {
      for (int i = 0; i < n; i++) {
        for (int j = 0; j < n; j++) {
          gram[i * n + j] += weights[q] * derivative[q * n + i] * derivative[q * n + j];
        }
      }
    }
    return gram;
  }

  private double[] tail() {
    int n = degree + 1;
    double[] rows = new double[2 * n];
    for (int i = 0; i < n; i++) {
      rows[i] = weights[i] * LegendreBasis.value(degree - 1, nodes[i]) * (degree - 0.5);
      rows[n + i] = weights[i] * LegendreBasis.value(degree, nodes[i]) * 0.5 * degree;
    }
    return rows;
  }

  private double[] products() {
    int n = degree + 1;
    int pairs = pairFirst.length;
    double[] products = new double[n * pairs];
    for (int q = 0; q < n; q++) {
      for (int pair = 0; pair < pairs; pair++) {
        products[q * pairs + pair] = derivative[q * n + pairFirst[pair]] * derivative[q * n + pairSecond[pair]];
      }
    }
    return products;
  }
}
