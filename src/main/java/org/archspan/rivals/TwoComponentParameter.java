package org.archspan.rivals;

import org.archspan.units.Constants;

/**
 * The approximate stability parameter of gas with stars, thickness included:
 * {@code 1/Q = W/(T_s Q_s) + 1/(T_g Q_g)} where {@code T_s Q_s >= T_g Q_g}, otherwise with the W on the gas;
 * {@code W = 2 c_s c_g/(c_s^2 + c_g^2)}, T = 1.5 for a dispersion that is the same in all directions.
 *
 * <p>Source: Romeo and Wiegert (2011), MNRAS 416, 1191.
 */
public final class TwoComponentParameter {
  private static final double THICKNESS = 1.5;

  private TwoComponentParameter() {
  }

  /**
   * Toomre's {@code Q = kappa c/(pi G Sigma)} of one thin fluid, dimensionless.
   *
   * @param kappa epicyclic frequency, s^-1, not negative
   */
  public static double toomre(PlaneFluid fluid, double kappa) {
    return kappa * fluid.speed() / (Math.PI * Constants.GRAVITATIONAL_CONSTANT * fluid.surfaceDensity());
  }

  /**
   * The parameter, dimensionless.
   *
   * @param kappa epicyclic frequency, s^-1, not negative
   */
  public static double thick(PlaneFluid gas, PlaneFluid stars, double kappa) {
    double ofGas = THICKNESS * toomre(gas, kappa);
    double ofStars = THICKNESS * toomre(stars, kappa);
    double weight = 2.0 * gas.speed() * stars.speed() / (gas.speed() * gas.speed() + stars.speed() * stars.speed());
    return 1.0 / (weight / Math.max(ofGas, ofStars) + 1.0 / Math.min(ofGas, ofStars));
  }
}
