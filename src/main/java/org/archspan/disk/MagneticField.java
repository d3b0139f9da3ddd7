package org.archspan.disk;

import java.util.OptionalDouble;

/** The horizontal magnetic field. */
public sealed interface MagneticField {
  /** alpha = magnetic over gas pressure, the same at every height; dimensionless, not negative. */
  record ConstantRatio(double pressureRatio) implements MagneticField {
  }

  /** The same shape, given by the field strength at the midplane (or on the floor), G, not negative. */
  record BottomStrength(double strength) implements MagneticField {
  }

  /**
   * Whatever the force balance leaves over beside a prescribed stratification ({@link Gas.Stratified}).
   *
   * @param bottomStrength field at the midplane, G; absent when the dispersion is given and fixes it
   */
  record Balance(OptionalDouble bottomStrength) implements MagneticField {
  }

  /**
   * A sheet of flux between two heights, or above one.
   *
   * @param bottom        lower end, cm
   * @param top           upper end, cm; infinite for a field that fills the space above
   * @param edge          half-width of its edges, cm, positive
   * @param pressureRatio magnetic over gas pressure inside, dimensionless, positive; or absent
   * @param strength      field in its middle (a scale of its edge above the bottom where it has no top), G; or absent
   */
  record Sheet(double bottom, double top, double edge, OptionalDouble pressureRatio, OptionalDouble strength)
      implements MagneticField {
    /** Height at which the strength is meant, cm. */
    public double middle() {
      return Double.isInfinite(top) ? bottom + 2.0 * edge : 0.5 * (bottom + top);
    }
  }
}
