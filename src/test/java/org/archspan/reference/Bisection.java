package org.archspan.reference;

import java.util.function.DoubleUnaryOperator;

/** The slowest and safest root finder. */
final class Bisection {
  private Bisection() {
  }

  /** Root of a function of opposite signs at both ends, to the last bit; unit of the argument. */
  static double root(DoubleUnaryOperator function, double low, double high) {
    double sign = Math.signum(function.applyAsDouble(low));
    double a = low;
    double b = high;
    for (double middle = 0.5 * (a + b); middle != a && middle != b; middle = 0.5 * (a + b)) {
      if (Math.signum(function.applyAsDouble(middle)) == sign) {
        a = middle;
      } else {
        b = middle;
      }
    }
    return 0.5 * (a + b);
  }
}
