package org.archspan.equilibrium;

import java.util.Arrays;
import org.archspan.mesh.ReferenceElement;

/** A function of height by its values on the nodes of panels, one polynomial a panel. Immutable. */
final class PanelValues {
  /** The rule of every panel. */
  static final ReferenceElement RULE = ReferenceElement.ofDegree(16);
  static final int NODES = RULE.degree() + 1;
  private final double[] edges;
  private final double[] values;

  /**
   * Values on panels.
   *
   * @param edges  of the panels, cm, ascending, shape [panels + 1]
   * @param values at their nodes, those of neighbouring ends twice, shape [panels * NODES]
   */
  PanelValues(double[] edges, double[] values) {
    this.edges = edges;
    this.values = values;
  }

  /** Height of a node of a panel, cm. */
  static double node(double[] edges, int panel, int i) {
    return edges[panel] + 0.5 * (edges[panel + 1] - edges[panel]) * (1.0 + RULE.nodes()[i]);
  }

  /** Upper end of the last panel, cm. */
  double top() {
    return edges[edges.length - 1];
  }

  /** The value at that end. */
  double last() {
    return values[values.length - 1];
  }

  /** The value at a height below the top, cm; the first panel is continued downwards. */
  double at(double height) {
    int found = Arrays.binarySearch(edges, height);
    int panel = Math.max(0, found >= 0 ? found : -found - 2);
    double[] weights = new double[NODES];
    RULE.interpolate(2.0 * (height - edges[panel]) / (edges[panel + 1] - edges[panel]) - 1.0, weights);
    double sum = 0.0;
    for (int i = 0; i < NODES; i++) {
      sum += weights[i] * values[panel * NODES + i];
    }
    return sum;
  }
}
