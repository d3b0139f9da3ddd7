package org.archspan.rivals;

import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.GasState;

/**
 * Shear of a rotation that lags with height against the buoyancy that resists it: {@code Ri = N^2/V'^2} with
 * {@code N^2 = -g d ln(rho)/dz - g^2/a^2}. Where Ri is 1/4 or more everywhere no wave of the shear grows; growth never
 * exceeds the square root of {@code V'^2/4 - N^2}. Tension of the field is not counted: it could only hold.
 *
 * <p>Sources: Miles (1961), J. Fluid Mech. 10, 496; Howard (1961), J. Fluid Mech. 10, 509; in compressible gas Chimonas
 * (1970), J. Fluid Mech. 43, 833.
 */
public final class ShearRichardson {
  /** Least number that proves stability, dimensionless. */
  public static final double STABLE = 0.25;
  private static final int LEVELS = 400;

  private final Equilibrium equilibrium;
  private final double adiabaticIndex;
  private final double lag;

  /**
   * The shear of an equilibrium.
   *
   * @param adiabaticIndex of the gas, dimensionless, positive
   * @param lag            loss of speed for each unit of height, s^-1, positive
   */
  public ShearRichardson(Equilibrium equilibrium, double adiabaticIndex, double lag) {
    this.equilibrium = equilibrium;
    this.adiabaticIndex = adiabaticIndex;
    this.lag = lag;
  }

  /** Square of the buoyancy frequency of the gas at a height (cm), s^-2; negative where gas alone would overturn. */
  public double buoyancySquared(double height) {
    GasState state = equilibrium.at(height);
    return state.gravity() * (-state.logDensityGradient() - state.gravity() / (adiabaticIndex * state.gasPerMass()));
  }

  /** The number at a height (cm), dimensionless. */
  public double at(double height) {
    return buoyancySquared(height) / (lag * lag);
  }

  /** Least number between bottom and top, dimensionless, on 400 equal steps. */
  public double least() {
    double least = Double.POSITIVE_INFINITY;
    for (int i = 0; i <= LEVELS; i++) {
      least = Math.min(least, at(equilibrium.bottom()
          + (equilibrium.top() - equilibrium.bottom()) * i / LEVELS));
    }
    return least;
  }

  /** Growth rate that no wave of the shear exceeds, s^-1; 0 where all are stable. */
  public double growthBound() {
    return lag * Math.sqrt(Math.max(0.0, STABLE - least()));
  }
}
