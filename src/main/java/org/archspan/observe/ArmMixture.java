package org.archspan.observe;

import java.util.List;

/**
 * Complexes as a mixture: most scatter about a spiral with a normal distribution, the others have any azimuth. The
 * likelihood is that of the azimuths at the given radii, so that spirals of different pitch are compared fairly: a
 * tight one, which passes close to every point, pays for it by {@code sin p}.
 *
 * @param spiral the arm
 * @param width  scatter across the arm over the radius, positive, dimensionless
 * @param strays fraction of complexes off the arm, 0 to 1, dimensionless
 */
record ArmMixture(LogarithmicSpiral spiral, double width, double strays) {
  /** Probability density of an azimuth on the arm over that of one anywhere, dimensionless. */
  private double contrast(LogPolarPoint point) {
    double azimuth = spiral.unwrapped(point.logRadius(), point.azimuth());
    double across = spiral.across(point.logRadius(), azimuth);
    double variance = width * width + point.varianceAcross(spiral.pitchAngle());
    return Math.sqrt(2.0 * Math.PI / variance) * Math.abs(Math.sin(spiral.pitchAngle()))
        * Math.exp(-0.5 * across * across / variance);
  }

  /** Probability that a complex belongs to the arm, dimensionless. */
  double membership(LogPolarPoint point) {
    double onArm = (1.0 - strays) * contrast(point);
    return onArm / (onArm + strays);
  }

  /** Logarithm of the likelihood over that of random azimuths, dimensionless. */
  double logLikelihood(List<LogPolarPoint> points) {
    double sum = 0.0;
    for (LogPolarPoint point : points) {
      sum += Math.log((1.0 - strays) * contrast(point) + strays);
    }
    return sum;
  }
}
