package org.archspan.units;

import java.util.Locale;

/**
 * A physical dimension in the Gaussian system. Exponents are doubled, so that the gauss, g^1/2 cm^-1/2 s^-1, is exact.
 *
 * @param length      twice the exponent of length, dimensionless
 * @param mass        twice the exponent of mass
 * @param time        twice the exponent of time
 * @param temperature twice the exponent of temperature
 */
public record Dimension(int length, int mass, int time, int temperature) {
  /** A pure number; angles are pure numbers. */
  public static final Dimension NONE = new Dimension(0, 0, 0, 0);

  /** The dimension of a product. */
  public Dimension times(Dimension other) {
    return new Dimension(length + other.length, mass + other.mass, time + other.time,
        temperature + other.temperature);
  }

  /** The dimension of an integer power. */
  public Dimension power(int exponent) {
    return new Dimension(length * exponent, mass * exponent, time * exponent, temperature * exponent);
  }

  /** In CGS, for messages: {@code g cm^-3}. */
  @Override
  public String toString() {
    if (equals(NONE)) {
      return "a pure number";
    }
    return (part("g", mass) + part("cm", length) + part("s", time) + part("K", temperature)).trim();
  }

  private static String part(String unit, int doubled) {
    if (doubled == 0) {
      return "";
    }
    if (doubled == 2) {
      return unit + " ";
    }
    String exponent = doubled % 2 == 0 ? Integer.toString(doubled / 2) : String.format(Locale.ROOT, "%d/2", doubled);
    return unit + "^" + exponent + " ";
  }
}
