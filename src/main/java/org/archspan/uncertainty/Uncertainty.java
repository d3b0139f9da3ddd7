package org.archspan.uncertainty;

import org.apache.commons.math3.distribution.NormalDistribution;

/**
 * How uncertain an input is, in its CGS unit.
 *
 * @param shape   of the distribution
 * @param centre  mean, median, or middle of the range, in the CGS unit of the input
 * @param spread  standard deviation (same unit), factor (dimensionless), half-width (same unit), or factor from the
 *                middle to either end (dimensionless)
 * @param lowest  least value that the input may take, in the CGS unit of the input; the distribution is cut there
 * @param highest greatest, in the CGS unit of the input
 */
public record Uncertainty(Shape shape, double centre, double spread, double lowest, double highest) {
  /** Shapes of distribution. */
  public enum Shape {
    /** Normal. */
    NORMAL,
    /** Log-normal; one standard deviation is a factor. */
    FACTOR,
    /** Uniform. */
    RANGE,
    /** Uniform in the logarithm. */
    RATIO_RANGE
  }

  /** Whether values that differ by a factor are what is alike, rather than values that differ by an amount. */
  public boolean byFactors() {
    return shape == Shape.FACTOR || shape == Shape.RATIO_RANGE;
  }

  private static final NormalDistribution UNIT = new NormalDistribution(null, 0.0, 1.0);

  /**
   * The value that a share of all draws stays below, in the CGS unit of the input.
   *
   * @param share between 0 and 1, both excluded; dimensionless
   */
  public double quantile(double share) {
    return switch (shape) {
      case RANGE -> centre + spread * (2.0 * share - 1.0);
      case RATIO_RANGE -> centre * Math.pow(spread, 2.0 * share - 1.0);
      case NORMAL -> centre + spread * cut(share, (lowest - centre) / spread, (highest - centre) / spread);
      case FACTOR -> {
        double width = Math.log(spread);
        yield centre * Math.exp(width * cut(share, lowest > 0.0 ? Math.log(lowest / centre) / width
            : Double.NEGATIVE_INFINITY, Math.log(highest / centre) / width));
      }
    };
  }

  /** Standard normal between two limits. */
  private static double cut(double share, double low, double high) {
    double below = low == Double.NEGATIVE_INFINITY ? 0.0 : UNIT.cumulativeProbability(low);
    double above = high == Double.POSITIVE_INFINITY ? 1.0 : UNIT.cumulativeProbability(high);
    return UNIT.inverseCumulativeProbability(below + share * (above - below));
  }
}
