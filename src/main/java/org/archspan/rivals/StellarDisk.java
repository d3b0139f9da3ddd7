package org.archspan.rivals;

/**
 * The stars beside the gas.
 *
 * @param surfaceDensity g cm^-2, positive
 * @param dispersion     along the radius, cm s^-1, positive
 * @param height         surface density over twice the midplane density, cm, positive
 */
public record StellarDisk(double surfaceDensity, double dispersion, double height) {
  /** As a fluid of the plane: its radial dispersion takes the place of the speed of sound. */
  public PlaneFluid fluid() {
    return new PlaneFluid(surfaceDensity, dispersion, height);
  }
}
