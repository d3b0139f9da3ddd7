package org.archspan.comparison;

import java.util.List;

/**
 * An input of the model and the values that it takes.
 *
 * @param key         of the model file
 * @param values      as a model would give them, at least one
 * @param numbers     the same in {@code unit}, in the order of the values; empty where they are words
 * @param unit        of the first value; empty for pure numbers and words
 * @param logarithmic whether they fill a range in equal ratios
 */
public record VariedInput(String key, List<String> values, List<Double> numbers, String unit, boolean logarithmic) {
  /** Values in equal steps, or a list. */
  public VariedInput(String key, List<String> values, List<Double> numbers, String unit) {
    this(key, values, numbers, unit, false);
  }

  /** Whether the values are numbers, which a figure can put on an axis. */
  public boolean numeric() {
    return !numbers.isEmpty();
  }

  /** Whether the values are positive and spread over more than a factor of eight. */
  public boolean wide() {
    double least = numbers.stream().mapToDouble(Double::doubleValue).min().orElse(0.0);
    double greatest = numbers.stream().mapToDouble(Double::doubleValue).max().orElse(0.0);
    return least > 0.0 && greatest > 8.0 * least;
  }
}
