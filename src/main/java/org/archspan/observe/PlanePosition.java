package org.archspan.observe;

/**
 * A complex in the plane of the disk, with the centre as origin.
 *
 * @param x      distance along the line of nodes, cm
 * @param y      distance across it, a quarter turn on in the direction of position angles, cm
 * @param errorX standard error of x, cm; 0 where it is not known
 * @param errorY standard error of y, cm; 0 where it is not known
 */
public record PlanePosition(double x, double y, double errorX, double errorY) {
  /** Distance from the centre, cm. */
  public double radius() {
    return Math.hypot(x, y);
  }

  /** Angle from the line of nodes, -pi to pi, rad. */
  public double azimuth() {
    return Math.atan2(y, x);
  }
}
