package org.archspan.units;

/**
 * A unit.
 *
 * @param factor    its size, in units of the CGS unit of its dimension
 * @param dimension its dimension
 */
public record Unit(double factor, Dimension dimension) {
  /** The unit of pure numbers. */
  public static final Unit ONE = new Unit(1.0, Dimension.NONE);

  Unit times(Unit other) {
    return new Unit(factor * other.factor, dimension.times(other.dimension));
  }

  Unit power(int exponent) {
    return new Unit(Math.pow(factor, exponent), dimension.power(exponent));
  }
}
