package org.archspan.equilibrium;

import org.archspan.mesh.ReferenceElement;

/** Integrals from the left end of a panel of {@link PanelValues} to each of its nodes. */
final class RunningIntegral {
  private static final double[] MATRIX = matrix(PanelValues.RULE);

  private RunningIntegral() {
  }

  /**
   * Integrates over one panel.
   *
   * @param values of the integrand at the nodes, read from {@code at} on
   * @param half   half of the panel's width
   * @param start  the integral at its left end
   * @param into   receives the integral at the nodes, from {@code offset} on
   */
  static void integrate(double[] values, int at, double half, double start, double[] into, int offset) {
    for (int i = 0; i < PanelValues.NODES; i++) {
      double sum = 0.0;
      for (int j = 0; j < PanelValues.NODES; j++) {
        sum += MATRIX[i * PanelValues.NODES + j] * values[at + j];
      }
      into[offset + i] = start + half * sum;
    }
  }

  /** Row-major: entry (i, j) integrates the polynomial that is 1 at node j from -1 to node i. */
  private static double[] matrix(ReferenceElement rule) {
    int nodes = rule.degree() + 1;
    double[] matrix = new double[nodes * nodes];
    double[] values = new double[nodes];
    for (int i = 0; i < nodes; i++) {
      double half = 0.5 * (rule.nodes()[i] + 1.0);
      for (int q = 0; q < nodes; q++) {
        rule.interpolate(-1.0 + half * (1.0 + rule.nodes()[q]), values);
        for (int j = 0; j < nodes; j++) {
          matrix[i * nodes + j] += half * rule.weights()[q] * values[j];
        }
      }
    }
    return matrix;
  }
}
