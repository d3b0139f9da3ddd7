package org.archspan.rivals;

import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.GasState;

/**
 * The gas layer as its column sees it, CGS.
 *
 * @param surfaceDensity  g cm^-2
 * @param height          surface density over twice the midplane density, cm
 * @param midplaneDensity g cm^-3
 * @param soundSquared    gamma times gas pressure over density, both summed over the column, cm^2 s^-2
 * @param alfvenSquared   B^2/(4 pi) over density, both summed over the column, cm^2 s^-2
 */
public record LayerMeans(double surfaceDensity, double height, double midplaneDensity, double soundSquared,
    double alfvenSquared) {
  private static final int STEPS = 2000;

  /**
   * Means over an equilibrium.
   *
   * @param adiabaticIndex gamma of the gas, dimensionless
   */
  static LayerMeans of(Equilibrium equilibrium, double adiabaticIndex) {
    double mass = 0.0;
    double sound = 0.0;
    double alfven = 0.0;
    for (int i = 0; i <= STEPS; i++) {
      GasState state = equilibrium.at(equilibrium.bottom()
          + (equilibrium.top() - equilibrium.bottom()) * i / STEPS);
      double weight = state.density() * (i == 0 || i == STEPS ? 0.5 : 1.0);
      mass += weight;
      sound += weight * adiabaticIndex * state.gasPerMass();
      alfven += weight * 2.0 * state.magneticPerMass();
    }
    return new LayerMeans(equilibrium.surfaceDensity(), equilibrium.scaleHeight(),
        equilibrium.at(equilibrium.bottom()).density(), sound / mass, alfven / mass);
  }

  /** The gas alone as a fluid of the plane. */
  public PlaneFluid gas() {
    return new PlaneFluid(surfaceDensity, Math.sqrt(soundSquared), height);
  }

  /**
   * Gas with its field, for waves across the field, which compress both: fast waves of speed
   * {@code sqrt(c^2 + v_A^2)} (Chandrasekhar 1954, ApJ 119, 7; Lynden-Bell 1966, Observatory 86, 57).
   */
  public PlaneFluid gasWithField() {
    return new PlaneFluid(surfaceDensity, Math.sqrt(soundSquared + alfvenSquared), height);
  }
}
