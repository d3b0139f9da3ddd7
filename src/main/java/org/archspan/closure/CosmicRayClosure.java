package org.archspan.closure;

/**
 * How the cosmic-ray pressure answers compression while cosmic rays diffuse along the field:
 * {@code Delta p_c = -gamma_c s/(s + kappa k_par^2) p_c D}.
 *
 * <p>kappa = 0 is the adiabatic gas of cosmic rays; kappa infinite is the closure of Parker (1966), ApJ 145, 811.
 *
 * @param adiabaticIndex gamma_c, dimensionless, not negative (4/3 for relativistic particles)
 * @param diffusivity    kappa along the field, cm^2 s^-1, not negative, may be infinite
 */
public record CosmicRayClosure(double adiabaticIndex, double diffusivity) {
  /** Refuses values outside their range. */
  public CosmicRayClosure {
    if (!(adiabaticIndex >= 0.0) || Double.isInfinite(adiabaticIndex)) {
      throw new IllegalArgumentException("cosmic-ray index must be finite and not negative, found " + adiabaticIndex);
    }
    if (!(diffusivity >= 0.0)) {
      throw new IllegalArgumentException("cosmic-ray diffusivity must not be negative, found " + diffusivity);
    }
  }

  /** Whether they diffuse, but not at once: slow growth then finds them softer than fast growth. */
  public boolean leaks() {
    return diffusivity > 0.0 && diffusivity < Double.POSITIVE_INFINITY;
  }

  /** Cosmic rays without pressure response: Parker's closure. */
  public static CosmicRayClosure instantDiffusion() {
    return new CosmicRayClosure(4.0 / 3.0, Double.POSITIVE_INFINITY);
  }
}
