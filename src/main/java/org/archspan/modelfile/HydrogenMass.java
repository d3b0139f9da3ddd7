package org.archspan.modelfile;

import org.archspan.units.Constants;

/** Mass of gas for each hydrogen nucleus, helium included. */
final class HydrogenMass {
  /** Common practice: 1.4 hydrogen masses at solar helium abundance. */
  static final double STANDARD = 1.4;
  private static final String KEY = "gas.mass-per-hydrogen";

  private HydrogenMass() {
  }

  /** Whether a key of the file decides it, whole or as part of an uncertain value. */
  static boolean decidedBy(String key) {
    return key.equals(KEY) || key.startsWith(KEY + ".");
  }

  /** In g, once the keys that decide it are read. */
  static double perNucleus(Inputs inputs) {
    return inputs.number(KEY).orElse(STANDARD) * Constants.HYDROGEN_MASS;
  }
}
