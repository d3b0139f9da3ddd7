package org.archspan.modelfile;

import java.util.List;

/**
 * What one key of the model file may hold; from this come reading, messages and the guide.
 *
 * @param key      dotted, {@code #} for the number of a table in an array
 * @param kind     of its value
 * @param unit     example of its unit; empty for a pure number
 * @param range    allowed numbers
 * @param choices  allowed words, for {@link Kind#CHOICE}
 * @param standard what holds when the key is absent
 * @param meaning  one line
 */
public record KeySpec(String key, Kind kind, String unit, Range range, List<String> choices, String standard,
    String meaning) {
  /** Kinds of value. */
  public enum Kind {
    /** A number with a unit, as a string. */
    QUANTITY,
    /** A number with a unit of length, or so many scale heights. */
    HEIGHT,
    /** Hydrogen nuclei, or mass, in a volume. */
    DENSITY,
    /** A pure number. */
    NUMBER,
    /** A whole number. */
    INTEGER,
    /** One of several words. */
    CHOICE,
    /** Any text. */
    TEXT
  }

  /** Allowed numbers. */
  public enum Range {
    /** Any. */
    ANY("any finite number", Double.NEGATIVE_INFINITY, true, Double.POSITIVE_INFINITY),
    /** Greater than 0. */
    POSITIVE("greater than 0", 0.0, false, Double.POSITIVE_INFINITY),
    /** 0 or greater. */
    NOT_NEGATIVE("0 or greater", 0.0, true, Double.POSITIVE_INFINITY),
    /** Greater than 0 and slower than light: the theory is not relativistic. */
    SPEED("greater than 0 and below the speed of light", 0.0, false, 2.99792458e10),
    /** An adiabatic index; far below 1 the stiffness of the gas would be lost in rounding. */
    INDEX("between 0.001 and 1000", 1e-3, true, 1e3),
    /** Between 0 and 1. */
    FRACTION("between 0 and 1", 0.0, true, 1.0),
    /** A small count. */
    COUNT("between 1 and 30", 1.0, true, 30.0);

    /** Sizes in CGS beyond which products of several values would leave the range of the computer's numbers. */
    private static final double LARGEST = 1e60;
    private static final double SMALLEST = 1e-60;

    private final String words;
    private final double lowest;
    private final boolean lowestAllowed;
    private final double highest;

    Range(String words, double lowest, boolean lowestAllowed, double highest) {
      this.words = words;
      this.lowest = lowest;
      this.lowestAllowed = lowestAllowed;
      this.highest = highest;
    }

    /** Least number, in the CGS unit of the key; it may itself be excluded. */
    double lowest() {
      return lowest;
    }

    /** Greatest number, in the CGS unit of the key. */
    double highest() {
      return highest;
    }

    /** In words, for messages. */
    public String words() {
      return words;
    }

    /** In words why a value is not allowed. */
    String wordsFor(double value) {
      return within(value) && !ordinary(value) ? words + ", of a size between 1e-60 and 1e60 in CGS" : words;
    }

    boolean holds(double value) {
      return within(value) && ordinary(value);
    }

    private boolean within(double value) {
      return Double.isFinite(value) && value <= highest && (lowestAllowed ? value >= lowest : value > lowest);
    }

    private static boolean ordinary(double value) {
      return value == 0.0 || Math.abs(value) >= SMALLEST && Math.abs(value) <= LARGEST;
    }
  }
}
