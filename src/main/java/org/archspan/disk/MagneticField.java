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
}
