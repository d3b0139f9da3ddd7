package org.archspan.modelfile;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.List;
import org.archspan.comparison.VariedInput;
import org.archspan.units.NearestName;
import org.archspan.units.Quantity;
import org.archspan.units.UnitException;

/** Reads {@code KEY=v1,v2,...}, {@code KEY=from:to:n} and {@code KEY=log:from:to:n}. */
public final class VariedInputReader {
  /** More values of one input than anyone compares. */
  private static final int MOST_VALUES = 10_000;
  /** Digits by which values that fill a range differ: 1.1 stays 1.1, and tables stay narrow. */
  private static final int DIGITS = 6;
  private static final String LOGARITHMIC = "log:";

  private VariedInputReader() {
  }

  /**
   * Reads a text.
   *
   * @throws IllegalArgumentException when it is none of the three, or no model has such a key; the message says what
   *                                  is wrong
   */
  public static VariedInput read(String text) {
    int equals = text.indexOf('=');
    if (equals <= 0 || text.substring(equals + 1).isBlank()) {
      throw new IllegalArgumentException("\"" + text + "\" is not KEY=v1,v2,... or KEY=from:to:n or KEY=log:from:to:n");
    }
    String key = text.substring(0, equals).strip();
    requireKnown(key);
    String values = text.substring(equals + 1).strip();
    return values.contains(":") ? range(key, values) : list(key, values);
  }

  private static void requireKnown(String key) {
    if (Schema.of(key).isEmpty()) {
      List<String> known = Schema.all().stream().map(KeySpec::key).toList();
      throw new IllegalArgumentException("\"" + key + "\" is not a key of the model file" + NearestName
          .of(Schema.pattern(key), known).map(near -> "; did you mean " + near.replace(".#", "") + "?").orElse(""));
    }
  }

  private static VariedInput list(String key, String text) {
    List<String> values = new ArrayList<>();
    for (String value : text.split(",", -1)) {
      if (value.isBlank() || values.contains(value.strip())) {
        throw new IllegalArgumentException(key + "=" + text + " holds " + (value.isBlank() ? "an empty value"
            : value.strip() + " twice"));
      }
      values.add(value.strip());
    }
    if (values.size() > MOST_VALUES) {
      throw new IllegalArgumentException(key + " has " + values.size() + " values; at most " + MOST_VALUES);
    }
    return numbered(key, values);
  }

  /** With numbers in the unit of the first value, where all values are numbers of one dimension. */
  private static VariedInput numbered(String key, List<String> values) {
    String unit = Quantity.unitOf(values.get(0));
    List<Double> numbers = new ArrayList<>();
    try {
      for (String value : values) {
        numbers.add(in(unit, value));
      }
      return new VariedInput(key, List.copyOf(values), List.copyOf(numbers), unit);
    } catch (UnitException words) {
      return new VariedInput(key, List.copyOf(values), List.of(), "");
    }
  }

  private static double in(String unit, String text) throws UnitException {
    Quantity quantity = Quantity.parse(text);
    Quantity one = Quantity.parse(unit.isEmpty() ? "1" : "1 " + unit);
    if (!quantity.dimension().equals(one.dimension())) {
      throw new UnitException("\"" + text + "\" cannot be given in " + (unit.isEmpty() ? "pure numbers" : unit));
    }
    // divided by hand where the unit is its own: 3 uG is 3 uG to the last digit
    return Quantity.unitOf(text).equals(unit) ? Double.parseDouble(
        text.substring(0, text.length() - unit.length()).strip()
        .replace("_", "")) : quantity.value() / one.value();
  }

  private static VariedInput range(String key, String text) {
    boolean logarithmic = text.startsWith(LOGARITHMIC);
    String[] parts = (logarithmic ? text.substring(LOGARITHMIC.length()) : text).split(":", -1);
    if (parts.length != 3) {
      throw new IllegalArgumentException(key + "=" + text + ": a range is from:to:n or log:from:to:n, such as"
          + " field.strength=log:0.1uG:10uG:20");
    }
    int count = count(key, parts[2].strip());
    String unit = Quantity.unitOf(parts[0].strip());
    try {
      double from = in(unit, parts[0].strip());
      double to = in(unit, parts[1].strip());
      if (from == to || logarithmic && !(from > 0.0 && to > 0.0)) {
        throw new IllegalArgumentException(key + "=" + text + (from == to ? ": the ends of a range must differ"
            : ": the ends of a logarithmic range must be greater than 0"));
      }
      return filled(key, unit, count, from, to, logarithmic);
    } catch (UnitException fault) {
      throw new IllegalArgumentException(key + "=" + text + ": " + fault.getMessage(), fault);
    }
  }

  private static int count(String key, String text) {
    int count = text.matches("[0-9]{1,6}") ? Integer.parseInt(text) : 0;
    if (count < 2 || count > MOST_VALUES) {
      throw new IllegalArgumentException(key + ": found " + text + " values; allowed is 2 to " + MOST_VALUES);
    }
    return count;
  }

  private static VariedInput filled(String key, String unit, int count, double from, double to, boolean logarithmic) {
    List<String> values = new ArrayList<>();
    List<Double> numbers = new ArrayList<>();
    double step = Math.abs(to - from) / (count - 1) / Math.max(Math.abs(from), Math.abs(to));
    int more = (int) Math.max(0.0, Math.ceil(-2.0 - Math.log10(step)));
    MathContext digits = new MathContext(Math.min(16, DIGITS + more));
    for (int i = 0; i < count; i++) {
      double share = (double) i / (count - 1);
      double exact = i == 0 ? from : i == count - 1 ? to
          : logarithmic ? from * Math.pow(to / from, share) : from + share * (to - from);
      BigDecimal number = new BigDecimal(exact).round(digits).stripTrailingZeros();
      values.add(plain(number) + (unit.isEmpty() ? "" : " " + unit));
      numbers.add(number.doubleValue());
    }
    return new VariedInput(key, List.copyOf(values), List.copyOf(numbers), unit, logarithmic);
  }

  private static String plain(BigDecimal number) {
    int exponent = number.precision() - number.scale() - 1;
    return exponent > 9 || exponent < -6 ? number.toString() : number.toPlainString();
  }
}
