package org.archspan.gravity;

import org.archspan.units.Constants;

/**
 * Gravity of an isothermal stellar sheet, {@code g = 2 pi G Sigma tanh(z/h)}, {@code h = sigma^2/(pi G Sigma)}.
 *
 * <p>Source: Spitzer (1942), ApJ 95, 329.
 *
 * @param surfaceDensity Sigma of the stars, g cm^-2, positive
 * @param dispersion vertical velocity dispersion sigma of the stars, cm s^-1, positive
 */
public record IsothermalSheetGravity(double surfaceDensity, double dispersion) implements GravityLaw {
  /** Refuses inputs outside their range. */
  public IsothermalSheetGravity {
    LawInput.requirePositive("surface-density", surfaceDensity);
    LawInput.requirePositive("dispersion", dispersion);
  }

  private double strength() {
    return 2.0 * Math.PI * Constants.GRAVITATIONAL_CONSTANT * surfaceDensity;
  }

  /** Height h of the stars' sech^2 law, cm. */
  public double height() {
    return dispersion * dispersion / (Math.PI * Constants.GRAVITATIONAL_CONSTANT * surfaceDensity);
  }

  @Override
  public double acceleration(double z) {
    return strength() * Math.tanh(z / height());
  }

  @Override
  public double potential(double z) {
    return strength() * height() * LogCosh.of(z / height());
  }

  @Override
  public double[] landmarks() {
    return new double[] {height()};
  }
}
