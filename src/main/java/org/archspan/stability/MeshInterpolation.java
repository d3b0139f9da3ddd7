package org.archspan.stability;

import org.archspan.mesh.Mesh;
import org.archspan.mesh.ReferenceElement;

/** Evaluates nodal values of a mesh at a height. Owns its weights: one instance for one thread. */
final class MeshInterpolation {
  private final Mesh mesh;
  private final ReferenceElement element;
  private final double[] weights;
  private int start;

  MeshInterpolation(Mesh mesh) {
    this.mesh = mesh;
    this.element = mesh.reference();
    this.weights = new double[element.degree() + 1];
  }

  /** Chooses the height; those outside the mesh count as its ends. */
  void moveTo(double height) {
    int e = 0;
    while (e + 1 < mesh.elements() && height > mesh.edges()[e + 1]) {
      e++;
    }
    double x = 2.0 * (height - mesh.edges()[e]) / mesh.length(e) - 1.0;
    element.interpolate(Math.max(-1.0, Math.min(1.0, x)), weights);
    start = e * weights.length;
  }

  /** The polynomial through the values of the element at the chosen height. */
  double value(double[] values) {
    double sum = 0.0;
    for (int i = 0; i < weights.length; i++) {
      sum += weights[i] * values[start + i];
    }
    return sum;
  }
}
