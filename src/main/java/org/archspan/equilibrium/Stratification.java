package org.archspan.equilibrium;

/** The base state as a function of height alone, without a domain. Immutable. */
interface Stratification {
  /** The state at a height, cm. */
  GasState at(double height);

  /** Natural logarithm of the density in g cm^-3 at a height, cm. */
  double logDensity(double height);

  /** Heights near which the state changes fast, cm, positive, ascending. */
  double[] landmarks();

  /** Heights where some derivative jumps, cm, ascending. */
  double[] kinks();

  /** Greatest height for which the state is defined, cm. */
  double greatestHeight();

  /** Column of gas above a level (cm), g cm^-2. */
  default double columnAbove(double bottom) {
    return HeightPanels.of(this::logDensity, bottom, landmarks(), kinks(), greatestHeight())
        .integrate(z -> Math.exp(logDensity(z)));
  }
}
