package org.archspan.table;

import java.util.List;

/**
 * One column of a table: numbers, whole numbers, or texts.
 *
 * @param name        short, without spaces
 * @param unit        empty for a pure number or a text
 * @param description one line
 * @param type        ECSV data type: float64, int64 or string
 * @param values      as they are written, one for each row
 */
public record Column(String name, String unit, String description, String type, List<String> values) {
  /** A column of numbers with all their digits, in the given unit. */
  public static Column of(String name, String unit, String description, double[] values) {
    return new Column(name, unit, description, "float64",
        java.util.Arrays.stream(values).mapToObj(Column::written).toList());
  }

  /** A column of whole numbers. */
  public static Column of(String name, String description, int[] values) {
    return new Column(name, "", description, "int64",
        java.util.Arrays.stream(values).mapToObj(Integer::toString).toList());
  }

  /** A column of words. */
  public static Column of(String name, String description, List<String> values) {
    return new Column(name, "", description, "string", List.copyOf(values));
  }

  /** The number in a row, in the unit of the column; NaN for a word. */
  public double number(int row) {
    String value = values.get(row);
    return switch (value) {
      case "inf" -> Double.POSITIVE_INFINITY;
      case "-inf" -> Double.NEGATIVE_INFINITY;
      default -> type.equals("string") || value.equals("nan") ? Double.NaN : Double.parseDouble(value);
    };
  }

  private static String written(double value) {
    if (Double.isNaN(value)) {
      return "nan";
    }
    if (Double.isInfinite(value)) {
      return value > 0.0 ? "inf" : "-inf";
    }
    return Double.toString(value);
  }
}
