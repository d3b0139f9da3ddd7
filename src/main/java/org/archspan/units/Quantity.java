package org.archspan.units;

import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A number with its dimension.
 *
 * @param value     in the CGS unit of the dimension; finite
 * @param dimension its dimension
 */
public record Quantity(double value, Dimension dimension) {
  private static final Pattern NUMBER =
      Pattern.compile("\\s*([-+]?(?:[0-9][0-9_]*\\.?[0-9]*|\\.[0-9]+)(?:[eE][-+]?[0-9]{1,6})?)\\s*(.*?)\\s*");
  private static final int LONGEST = 200;

  /**
   * Reads {@code "6.4 km/s"}.
   *
   * @throws UnitException when the text is not a finite number with a known unit
   */
  public static Quantity parse(String text) throws UnitException {
    Matcher matcher = NUMBER.matcher(text);
    if (text.length() > LONGEST || !matcher.matches()) {
      throw new UnitException("\"" + shortened(text) + "\" is not a number with a unit, such as \"6.4 km/s\"");
    }
    double number = Double.parseDouble(matcher.group(1).replace("_", ""));
    Unit unit = matcher.group(2).isEmpty() ? Unit.ONE : UnitParser.parse(matcher.group(2));
    double value = number * unit.factor();
    if (!Double.isFinite(value)) {
      throw new UnitException("\"" + shortened(text) + "\" is larger than any number the computer holds");
    }
    return new Quantity(value, unit.dimension());
  }

  /** The unit that follows the number of a text, as written; empty where there is none, or no number. */
  public static String unitOf(String text) {
    Matcher matcher = NUMBER.matcher(text);
    return text.length() <= LONGEST && matcher.matches() ? matcher.group(2) : "";
  }

  private static String shortened(String text) {
    return text.length() <= 60 ? text : text.substring(0, 57) + "...";
  }
}
