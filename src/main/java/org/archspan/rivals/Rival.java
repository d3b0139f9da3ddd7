package org.archspan.rivals;

/**
 * One instability and what it makes of the gas, CGS.
 *
 * @param name       of the instability
 * @param source     author and year of the formula
 * @param outcome    what came out
 * @param wavelength of the fastest wave, cm; NaN where none is chosen
 * @param growthRate of that wave, s^-1; where the outcome is a bound, the rate that no wave exceeds; NaN if none
 * @param shortest   unstable wave, cm; NaN where it does not apply
 * @param longest    unstable wave, cm; NaN where it does not apply
 * @param measure    name of the number that decides stability; empty if there is none
 * @param value      of that number, dimensionless; NaN if there is none
 * @param remark     what a reader must know; may be empty
 */
public record Rival(String name, String source, Outcome outcome, double wavelength, double growthRate, double shortest,
    double longest, String measure, double value, String remark) {
  /** What came out. */
  public enum Outcome {
    /** A wave grows fastest. */
    GROWS("grows"),
    /** No wave grows. */
    STABLE("stable"),
    /** A criterion or a bound: it takes no part in the contest. */
    BOUND("bound"),
    /** Growth rises without limit towards short waves. */
    UNBOUNDED("short waves"),
    /** An input is missing. */
    NOT_JUDGED("not judged"),
    /** It could not be solved. */
    FAILED("failed");

    private final String words;

    Outcome(String words) {
      this.words = words;
    }

    /** In words, for tables. */
    public String words() {
      return words;
    }
  }

  /** One that cannot be judged, and why. */
  static Rival without(String name, String source, Outcome outcome, String reason) {
    return new Rival(name, source, outcome, Double.NaN, Double.NaN, Double.NaN, Double.NaN, "", Double.NaN, reason);
  }

  /** E-folding time, s; NaN where nothing grows. */
  public double growthTime() {
    return growthRate > 0.0 ? 1.0 / growthRate : Double.NaN;
  }
}
