package org.archspan.gravity;

import java.util.Locale;

/**
 * One input of a gravity law, as a model file gives it.
 *
 * @param key     name in the model file
 * @param unit    an example of its unit, which fixes its dimension; empty for a pure number
 * @param meaning one line
 * @param range   what values are allowed
 */
public record LawInput(String key, String unit, String meaning, Range range) {
  /** What values are allowed. */
  public enum Range {
    /** Greater than 0. */
    POSITIVE,
    /** 0 or greater. */
    NOT_NEGATIVE,
    /** Between 0 and 1. */
    FRACTION
  }

  static void requirePositive(String key, double value) {
    require(value > 0.0 && Double.isFinite(value), key, "positive and finite", value);
  }

  static void requireNotNegative(String key, double value) {
    require(value >= 0.0 && Double.isFinite(value), key, "finite and not negative", value);
  }

  static void requireFraction(String key, double value) {
    require(value >= 0.0 && value <= 1.0, key, "between 0 and 1", value);
  }

  private static void require(boolean allowed, String key, String range, double value) {
    if (!allowed) {
      throw new IllegalArgumentException(String.format(Locale.ROOT, "%s must be %s, found %g", key, range, value));
    }
  }
}
