package org.archspan.stability;

/**
 * Growth at one wavelength.
 *
 * @param wavenumber    along the field, cm^-1
 * @param growthRate    s^-1; 0 where the branch does not grow
 * @param relativeError estimated relative error of the growth rate, dimensionless
 * @param unstableModes number of growing modes of this parity; -1 where a continuum makes it infinite, or where
 *                      there are too many to count
 */
public record GrowthPoint(double wavenumber, double growthRate, double relativeError, int unstableModes) {
  /** Wavelength, cm. */
  public double wavelength() {
    return 2.0 * Math.PI / wavenumber;
  }
}
