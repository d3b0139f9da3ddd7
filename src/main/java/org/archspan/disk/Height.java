package org.archspan.disk;

/**
 * A length that may be given in scale heights of the equilibrium, which is known only once that is built.
 *
 * @param value          number of centimetres, or of scale heights (dimensionless); finite
 * @param inScaleHeights whether {@code value} counts scale heights
 */
public record Height(double value, boolean inScaleHeights) {
  /** A length of so many centimetres. */
  public static Height centimetres(double value) {
    return new Height(value, false);
  }

  /** A length of so many scale heights, dimensionless. */
  public static Height scaleHeights(double value) {
    return new Height(value, true);
  }

  /**
   * The length in cm.
   *
   * @param scaleHeight scale height of the equilibrium, cm, positive
   */
  public double resolve(double scaleHeight) {
    return inScaleHeights ? value * scaleHeight : value;
  }
}
