package org.archspan.equilibrium;

import org.archspan.boundary.TopBoundary;

/**
 * A static base state: gas, field and cosmic rays in balance with gravity. Immutable; safe to share
 * among threads.
 */
public interface Equilibrium {
  /**
   * The state at a height. O(1) to O(number of components).
   *
   * @param height z, cm, from {@link #bottom()} upward; heights above {@link #top()} are allowed where gravity is known
   */
  GasState at(double height);

  /** Lower end of the domain, cm: 0 for a disk about its midplane. */
  double bottom();

  /** Upper end of the domain, cm. */
  double top();

  /** Whether the lower end is the midplane of a disk rather than a rigid floor. */
  boolean aboutMidplane();

  /** What bounds the gas at the top. */
  TopBoundary topBoundary();

  /** Total surface density, g cm^-2: both sides of a disk, everything above a floor. */
  double surfaceDensity();

  /**
   * Scale height, cm: surface density over twice the midplane density for a disk, over the bottom density above a
   * floor.
   */
  double scaleHeight();

  /** Effective isothermal speed sqrt(p/rho) at the lower end, cm s^-1. */
  double dispersion();

  /** Heights near which the state changes fast, cm, ascending. */
  double[] landmarks();

  /** Heights inside the domain where some derivative of the state jumps, cm, ascending. */
  double[] kinks();

  /** The same state over a domain with another top, cm. */
  Equilibrium withTop(double top);
}
