package org.archspan.stability;

/**
 * Bounds from the integrand alone: at each height the form is positive once
 * {@code s^2 + kx^2 v_A^2 >= g^2/(gamma p/rho) + g dln(rho)/dz}, so nothing grows faster, or at shorter waves.
 *
 * @param growth     no growth rate exceeds this
 * @param wavenumber no wave with a larger kx grows; infinite without field
 */
record BuoyancyBound(double growth, double wavenumber) {
  static BuoyancyBound of(Atmosphere atmosphere, double gasIndex) {
    double growthSquared = 0.0;
    double wavenumberSquared = 0.0;
    for (int i = 0; i < atmosphere.nodes(); i++) {
      double g = atmosphere.gravity[i];
      double drive = g * g / (gasIndex * atmosphere.gasPerMass[i]) - g * atmosphere.inverseScaleHeight[i];
      if (drive > 1e-13 * g * atmosphere.inverseScaleHeight[i]) {
        growthSquared = Math.max(growthSquared, drive);
        wavenumberSquared = Math.max(wavenumberSquared, drive / atmosphere.alfvenSquared[i]);
      }
    }
    return new BuoyancyBound(Math.sqrt(growthSquared), Math.sqrt(wavenumberSquared));
  }

  BuoyancyBound max(BuoyancyBound other) {
    return new BuoyancyBound(Math.max(growth, other.growth), Math.max(wavenumber, other.wavenumber));
  }
}
