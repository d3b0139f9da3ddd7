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
    /** Between 0 and 1. */
    FRACTION("between 0 and 1", 0.0, true, 1.0),
    /** A small count. */
    COUNT("between 1 and 30", 1.0, true, 30.0);

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

    /** In words, for messages. */
    public String words() {
      return words;
    }

    boolean holds(double value) {
      return Double.isFinite(value) && value <= highest && (lowestAllowed ? value >= lowest : value > lowest);
    }
  }
}
