package org.archspan.equilibrium;

import java.util.List;

/** A quantity as a smooth function of height. Immutable. */
interface HeightProfile {
  /** Value at a height, cm. */
  double value(double height);

  /** Derivative with respect to height at a height, cm. */
  double slope(double height);

  /** Where it changes fast. */
  List<Bend> bends();

  /**
   * A change over a short range of heights.
   *
   * @param height where, cm
   * @param width  half of the range, cm, positive
   * @param reach  distance up to which the inverse of the quantity changes as fast, cm: a large step moves that change
   *               sideways
   */
  record Bend(double height, double width, double reach) {
    /** A change by a factor. */
    static Bend ofFactor(double height, double width, double factor) {
      return new Bend(height, width, width * (1.0 + 0.5 * Math.abs(Math.log(factor))));
    }

  }

  /** The same at every height. */
  record Constant(double constant) implements HeightProfile {
    @Override
    public double value(double height) {
      return constant;
    }

    @Override
    public double slope(double height) {
      return 0.0;
    }

    @Override
    public List<Bend> bends() {
      return List.of();
    }
  }
}
