package org.archspan.equilibrium;

import org.archspan.mesh.ReferenceElement;

/** Integrals from the left end of a panel to each of its nodes. */
final class RunningIntegral {
  private RunningIntegral() {
  }

  /** Row-major: entry (i, j) integrates the polynomial that is 1 at node j from -1 to node i. */
  static double[] matrix(ReferenceElement rule) {
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
