package org.archspan.shear;

import org.archspan.linalg.GeneralElimination;
import org.archspan.linalg.GeneralTridiagonal;
import org.archspan.mesh.ReferenceElement;

/**
 * The matrix {@code s^2 + s C + K} of a wave at one wavevector, C the Coriolis force and K the force operator with the tide:
 * at s = 2/h that of an implicit midpoint step h. The horizontal displacements are eliminated at each node, then the inner
 * nodes of each element; what is left is tridiagonal.
 *
 * <p>Owns its work arrays: one instance for one thread.
 */
final class StepMatrix {
  private final ShearingColumn column;
  private final ReferenceElement element;
  private final int n;
  private final int elements;
  private final int first;
  private final int last;
  private final NodeElimination node;
  private final double[] matrix;
  private final double[] lower;
  private final double[] diagonal;
  private final double[] upper;
  private final double[] ends;
  private final double[] local;
  private final int[] order;

  StepMatrix(ShearingColumn column) {
    this.column = column;
    element = column.mesh.reference();
    n = element.degree() + 1;
    elements = column.mesh.elements();
    first = column.bottomFixed ? 1 : 0;
    last = elements + 1 - (column.topFixed ? 1 : 0);
    node = new NodeElimination(column);
    matrix = new double[elements * n * n];
    lower = new double[elements];
    diagonal = new double[elements + 1];
    upper = new double[elements];
    ends = new double[elements + 1];
    local = new double[elements * n];
    order = ReferenceElement.eliminationOrder(element.degree());
  }

  /** The coefficients at the nodes, as last factored. */
  NodeElimination node() {
    return node;
  }

  /**
   * Factors the matrix. O(elements * degree^3), no allocation.
   *
   * @param s  2/h, not 0
   * @param ky wavenumber across the field
   * @return whether all pivots were positive, without which the step is too long for the growth it must follow
   */
  boolean factor(double s, double ky, DiskFlow flow) {
    boolean positive = node.prepare(s, ky, flow);
    diagonal[0] = 0.0;
    for (int e = 0; e < elements; e++) {
      int offset = e * n * n;
      assemble(e, offset);
      positive &= GeneralElimination.eliminate(matrix, offset, n, n - 2);
      int corner = offset + (n - 2) * n + n - 2;
      diagonal[e] += matrix[corner];
      upper[e] = matrix[corner + 1];
      lower[e] = matrix[corner + n];
      diagonal[e + 1] = matrix[corner + n + 1];
    }
    if (!column.topFixed) {
      diagonal[elements] += column.gravity[column.nodes() - 1];
    }
    return positive & GeneralTridiagonal.factor(lower, diagonal, upper, first, last);
  }

  private void assemble(int e, int offset) {
    double[] slope = element.derivative();
    double[] reference = element.weights();
    double toSlope = 2.0 / column.mesh.length(e);
    for (int i = 0; i < n; i++) {
      int row = order[i];
      for (int j = 0; j < n; j++) {
        int col = order[j];
        double sum = 0.0;
        for (int q = 0; q < n; q++) {
          sum += slope[q * n + row] * slope[q * n + col] * node.a[e * n + q] * reference[q];
        }
        matrix[offset + i * n + j] = toSlope * sum
            + slope[col * n + row] * node.slopeByValue[e * n + col] * reference[col]
            + slope[row * n + col] * node.valueBySlope[e * n + row] * reference[row];
      }
      matrix[offset + i * n + i] += node.c[e * n + row] * column.weight[e * n + row];
    }
  }

  /**
   * Solves for the vertical displacement. O(elements * degree^2), no allocation.
   *
   * @param slopeForce right-hand side on the slope of z at each node, horizontal forces eliminated
   * @param valueForce the same on z
   * @param z          receives the solution
   */
  void solve(double[] slopeForce, double[] valueForce, double[] z) {
    java.util.Arrays.fill(ends, 0.0);
    for (int e = 0; e < elements; e++) {
      load(e, slopeForce, valueForce);
      GeneralElimination.reduce(matrix, e * n * n, n, n - 2, local, e * n);
      ends[e] += local[e * n + n - 2];
      ends[e + 1] += local[e * n + n - 1];
    }
    GeneralTridiagonal.solve(lower, diagonal, upper, first, last, ends);
    ends[0] = first == 1 ? 0.0 : ends[0];
    ends[elements] = column.topFixed ? 0.0 : ends[elements];
    for (int e = 0; e < elements; e++) {
      local[e * n + n - 2] = ends[e];
      local[e * n + n - 1] = ends[e + 1];
      GeneralElimination.extend(matrix, e * n * n, n, n - 2, local, e * n);
      for (int i = 0; i < n; i++) {
        z[e * n + order[i]] = local[e * n + i];
      }
    }
  }

  private void load(int e, double[] slopeForce, double[] valueForce) {
    double[] slope = element.derivative();
    double[] reference = element.weights();
    for (int i = 0; i < n; i++) {
      int row = order[i];
      double sum = column.weight[e * n + row] * valueForce[e * n + row];
      for (int q = 0; q < n; q++) {
        sum += slope[q * n + row] * reference[q] * slopeForce[e * n + q];
      }
      local[e * n + i] = sum;
    }
  }
}
