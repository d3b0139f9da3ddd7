package org.archspan.report;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Locale;
import org.archspan.units.Constants;
import org.archspan.units.OutputUnits;

/** Numbers for people: few digits, and the unit in which they are short. */
public final class Numbers {
  private static final int MOST_DIGITS = 4;

  private Numbers() {
  }

  /** A pure number with four significant digits. */
  public static String plain(double value) {
    return digits(value, MOST_DIGITS);
  }

  /**
   * A number with as many digits as its error leaves, two at least and four at most.
   *
   * @param relativeError estimated, dimensionless
   */
  static String plain(double value, double relativeError) {
    return digits(value, relativeError > 0.0
        ? (int) Math.max(2, Math.min(MOST_DIGITS, Math.ceil(-Math.log10(relativeError)))) : MOST_DIGITS);
  }

  private static String digits(double value, int digits) {
    if (Double.isNaN(value)) {
      return "-";
    }
    if (Double.isInfinite(value)) {
      return "infinite";
    }
    if (value == 0.0) {
      return "0";
    }
    BigDecimal rounded = new BigDecimal(value).round(new MathContext(digits));
    int exponent = rounded.precision() - rounded.scale() - 1;
    if (exponent >= 5 || exponent < -3) {
      return rounded.scaleByPowerOfTen(-exponent).setScale(digits - 1).toPlainString() + "e" + exponent;
    }
    return rounded.setScale(Math.max(0, digits - 1 - exponent)).toPlainString();
  }

  /** A number as it was given, without trailing zeros; dimensionless. */
  public static String given(double value) {
    if (!Double.isFinite(value) || value == 0.0 || Math.abs(value) >= 1e5 || Math.abs(value) < 1e-3) {
      return value == 0.0 ? "0" : plain(value);
    }
    return new BigDecimal(value).round(new MathContext(6)).stripTrailingZeros().toPlainString();
  }

  /**
   * A relative error, dimensionless, rounded up to a power of ten. Nothing below 1e-8 is told apart: no reader needs it, and
   * the JSON document has the digits.
   */
  public static String error(double value) {
    if (Double.isNaN(value)) {
      return "not known";
    }
    return "1e" + (int) Math.max(-8, Math.ceil(Math.log10(Math.max(value, 1e-300)) - 1e-9));
  }

  /** A length (cm) with unit; kiloparsecs where parsecs would be thousands. */
  public static String length(double centimetres, OutputUnits units) {
    return length(centimetres, 0.0, units);
  }

  /** The same with the digits that its relative error (dimensionless) leaves. */
  static String length(double centimetres, double relativeError, OutputUnits units) {
    double value = units.length(centimetres);
    if (units.length().equals("pc") && value >= 999.95 && Double.isFinite(value)) {
      return plain(1e-3 * value, relativeError) + " kpc";
    }
    return plain(value, relativeError) + (Double.isInfinite(value) ? "" : " " + units.length());
  }

  /** A time (s) with unit. */
  public static String time(double seconds, OutputUnits units) {
    return time(seconds, 0.0, units);
  }

  /** The same with the digits that its relative error (dimensionless) leaves. */
  static String time(double seconds, double relativeError, OutputUnits units) {
    return plain(units.time(seconds), relativeError) + " " + units.time();
  }

  /** A growth rate (s^-1) with unit. */
  public static String rate(double perSecond, OutputUnits units) {
    return plain(units.rate(perSecond)) + "/" + units.time();
  }

  /** A growth rate (s^-1) that nothing exceeds, with unit: rounded up, so that it bounds in print too. */
  static String rateBound(double perSecond, OutputUnits units) {
    double value = units.rate(perSecond);
    return value > 0.0 && Double.isFinite(value)
        ? plain(new BigDecimal(value).round(new MathContext(MOST_DIGITS, RoundingMode.CEILING)).doubleValue()) + "/"
            + units.time() : plain(value) + "/" + units.time();
  }

  /** A mass (g) with unit. */
  public static String mass(double grams, OutputUnits units) {
    return plain(units.mass(grams)) + " " + units.mass();
  }

  /** A signed change in per cent. */
  public static String change(double relative) {
    return Double.isNaN(relative) ? "not known" : String.format(Locale.ROOT, "%+.1f per cent", 100.0 * relative);
  }

  /** An angular speed or a frequency of a galaxy, s^-1, in words: {@code 27.00 km/s/kpc}. */
  static String galacticRate(double perSecond) {
    return plain(perSecond * 1e3 * Constants.PARSEC / 1e5) + " km/s/kpc";
  }
}
