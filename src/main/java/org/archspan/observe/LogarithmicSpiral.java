package org.archspan.observe;

/**
 * A logarithmic spiral, {@code r = R exp(phi tan p)}. In the plane of azimuth and ln r it is a straight line, and since
 * {@code ds^2 = r^2 (dphi^2 + d(ln r)^2)}, distances there are distances over the radius.
 *
 * @param pitchAngle      p, rad; positive where the radius grows with azimuth, not 0
 * @param offset          distance of the straight line from the origin, dimensionless; on it
 *                        {@code ln(r/referenceRadius) cos p - phi sin p} has this value
 * @param referenceRadius any length, positive, cm
 */
public record LogarithmicSpiral(double pitchAngle, double offset, double referenceRadius) {
  /** Radius at an azimuth (rad, any turn), cm. */
  public double radius(double azimuth) {
    return referenceRadius * Math.exp((offset + azimuth * Math.sin(pitchAngle)) / Math.cos(pitchAngle));
  }

  /**
   * Signed distance of a point from the spiral over its radius, dimensionless, for an azimuth (rad) of the right
   * turn.
   */
  double across(double logRadius, double azimuth) {
    return logRadius * Math.cos(pitchAngle) - azimuth * Math.sin(pitchAngle) - offset;
  }

  /** The azimuth (rad) of the turn on which the spiral comes closest to a point. */
  double unwrapped(double logRadius, double azimuth) {
    double turns = Math.rint(across(logRadius, azimuth) / (2.0 * Math.PI * Math.sin(pitchAngle)));
    return azimuth + 2.0 * Math.PI * turns;
  }

  /** Radius of the point of the spiral that is closest to a point, cm. */
  double footRadius(double logRadius, double azimuth) {
    return referenceRadius * Math.exp(logRadius - across(logRadius, azimuth) * Math.cos(pitchAngle));
  }

  /** The spiral of another pitch angle (rad) that lies farther out by so much in ln r at an azimuth (rad). */
  LogarithmicSpiral redrawn(double pitch, double azimuth, double outward) {
    double logRadius = outward + (offset + azimuth * Math.sin(pitchAngle)) / Math.cos(pitchAngle);
    return new LogarithmicSpiral(pitch, logRadius * Math.cos(pitch) - azimuth * Math.sin(pitch), referenceRadius);
  }

  /** Arc length between two radii (cm), positive outward, cm. */
  public double arcLength(double innerRadius, double outerRadius) {
    return (outerRadius - innerRadius) / Math.abs(Math.sin(pitchAngle));
  }
}
