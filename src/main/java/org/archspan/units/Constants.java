package org.archspan.units;

/**
 * Physical constants in CGS-Gaussian units.
 *
 * <p>Sources: IAU 2015 Resolution B3 (nominal solar mass parameter and radius, parsec through the astronomical
 * unit), IAU 2012
 * Resolution B2 (astronomical unit), CODATA 2022 (G, k_B, atomic mass constant), Julian year of 365.25 days.
 */
public final class Constants {
  /** Newton's constant, cm^3 g^-1 s^-2 (CODATA 2022: 6.67430(15)e-11 m^3 kg^-1 s^-2). */
  public static final double GRAVITATIONAL_CONSTANT = 6.67430e-8;

  /** Boltzmann's constant, erg K^-1 (exact in the SI since 2019). */
  public static final double BOLTZMANN_CONSTANT = 1.380649e-16;

  /** Atomic mass constant, g (CODATA 2022: 1.66053906892(52)e-27 kg). */
  public static final double ATOMIC_MASS = 1.66053906892e-24;

  /** Mass of a hydrogen atom, g: 1.00782503190 atomic mass constants (AME 2020). */
  public static final double HYDROGEN_MASS = 1.00782503190 * ATOMIC_MASS;

  /** Astronomical unit, cm (IAU 2012 B2, exact). */
  public static final double ASTRONOMICAL_UNIT = 1.495978707e13;

  /** Parsec, cm (IAU 2015 B3: 648000/pi astronomical units). */
  public static final double PARSEC = ASTRONOMICAL_UNIT * 648000.0 / Math.PI;

  /** Mass of the Sun, g: nominal GM (IAU 2015 B3: 1.3271244e20 m^3 s^-2) over G. */
  public static final double SOLAR_MASS = 1.3271244e26 / GRAVITATIONAL_CONSTANT;

  /** Nominal radius of the Sun, cm (IAU 2015 B3, exact). */
  public static final double SOLAR_RADIUS = 6.957e10;

  /** Electronvolt, erg (exact in the SI since 2019). */
  public static final double ELECTRON_VOLT = 1.602176634e-12;

  /** Julian year, s. */
  public static final double YEAR = 365.25 * 86400.0;

  /** One million Julian years, s. */
  public static final double MEGAYEAR = 1e6 * YEAR;

  private Constants() {
  }
}
