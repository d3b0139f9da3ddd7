package org.archspan.units;

/**
 * The units in which results are given.
 *
 * @param length               name of the unit of length
 * @param centimetresPerLength size of that unit, cm
 * @param time                 name of the unit of time
 * @param secondsPerTime       size of that unit, s
 */
public record OutputUnits(String length, double centimetresPerLength, String time, double secondsPerTime) {
  /** Parsecs and millions of years. */
  public static OutputUnits galactic() {
    return new OutputUnits("pc", Constants.PARSEC, "Myr", Constants.MEGAYEAR);
  }

  /** Megametres and seconds. */
  public static OutputUnits solar() {
    return new OutputUnits("Mm", 1e8, "s", 1.0);
  }

  /**
   * Any unit of length with any unit of time.
   *
   * @throws UnitException when one of them is not such a unit
   */
  public static OutputUnits of(String length, String time) throws UnitException {
    return new OutputUnits(length, factor(length, new Dimension(2, 0, 0, 0), "length"), time,
        factor(time, new Dimension(0, 0, 2, 0), "time"));
  }

  private static double factor(String name, Dimension dimension, String what) throws UnitException {
    Unit unit = UnitParser.parse(name);
    if (!unit.dimension().equals(dimension)) {
      throw new UnitException("\"" + name + "\" is not a unit of " + what);
    }
    return unit.factor();
  }

  /** The same, with kiloparsecs where a length (cm) would be thousands of parsecs. */
  public OutputUnits suiting(double centimetres) {
    boolean large = length.equals("pc") && centimetres > 2e3 * centimetresPerLength;
    return large ? new OutputUnits("kpc", 1e3 * centimetresPerLength, time, secondsPerTime) : this;
  }

  /** Whether lengths are of the size of stars rather than of galaxies. */
  public boolean stellar() {
    return centimetresPerLength < 0.01 * Constants.ASTRONOMICAL_UNIT;
  }

  /** A length (cm) in the unit of the output. */
  public double length(double centimetres) {
    return centimetres / centimetresPerLength;
  }

  /** A time (s) in the unit of the output. */
  public double time(double seconds) {
    return seconds / secondsPerTime;
  }

  /** A growth rate (s^-1) over the inverse of the unit of time, dimensionless. */
  public double rate(double perSecond) {
    return perSecond * secondsPerTime;
  }

  /** A wavenumber (cm^-1) over the inverse of the unit of length, dimensionless. */
  public double wavenumber(double perCentimetre) {
    return perCentimetre * centimetresPerLength;
  }

  /** Unit of mass: Msun among galaxies, g among stars. */
  public String mass() {
    return stellar() ? "g" : "Msun";
  }

  /** A mass (g) in the unit of {@link #mass()}. */
  public double mass(double grams) {
    return stellar() ? grams : grams / Constants.SOLAR_MASS;
  }

  /** Unit of surface density. */
  public String surfaceDensity() {
    return stellar() ? "g/cm^2" : "Msun/pc^2";
  }

  /** A surface density (g cm^-2) in the unit of {@link #surfaceDensity()}. */
  public double surfaceDensity(double gramsPerSquareCentimetre) {
    return stellar() ? gramsPerSquareCentimetre
        : gramsPerSquareCentimetre * Constants.PARSEC * Constants.PARSEC / Constants.SOLAR_MASS;
  }

  /** Unit of field strength. */
  public String field() {
    return stellar() ? "G" : "uG";
  }

  /** A field strength (G) in the unit of {@link #field()}. */
  public double field(double gauss) {
    return stellar() ? gauss : 1e6 * gauss;
  }
}
