package org.archspan.rivals;

/**
 * One fluid of a disk as its instability in the plane sees it.
 *
 * @param surfaceDensity g cm^-2, positive
 * @param speed          speed that compression in the plane answers with: of sound, of fast waves, or the radial
 *                       dispersion of stars; cm s^-1, positive
 * @param height         surface density over twice the midplane density, cm; 0 for a sheet without thickness
 */
public record PlaneFluid(double surfaceDensity, double speed, double height) {
  /** Refuses values out of their range. */
  public PlaneFluid {
    if (!(surfaceDensity > 0.0 && speed > 0.0 && height >= 0.0)) {
      throw new IllegalArgumentException("a fluid of the disk needs surface density and speed above 0 and a height of 0 or"
          + " more, found " + surfaceDensity + ", " + speed + ", " + height);
    }
  }

  /** The same fluid without thickness. */
  public PlaneFluid thin() {
    return new PlaneFluid(surfaceDensity, speed, 0.0);
  }

  /**
   * Factor by which thickness weakens the gravity of a wave at the midplane, {@code 1/(1 + k h)}, dimensionless: exact for
   * a density that falls as {@code exp(-|z|/h)}.
   *
   * <p>Source: Toomre (1964), ApJ 139, 1217; Romeo (1992), MNRAS 256, 307.
   *
   * @param wavenumber k, cm^-1, not negative
   */
  double thicknessFactor(double wavenumber) {
    return 1.0 / (1.0 + wavenumber * height);
  }
}
