package org.archspan.modelfile;

import org.archspan.units.Constants;

/** Mass of gas for each hydrogen nucleus, helium included. */
final class HydrogenMass {
  /** Common practice: 1.4 hydrogen masses at solar helium abundance. */
  static final double STANDARD = 1.4;
  private static final String KEY = "gas.mass-per-hydrogen";

  private HydrogenMass() {
  }

  /** In g. */
  static double perNucleus(Inputs inputs) {
    Entry entry = inputs.entry(KEY);
    Object given = entry == null ? null : entry.value();
    double masses = given instanceof Long whole ? whole.doubleValue() : given instanceof Double real ? real : STANDARD;
    return masses * Constants.HYDROGEN_MASS;
  }
}
