package org.archspan.closure;

/**
 * How the gas pressure answers compression: {@code Delta p = -gamma p D}, following a fluid element.
 *
 * @param adiabaticIndex gamma of the perturbations, dimensionless, positive
 */
public record GasClosure(double adiabaticIndex) {
  /** Refuses an index that is not positive. */
  public GasClosure {
    if (!(adiabaticIndex > 0.0) || Double.isInfinite(adiabaticIndex)) {
      throw new IllegalArgumentException("adiabatic index must be positive and finite, found " + adiabaticIndex);
    }
  }
}
