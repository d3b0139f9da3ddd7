package org.archspan.shear;

/**
 * Elimination of the horizontal displacements at each node: the form of section "energy principle" (Bernstein et al. 1958)
 * per unit mass with inertia, Coriolis force and tide, reduced to the vertical displacement and its slope.
 *
 * <p>Owns its work arrays: one instance for one thread.
 */
final class NodeElimination {
  /** Coefficients of slope by slope, slope by value, value by slope and value by value of z. */
  final double[] a;
  final double[] slopeByValue;
  final double[] valueBySlope;
  final double[] c;
  /** Stiffness per mass at the s of the last preparation. */
  final double[] stiffness;

  private final ShearingColumn column;
  private final double[] inverse;
  private double ky;

  NodeElimination(ShearingColumn column) {
    this.column = column;
    int nodes = column.nodes();
    a = new double[nodes];
    slopeByValue = new double[nodes];
    valueBySlope = new double[nodes];
    c = new double[nodes];
    stiffness = new double[nodes];
    inverse = new double[4 * nodes];
  }

  /** Fills the coefficients. O(nodes). @return whether the horizontal blocks have positive pivots */
  boolean prepare(double s, double newKy, DiskFlow flow) {
    ky = newKy;
    double kx = column.kx;
    double coriolis = 2.0 * flow.angularSpeed() * s;
    boolean positive = true;
    for (int i = 0; i < a.length; i++) {
      double total = column.stiffness[i];
      for (Relaxation relaxation : column.relaxations) {
        total += relaxation.modulus()[i] * s / (s + relaxation.rate());
      }
      stiffness[i] = total;
      double field = column.alfvenSquared[i];
      double xx = s * s + total * kx * kx;
      double mixed = total * kx * ky;
      double yy = s * s + (total + field) * ky * ky + kx * kx * field + flow.tide();
      double determinant = xx * yy - mixed * mixed + coriolis * coriolis;
      positive &= xx > 0.0 && determinant > 0.0;
      inverse[4 * i] = yy / determinant;
      inverse[4 * i + 1] = (coriolis - mixed) / determinant;
      inverse[4 * i + 2] = -(coriolis + mixed) / determinant;
      inverse[4 * i + 3] = xx / determinant;
      reduce(i, s * s + kx * kx * field + column.gravity[i] * column.inverseScaleHeight[i]);
    }
    return positive;
  }

  private void reduce(int i, double own) {
    double g = column.gravity[i];
    double ux = slopeX(i);
    double uy = slopeY(i);
    double qx = -g * column.kx;
    double qy = -g * ky;
    double slopeSlope = stiffness[i] + column.alfvenSquared[i] - through(i, ux, uy, ux, uy);
    double slopeValue = -g - through(i, ux, uy, qx, qy);
    double valueSlope = -g - through(i, qx, qy, ux, uy);
    double half = 0.5 * column.inverseScaleHeight[i];
    a[i] = slopeSlope;
    slopeByValue[i] = slopeValue + half * slopeSlope;
    valueBySlope[i] = valueSlope + half * slopeSlope;
    c[i] = own - through(i, qx, qy, qx, qy) + half * (slopeValue + valueSlope) + half * half * slopeSlope;
  }

  private double slopeX(int i) {
    return column.kx * stiffness[i];
  }

  private double slopeY(int i) {
    return ky * (stiffness[i] + column.alfvenSquared[i]);
  }

  private double through(int i, double leftX, double leftY, double rightX, double rightY) {
    return leftX * (inverse[4 * i] * rightX + inverse[4 * i + 1] * rightY)
        + leftY * (inverse[4 * i + 2] * rightX + inverse[4 * i + 3] * rightY);
  }

  /** Takes the horizontal forces fx, fy out of the forces on the expansion D - kx X - ky Y and on z, in place. */
  void reduceForces(double[] fx, double[] fy, double[] slopeForce, double[] valueForce) {
    for (int i = 0; i < a.length; i++) {
      double g = column.gravity[i];
      double onSlope = slopeForce[i] - through(i, slopeX(i), slopeY(i), fx[i], fy[i]);
      slopeForce[i] = onSlope;
      valueForce[i] += 0.5 * column.inverseScaleHeight[i] * onSlope
          + g * through(i, column.kx, ky, fx[i], fy[i]);
    }
  }

  /**
   * Recovers the horizontal displacements, in place of their forces.
   *
   * @param expansion z' + z/(2 H) at each node
   */
  void recover(double[] z, double[] expansion, double[] fx, double[] fy) {
    for (int i = 0; i < a.length; i++) {
      double g = column.gravity[i];
      double rx = fx[i] - slopeX(i) * expansion[i] + g * column.kx * z[i];
      double ry = fy[i] - slopeY(i) * expansion[i] + g * ky * z[i];
      fx[i] = inverse[4 * i] * rx + inverse[4 * i + 1] * ry;
      fy[i] = inverse[4 * i + 2] * rx + inverse[4 * i + 3] * ry;
    }
  }
}
