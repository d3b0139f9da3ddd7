package org.archspan.equilibrium;

/**
 * The base state at one height, CGS-Gaussian. Pressures are kept per unit mass, so that nothing underflows high above
 * the disk.
 *
 * @param logDensity          natural logarithm of the density in g cm^-3, dimensionless
 * @param logDensityGradient  d ln(rho)/dz, cm^-1, negative in a stratified disk
 * @param gravity             downward acceleration, cm s^-2
 * @param gasPerMass          p/rho, cm^2 s^-2, positive
 * @param magneticPerMass     p_B/rho, cm^2 s^-2, not negative
 * @param cosmicRayPerMass    p_c/rho, cm^2 s^-2, not negative
 */
public record GasState(double logDensity, double logDensityGradient, double gravity, double gasPerMass,
    double magneticPerMass, double cosmicRayPerMass) {

  /** Density, g cm^-3. */
  public double density() {
    return Math.exp(logDensity);
  }

  /** Gas pressure, erg cm^-3. */
  public double gasPressure() {
    return density() * gasPerMass;
  }

  /** Magnetic pressure B^2/8 pi, erg cm^-3. */
  public double magneticPressure() {
    return density() * magneticPerMass;
  }

  /** Cosmic-ray pressure, erg cm^-3. */
  public double cosmicRayPressure() {
    return density() * cosmicRayPerMass;
  }

  /** Sum of the three pressures, erg cm^-3. */
  public double totalPressure() {
    return density() * (gasPerMass + magneticPerMass + cosmicRayPerMass);
  }

  /** Field strength, G. */
  public double fieldStrength() {
    return Math.sqrt(8.0 * Math.PI * magneticPressure());
  }

  /** Alfven speed, cm s^-1. */
  public double alfvenSpeed() {
    return Math.sqrt(2.0 * magneticPerMass);
  }

  /** Gas over magnetic pressure, dimensionless; infinite without field. */
  public double plasmaBeta() {
    return gasPerMass / magneticPerMass;
  }

  /** Local scale height of the density, cm. */
  public double densityScaleHeight() {
    return -1.0 / logDensityGradient;
  }
}
