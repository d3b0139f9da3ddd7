package org.archspan.modelfile;

/**
 * How uncertain an input is.
 *
 * @param shape  of the distribution
 * @param centre mean, median, or middle of the range, in the CGS unit of the input
 * @param spread standard deviation (same unit), factor (dimensionless), or half-width (same unit)
 */
public record Uncertainty(Shape shape, double centre, double spread) {
  /** Shapes of distribution. */
  public enum Shape {
    /** Normal. */
    NORMAL,
    /** Log-normal; one standard deviation is a factor. */
    FACTOR,
    /** Uniform. */
    RANGE
  }
}
