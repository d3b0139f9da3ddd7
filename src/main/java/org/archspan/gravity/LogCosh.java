package org.archspan.gravity;

/** ln cosh without overflow, and without cancellation near zero. */
final class LogCosh {
  private LogCosh() {
  }

  /** ln cosh x, dimensionless, for x at least 0. */
  static double of(double x) {
    if (x < 0.5) {
      double s = Math.sinh(0.5 * x);
      return Math.log1p(2.0 * s * s);
    }
    return x + Math.log1p(Math.exp(-2.0 * x)) - Math.log(2.0);
  }
}
