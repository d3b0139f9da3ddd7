package org.archspan.observe;

/**
 * A complex in the plane of azimuth and logarithm of radius.
 *
 * @param logRadius ln(r/reference), dimensionless
 * @param azimuth   -pi to pi, rad
 * @param position  where it is in the disk
 */
record LogPolarPoint(double logRadius, double azimuth, PlanePosition position) {
  /** Variance of its distance from a line of pitch angle p (rad), in units of the squared radius, dimensionless. */
  double varianceAcross(double pitchAngle) {
    double normalX = Math.sin(azimuth + pitchAngle);
    double normalY = -Math.cos(azimuth + pitchAngle);
    double radius = position.radius();
    return (Math.pow(normalX * position.errorX(), 2) + Math.pow(normalY * position.errorY(), 2)) / (radius * radius);
  }
}
