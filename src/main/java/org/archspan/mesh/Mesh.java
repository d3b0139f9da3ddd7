package org.archspan.mesh;

/**
 * A row of spectral elements over an interval of height, all of one degree.
 *
 * @param edges  ends of the elements, ascending, in the unit of the caller, shape [elements + 1]
 * @param degree polynomial degree of each element
 */
public record Mesh(double[] edges, int degree) {
  /** Number of elements. */
  public int elements() {
    return edges.length - 1;
  }

  /** The reference element. */
  public ReferenceElement reference() {
    return ReferenceElement.ofDegree(degree);
  }

  /** Length of element e, in the unit of the edges. */
  public double length(int e) {
    return edges[e + 1] - edges[e];
  }

  /** Nodes of all elements in the unit of the edges, the shared ends repeated, shape [elements * (degree + 1)]. */
  public double[] nodes() {
    double[] reference = reference().nodes();
    int n = degree + 1;
    double[] nodes = new double[elements() * n];
    for (int e = 0; e < elements(); e++) {
      double half = 0.5 * length(e);
      for (int i = 0; i < n; i++) {
        nodes[e * n + i] = edges[e] + half * (1.0 + reference[i]);
      }
      nodes[e * n + degree] = edges[e + 1];
    }
    return nodes;
  }

  /** The derivative of a function on the nodes, per unit of the edges, shape of the nodes. O(elements * degree^2). */
  public double[] slopes(double[] values) {
    double[] derivative = reference().derivative();
    int n = degree + 1;
    double[] slopes = new double[values.length];
    for (int i = 0; i < values.length; i++) {
      int e = i / n;
      double sum = 0.0;
      for (int j = 0; j < n; j++) {
        sum += derivative[(i - e * n) * n + j] * values[e * n + j];
      }
      slopes[i] = 2.0 / length(e) * sum;
    }
    return slopes;
  }

  /** The same elements with another degree. */
  public Mesh withDegree(int newDegree) {
    return new Mesh(edges, newDegree);
  }

  /** Every element cut in two. */
  public Mesh halved() {
    double[] halves = new double[2 * elements() + 1];
    for (int e = 0; e < elements(); e++) {
      halves[2 * e] = edges[e];
      halves[2 * e + 1] = 0.5 * (edges[e] + edges[e + 1]);
    }
    halves[2 * elements()] = edges[elements()];
    return new Mesh(halves, degree);
  }
}
