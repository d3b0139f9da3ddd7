package org.archspan.equilibrium;

import java.util.function.DoubleUnaryOperator;

/**
 * Checks the balance of an equilibrium from its pressures alone, independently of how it was built: over thin slabs
 * the drop of total pressure is compared with the weight between.
 */
public final class ForceBalance {
  private static final int SLABS = 100;

  private ForceBalance() {
  }

  /** Greatest |drop of pressure - weight| / weight over slabs that fill the domain, dimensionless. O(slabs + kinks). */
  public static double residual(Equilibrium equilibrium) {
    double greatest = 0.0;
    for (int i = 0; i < SLABS; i++) {
      greatest = Math.max(greatest, residual(equilibrium, slabEdge(equilibrium, i), slabEdge(equilibrium, i + 1)));
    }
    return greatest;
  }

  private static double slabEdge(Equilibrium equilibrium, int i) {
    return equilibrium.bottom() + (equilibrium.top() - equilibrium.bottom()) * i / SLABS;
  }

  /** The same over one slab between two heights, cm. */
  public static double residual(Equilibrium equilibrium, double from, double to) {
    double reference = equilibrium.at(from).logDensity();
    double drop = pressure(equilibrium.at(from), reference) - pressure(equilibrium.at(to), reference);
    DoubleUnaryOperator weightDensity = z -> {
      GasState state = equilibrium.at(z);
      return Math.exp(state.logDensity() - reference) * state.gravity();
    };
    double weight = 0.0;
    double edge = from;
    // the rule is exact for smooth functions only, so no piece straddles a kink
    for (double kink : equilibrium.kinks()) {
      if (kink > from && kink < to) {
        weight += HeightPanels.integrate(weightDensity, edge, kink);
        edge = kink;
      }
    }
    weight += HeightPanels.integrate(weightDensity, edge, to);
    return Math.abs(drop - weight) / weight;
  }

  private static double pressure(GasState state, double referenceLogDensity) {
    return Math.exp(state.logDensity() - referenceLogDensity)
        * (state.gasPerMass() + state.magneticPerMass() + state.cosmicRayPerMass());
  }
}
