package org.archspan.observe;

import java.util.List;

/**
 * Fits the mixture by expectation and maximisation, the line by weighted orthogonal regression in the plane of azimuth
 * and ln r: scatter of a complex across its arm is an error of both coordinates, and a regression of one on the other
 * would bias the pitch angle. Points far from the arm weigh nothing.
 */
final class ArmRefinement {
  private static final int MOST_STEPS = 200;
  private static final double SETTLED = 1e-12;
  private static final double LEAST_WIDTH = 1e-4;
  private static final double LEAST_STRAYS = 0.01;
  private static final double MOST_STRAYS = 0.5;

  private final List<LogPolarPoint> points;
  private final double[] weight;
  private ArmMixture mixture;

  ArmRefinement(List<LogPolarPoint> points, ArmMixture start) {
    this.points = points;
    this.weight = new double[points.size()];
    this.mixture = start;
  }

  /** Improves the mixture until it settles. O(steps x points). */
  FittedArm fitted() {
    double before = Double.NEGATIVE_INFINITY;
    for (int step = 0; step < MOST_STEPS; step++) {
      improve();
      double now = mixture.logLikelihood(points);
      if (Math.abs(now - before) <= SETTLED * (1.0 + Math.abs(now))) {
        break;
      }
      before = now;
    }
    double[] membership = points.stream().mapToDouble(mixture::membership).toArray();
    return new FittedArm(mixture.spiral(), pitchError(), mixture.width(), mixture.strays(), membership,
        mixture.logLikelihood(points));
  }

  private void improve() {
    double members = 0.0;
    for (int i = 0; i < weight.length; i++) {
      weight[i] = mixture.membership(points.get(i));
      members += weight[i];
    }
    double strays = Math.min(MOST_STRAYS, Math.max(LEAST_STRAYS, 1.0 - members / weight.length));
    LogarithmicSpiral line = line();
    mixture = new ArmMixture(line, width(line, members), strays);
  }

  private double precision(int i) {
    double variance = mixture.width() * mixture.width()
        + points.get(i).varianceAcross(mixture.spiral().pitchAngle());
    return weight[i] / variance;
  }

  private LogarithmicSpiral line() {
    double sum = 0.0;
    double meanAzimuth = 0.0;
    double meanLog = 0.0;
    double[] azimuth = new double[weight.length];
    for (int i = 0; i < weight.length; i++) {
      LogPolarPoint point = points.get(i);
      azimuth[i] = mixture.spiral().unwrapped(point.logRadius(), point.azimuth());
      sum += precision(i);
      meanAzimuth += precision(i) * azimuth[i];
      meanLog += precision(i) * point.logRadius();
    }
    meanAzimuth /= sum;
    meanLog /= sum;
    double difference = 0.0;
    double product = 0.0;
    for (int i = 0; i < weight.length; i++) {
      double da = azimuth[i] - meanAzimuth;
      double dl = points.get(i).logRadius() - meanLog;
      difference += precision(i) * (da * da - dl * dl);
      product += precision(i) * da * dl;
    }
    double pitch = 0.5 * Math.atan2(2.0 * product, difference);
    return new LogarithmicSpiral(pitch, meanLog * Math.cos(pitch) - meanAzimuth * Math.sin(pitch),
        mixture.spiral().referenceRadius());
  }

  /** Scatter across the arm beyond the errors of the positions; two degrees of freedom went into the line. */
  private double width(LogarithmicSpiral line, double members) {
    double sum = 0.0;
    for (int i = 0; i < weight.length; i++) {
      LogPolarPoint point = points.get(i);
      double across = line.across(point.logRadius(), line.unwrapped(point.logRadius(), point.azimuth()));
      sum += weight[i] * (across * across - point.varianceAcross(line.pitchAngle()));
    }
    return Math.sqrt(Math.max(LEAST_WIDTH * LEAST_WIDTH, sum / Math.max(1.0, members - 2.0)));
  }

  private double pitchError() {
    LogarithmicSpiral line = mixture.spiral();
    double sum = 0.0;
    double mean = 0.0;
    double square = 0.0;
    for (int i = 0; i < weight.length; i++) {
      LogPolarPoint point = points.get(i);
      double azimuth = line.unwrapped(point.logRadius(), point.azimuth());
      double along = azimuth * Math.cos(line.pitchAngle()) + point.logRadius() * Math.sin(line.pitchAngle());
      sum += precision(i);
      mean += precision(i) * along;
      square += precision(i) * along * along;
    }
    return 1.0 / Math.sqrt(square - mean * mean / sum);
  }
}
