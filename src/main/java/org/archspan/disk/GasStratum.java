package org.archspan.disk;

/**
 * One part of a gas stratification known from observation.
 *
 * @param shape         law of the fall of density with height
 * @param bottomDensity density at the midplane, g cm^-3, positive
 * @param height        scale of the law, cm, positive
 */
public record GasStratum(Shape shape, double bottomDensity, double height) {
  /** Law of the fall of density with height {@code z}, with {@code h} its scale. */
  public enum Shape {
    /** {@code exp(-z^2/(2 h^2))}. */
    GAUSSIAN,
    /** {@code exp(-z/h)}. */
    EXPONENTIAL,
    /** {@code sech^2(z/h)}. */
    SECH2
  }
}
