package org.archspan.closure;

/**
 * How the gas pressure answers compression: {@code Delta p = -gamma_eff p D}, following a fluid element that cools towards
 * its first temperature at the rate 1/tau (Newtonian cooling):
 * {@code gamma_eff(s) = (gamma s + 1/tau)/(s + 1/tau)}, from gamma where growth is fast to 1 where cooling is.
 *
 * @param adiabaticIndex gamma of the perturbations, dimensionless, positive; at least 1 where the gas cools
 * @param coolingTime    tau, s, positive; infinite: no cooling
 */
public record GasClosure(double adiabaticIndex, double coolingTime) {
  /** Refuses values outside their range. */
  public GasClosure {
    if (!(adiabaticIndex > 0.0) || Double.isInfinite(adiabaticIndex)) {
      throw new IllegalArgumentException("adiabatic index must be positive and finite, found " + adiabaticIndex);
    }
    if (!(coolingTime > 0.0)) {
      throw new IllegalArgumentException("cooling time must be positive, found " + coolingTime);
    }
    if (Double.isFinite(coolingTime) && adiabaticIndex < 1.0) {
      throw new IllegalArgumentException("a gas that cools needs an adiabatic index of at least 1, found "
          + adiabaticIndex + ": with less it would soften as growth rises");
    }
  }

  /** A gas that does not cool. */
  public GasClosure(double adiabaticIndex) {
    this(adiabaticIndex, Double.POSITIVE_INFINITY);
  }

  /** Whether the gas cools. */
  public boolean cools() {
    return Double.isFinite(coolingTime);
  }

  /** The effective index at a growth rate (s^-1), dimensionless. */
  public double index(double growthRate) {
    return cools() ? (adiabaticIndex * growthRate * coolingTime + 1.0) / (growthRate * coolingTime + 1.0)
        : adiabaticIndex;
  }

  /** The least effective index at any growth rate, dimensionless. */
  public double softestIndex() {
    return cools() ? 1.0 : adiabaticIndex;
  }
}
