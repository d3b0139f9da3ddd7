package org.archspan.rivals;

import org.archspan.units.Constants;

/**
 * What decides whether a disk amplifies waves that differential rotation winds up.
 *
 * <p>Sources: Toomre (1964), ApJ 139, 1217; Julian and Toomre (1966), ApJ 146, 810; Toomre (1981), in The Structure and
 * Evolution of Normal Galaxies, 111.
 */
public final class SwingAmplification {
  private SwingAmplification() {
  }

  /**
   * Longest wave that a disk without pressure lets grow, {@code 4 pi^2 G Sigma/kappa^2}, cm.
   *
   * @param surfaceDensity g cm^-2, positive
   * @param kappa          epicyclic frequency, s^-1, positive
   */
  public static double criticalWavelength(double surfaceDensity, double kappa) {
    return 4.0 * Math.PI * Math.PI * Constants.GRAVITATIONAL_CONSTANT * surfaceDensity / (kappa * kappa);
  }

  /**
   * {@code X = kappa^2 R/(2 pi G Sigma m)}, which is the azimuthal wavelength {@code 2 pi R/m} over the critical one;
   * dimensionless. A flat rotation curve amplifies strongly for X between 1 and 3.
   *
   * @param azimuthalWavelength cm, positive
   * @param surfaceDensity      g cm^-2, positive
   * @param kappa               epicyclic frequency, s^-1, positive
   */
  public static double parameter(double azimuthalWavelength, double surfaceDensity, double kappa) {
    return azimuthalWavelength / criticalWavelength(surfaceDensity, kappa);
  }
}
