package org.archspan.units;

import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Reads composite units such as {@code km/s/kpc}, {@code g/cm^3}, {@code 1/Myr}, {@code cm^-3}. Division binds to the one
 * factor that follows and goes left to right, as astronomers write it: {@code km/s/kpc} is km s^-1 kpc^-1. Products are
 * written with a space, {@code *} or a dot, powers with {@code ^}, {@code **} or nothing ({@code km s-1}, as in tables).
 */
public final class UnitParser {
  private static final Pattern FACTOR =
      Pattern.compile("\\G\\s*([/*.]?)\\s*(1(?![-0-9])|[A-Za-z\u00b5\u03bc]+)(?:(?:\\^|\\*\\*)?(-?[0-9]{1,2}))?");
  private static final int LONGEST = 100;

  private UnitParser() {
  }

  /**
   * The unit that a text names.
   *
   * @throws UnitException when it names none, with the nearest known name
   */
  public static Unit parse(String text) throws UnitException {
    if (text.length() > LONGEST) {
      throw new UnitException("a unit of " + text.length() + " characters is too long to be one");
    }
    Unit unit = Unit.ONE;
    Matcher matcher = FACTOR.matcher(text);
    int end = 0;
    while (end < text.length() && matcher.find()) {
      int exponent = matcher.group(3) == null ? 1 : Integer.parseInt(matcher.group(3));
      Unit factor = matcher.group(2).equals("1") ? Unit.ONE : named(matcher.group(2));
      unit = unit.times(factor.power(matcher.group(1).equals("/") ? -exponent : exponent));
      end = matcher.end();
    }
    if (end == 0 || !text.substring(end).isBlank()) {
      throw new UnitException("\"" + text + "\" is not a unit; units look like km/s, cm^-3, Msun/pc^2, km/s/kpc");
    }
    return unit;
  }

  private static Unit named(String name) throws UnitException {
    Map<String, Unit> units = UnitTable.all();
    Unit unit = units.get(name);
    if (unit == null) {
      String hint = NearestName.of(name, units.keySet()).map(near -> "; did you mean " + near + "?").orElse("");
      throw new UnitException("\"" + name + "\" is not a known unit" + hint);
    }
    return unit;
  }
}
