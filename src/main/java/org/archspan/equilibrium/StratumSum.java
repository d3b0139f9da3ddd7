package org.archspan.equilibrium;

import java.util.List;
import org.archspan.disk.GasStratum;

/** The density of several strata known from observation, and its slope, without underflow. */
final class StratumSum {
  private final GasStratum[] strata;

  StratumSum(List<GasStratum> strata) {
    this.strata = strata.toArray(GasStratum[]::new);
  }

  /** ln rho, rho in g cm^-3, at a height in cm. */
  double logDensity(double height) {
    double greatest = greatest(height);
    double sum = 0.0;
    for (GasStratum stratum : strata) {
      sum += Math.exp(logPart(stratum, height) - greatest);
    }
    return greatest + Math.log(sum);
  }

  /** d ln(rho)/dz, cm^-1. */
  double logDensityGradient(double height) {
    double greatest = greatest(height);
    double sum = 0.0;
    double slope = 0.0;
    for (GasStratum stratum : strata) {
      double part = Math.exp(logPart(stratum, height) - greatest);
      sum += part;
      slope += part * logSlope(stratum, height);
    }
    return slope / sum;
  }

  /** Heights of the strata, cm, ascending. */
  double[] landmarks() {
    return java.util.Arrays.stream(strata).mapToDouble(GasStratum::height).sorted().distinct().toArray();
  }

  private double greatest(double height) {
    double greatest = Double.NEGATIVE_INFINITY;
    for (GasStratum stratum : strata) {
      greatest = Math.max(greatest, logPart(stratum, height));
    }
    return greatest;
  }

  private static double logPart(GasStratum stratum, double height) {
    double x = height / stratum.height();
    double fall = switch (stratum.shape()) {
      case GAUSSIAN -> 0.5 * x * x;
      case EXPONENTIAL -> x;
      case SECH2 -> 2.0 * (x + Math.log1p(Math.exp(-2.0 * x)) - Math.log(2.0));
    };
    return Math.log(stratum.bottomDensity()) - fall;
  }

  private static double logSlope(GasStratum stratum, double height) {
    double x = height / stratum.height();
    double slope = switch (stratum.shape()) {
      case GAUSSIAN -> x;
      case EXPONENTIAL -> 1.0;
      case SECH2 -> 2.0 * Math.tanh(x);
    };
    return -slope / stratum.height();
  }
}
