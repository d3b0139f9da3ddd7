package org.archspan.stability;

import org.archspan.equilibrium.Equilibrium;

/**
 * Units in which the eigenproblem is solved, so that its numbers are of order one.
 *
 * @param length scale height, cm
 * @param speed  isothermal speed at the lower end, cm s^-1
 */
record Scales(double length, double speed) {
  static Scales of(Equilibrium equilibrium) {
    return new Scales(equilibrium.scaleHeight(), equilibrium.dispersion());
  }

  /** Crossing time, s. */
  double time() {
    return length / speed;
  }
}
