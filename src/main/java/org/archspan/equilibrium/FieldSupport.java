package org.archspan.equilibrium;

import java.util.Locale;
import org.archspan.disk.RefusedModelException;

/** Whether the balance leaves a magnetic pressure that is nowhere negative. */
final class FieldSupport {
  private static final int SAMPLES = 500;

  private FieldSupport() {
  }

  /**
   * Refuses a state whose field would have to be imaginary, with the height at which that begins.
   *
   * @throws RefusedModelException where p_B is negative
   */
  static void require(BalanceStratification state, double bottom, double top) {
    for (int i = 0; i <= SAMPLES; i++) {
      double z = bottom + (top - bottom) * i / SAMPLES;
      GasState here = state.at(z);
      if (here.magneticPerMass() < -1e-12 * here.gasPerMass()) {
        throw new RefusedModelException(String.format(Locale.ROOT, "support runs out at a height of %s: gas and cosmic"
            + " rays already exceed the weight above (their pressure is %.4g of it), so the balance leaves no field"
            + " there; lower gas.dispersion, or raise field.strength at the midplane",
            EquilibriumBuilder.words(i == 0 ? z : firstFailure(state, z - (top - bottom) / SAMPLES, z)),
            (here.gasPerMass() + here.cosmicRayPerMass()) / state.totalPerMass(z)));
      }
    }
  }

  private static double firstFailure(BalanceStratification state, double good, double bad) {
    double low = good;
    double high = bad;
    for (int step = 0; step < 40; step++) {
      double middle = 0.5 * (low + high);
      if (state.at(middle).magneticPerMass() < 0.0) {
        high = middle;
      } else {
        low = middle;
      }
    }
    return high;
  }
}
