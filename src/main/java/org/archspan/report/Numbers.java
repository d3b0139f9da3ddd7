package org.archspan.report;

import java.util.Locale;
import org.archspan.units.OutputUnits;

/** Numbers for people: few digits, and the unit in which they are short. */
public final class Numbers {
  private Numbers() {
  }

  /** A pure number with four significant digits. */
  public static String plain(double value) {
    if (Double.isNaN(value)) {
      return "-";
    }
    if (Double.isInfinite(value)) {
      return "infinite";
    }
    if (value == 0.0) {
      return "0";
    }
    double size = Math.abs(value);
    if (size >= 1e5 || size < 1e-3) {
      return String.format(Locale.ROOT, "%.3e", value).replace("e+0", "e").replace("e+", "e").replace("e-0", "e-");
    }
    int decimals = (int) Math.max(0, 3 - Math.floor(Math.log10(size)));
    return String.format(Locale.ROOT, "%." + decimals + "f", value);
  }

  /** A number as it was given, without trailing zeros; dimensionless. */
  public static String given(double value) {
    if (!Double.isFinite(value) || value == 0.0 || Math.abs(value) >= 1e5 || Math.abs(value) < 1e-3) {
      return value == 0.0 ? "0" : plain(value);
    }
    return new java.math.BigDecimal(value).round(new java.math.MathContext(6)).stripTrailingZeros().toPlainString();
  }

  /** A relative error, dimensionless, rounded up to a power of ten; nothing below 1e-12 is told apart. */
  public static String error(double value) {
    if (Double.isNaN(value)) {
      return "not known";
    }
    return "1e" + (int) Math.max(-12, Math.ceil(Math.log10(Math.max(value, 1e-300)) - 1e-9));
  }

  /** A length (cm) with unit; kiloparsecs where parsecs would be thousands. */
  public static String length(double centimetres, OutputUnits units) {
    double value = units.length(centimetres);
    if (units.length().equals("pc") && value >= 1e3 && Double.isFinite(value)) {
      return plain(1e-3 * value) + " kpc";
    }
    return plain(value) + (Double.isInfinite(value) ? "" : " " + units.length());
  }

  /** A time (s) with unit. */
  public static String time(double seconds, OutputUnits units) {
    return plain(units.time(seconds)) + " " + units.time();
  }

  /** A growth rate (s^-1) with unit. */
  public static String rate(double perSecond, OutputUnits units) {
    return plain(units.rate(perSecond)) + "/" + units.time();
  }

  /** A mass (g) with unit. */
  public static String mass(double grams, OutputUnits units) {
    return plain(units.mass(grams)) + " " + units.mass();
  }

  /** A signed change in per cent. */
  public static String change(double relative) {
    return Double.isNaN(relative) ? "not known" : String.format(Locale.ROOT, "%+.1f per cent", 100.0 * relative);
  }
}
