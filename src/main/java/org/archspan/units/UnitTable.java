package org.archspan.units;

import java.util.Map;
import java.util.TreeMap;

/** The named units. */
final class UnitTable {
  private static final Map<String, Unit> UNITS = units();

  private UnitTable() {
  }

  static Map<String, Unit> all() {
    return UNITS;
  }

  private static Map<String, Unit> units() {
    Map<String, Unit> units = new TreeMap<>();
    Dimension length = new Dimension(2, 0, 0, 0);
    Dimension mass = new Dimension(0, 2, 0, 0);
    Dimension time = new Dimension(0, 0, 2, 0);
    put(units, length, "cm", 1.0, "m", 1e2, "km", 1e5, "Mm", 1e8, "Rsun", Constants.SOLAR_RADIUS, "au",
        Constants.ASTRONOMICAL_UNIT, "pc", Constants.PARSEC, "kpc", 1e3 * Constants.PARSEC, "Mpc", 1e6 * Constants.PARSEC);
    put(units, mass, "g", 1.0, "kg", 1e3, "Msun", Constants.SOLAR_MASS);
    put(units, time, "s", 1.0, "min", 60.0, "h", 3600.0, "d", 86400.0, "yr", Constants.YEAR, "kyr",
        1e3 * Constants.YEAR, "Myr", Constants.MEGAYEAR, "Gyr", 1e9 * Constants.YEAR);
    put(units, new Dimension(-1, 1, -2, 0), "G", 1.0, "kG", 1e3, "mG", 1e-3, "uG", 1e-6, "\u00b5G", 1e-6, "\u03bcG",
        1e-6, "nG", 1e-9);
    put(units, new Dimension(0, 0, 0, 2), "K", 1.0, "kK", 1e3, "MK", 1e6);
    put(units, new Dimension(2, 2, -4, 0), "dyn", 1.0);
    put(units, new Dimension(4, 2, -4, 0), "erg", 1.0, "eV", Constants.ELECTRON_VOLT);
    put(units, Dimension.NONE, "rad", 1.0, "deg", Math.PI / 180.0, "arcmin", Math.PI / 10_800.0,
        "arcsec", Math.PI / 648_000.0, "mas", Math.PI / 6.48e8);
    return Map.copyOf(units);
  }

  private static void put(Map<String, Unit> units, Dimension dimension, Object... namesAndFactors) {
    for (int i = 0; i < namesAndFactors.length; i += 2) {
      units.put((String) namesAndFactors[i], new Unit((Double) namesAndFactors[i + 1], dimension));
    }
  }
}
