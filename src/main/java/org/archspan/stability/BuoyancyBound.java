package org.archspan.stability;

/**
 * Bounds from the integrand alone. Without its own perturbed gravity the form is positive at each height once
 * {@code s^2 + kx^2 v_A^2 >= N = g^2/(gamma p/rho) + g dln(rho)/dz}: nothing grows faster, or at shorter waves.
 *
 * <p>The perturbed gravity releases {@code Integral |grad phi|^2/(4 pi G)}. Since grad phi is a projection of 4 pi G rho xi,
 * that is at most the Jeans frequency squared, {@code omega^2 = 4 pi G rho}, times the inertia: s^2 is at most max N + max
 * omega^2. It is also at most {@code 4 pi G/k^2 Integral rho_1^2}; with that the form is positive at each height once
 * {@code kx^2 >= N/v_A^2 + omega^2/(gamma p/rho)} where N > 0, and once {@code kx^2 >= omega^2 max(rho/(gamma p), h/g)} where
 * N <= 0 (h = -d ln(rho)/dz).
 *
 * <p>Where the field turns, v_A^2 is reduced by the square of the cosine between wave and field.
 *
 * @param growth     no growth rate exceeds this
 * @param wavenumber no wave with a larger kx grows; infinite without field
 */
record BuoyancyBound(double growth, double wavenumber) {
  private static final double ROUNDING = 1e-13;

  static BuoyancyBound of(Atmosphere atmosphere, double gasIndex) {
    double driveSquared = 0.0;
    double jeansSquared = 0.0;
    double wavenumberSquared = 0.0;
    for (int i = 0; i < atmosphere.nodes(); i++) {
      double drive = drive(atmosphere, i, gasIndex);
      driveSquared = Math.max(driveSquared, drive);
      jeansSquared = Math.max(jeansSquared, atmosphere.jeansFrequency[i] * atmosphere.jeansFrequency[i]);
      wavenumberSquared = Math.max(wavenumberSquared, wavenumberSquared(atmosphere, i, gasIndex, drive));
    }
    return new BuoyancyBound(Math.sqrt(driveSquared + jeansSquared), Math.sqrt(wavenumberSquared));
  }

  /** N, or 0 where the gas alone would be stable. */
  private static double drive(Atmosphere atmosphere, int i, double gasIndex) {
    double drive = atmosphere.gravitySquared[i] / (gasIndex * atmosphere.gasPerMass[i]) - atmosphere.fall[i];
    return drive > ROUNDING * Math.abs(atmosphere.fall[i]) ? drive : 0.0;
  }

  private static double wavenumberSquared(Atmosphere atmosphere, int i, double gasIndex, double drive) {
    double stiffness = gasIndex * atmosphere.gasPerMass[i];
    double jeansSquared = atmosphere.jeansFrequency[i] * atmosphere.jeansFrequency[i];
    double compression = jeansSquared == 0.0 ? 0.0 : jeansSquared / stiffness;
    if (drive > 0.0) {
      double h = atmosphere.inverseScaleHeight[i];
      double excess = h < 0.0 && jeansSquared > 0.0 ? drive * (1.0 - stiffness * h / atmosphere.gravity[i]) : drive;
      double share = atmosphere.alongShare[i];
      return excess / (share * share * atmosphere.alfvenSquared[i]) + compression;
    }
    double rise = jeansSquared == 0.0 || atmosphere.gravity[i] == 0.0 ? 0.0
        : jeansSquared * atmosphere.inverseScaleHeight[i] / atmosphere.gravity[i];
    return Math.max(compression, rise);
  }

  BuoyancyBound max(BuoyancyBound other) {
    return new BuoyancyBound(Math.max(growth, other.growth), Math.max(wavenumber, other.wavenumber));
  }
}
