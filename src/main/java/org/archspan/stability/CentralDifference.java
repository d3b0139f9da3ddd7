package org.archspan.stability;

/**
 * A derivative from values at two steps on either side, of fourth order.
 *
 * @param value of the derivative, in the unit of the values over that of the step
 * @param error estimated, in the same unit
 */
record CentralDifference(double value, double error) {
  /** Error of fourth order over the square of that of second order, relative, for tanh at 0: (16/30)/(1/3)^2. */
  private static final double TANH = 4.8;

  /** Number of values. */
  static final int VALUES = 4;

  /** Steps from the middle at which value {@code i} is taken: -2, -1, 1, 2; dimensionless. */
  static int step(int i) {
    return i < 2 ? i - 2 : i - 1;
  }

  /**
   * The derivative.
   *
   * @param values at -2, -1, 1 and 2 steps
   * @param step   positive
   */
  static CentralDifference of(double[] values, double step) {
    double narrow = (values[2] - values[1]) / (2.0 * step);
    double wide = (values[3] - values[0]) / (4.0 * step);
    double value = (4.0 * narrow - wide) / 3.0;
    // the next order follows from this one as for a hyperbolic tangent, the sharpest bend of the layers
    double bend = Math.abs(narrow - value);
    double rounding = 1e-15 * Math.max(Math.abs(values[0]), Math.abs(values[3])) / step;
    return new CentralDifference(value,
        TANH * bend * bend / Math.max(Math.abs(value), Math.max(bend, 1e-300)) + rounding);
  }
}
