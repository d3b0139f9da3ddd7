package org.archspan.gravity;

/**
 * An external gravity that holds the gas down. Odd about the midplane; only heights {@code z >= 0} are asked for.
 *
 * <p>The set of laws is open: a new law is one record that implements this interface, one {@link GravityLawKind} that
 * names its inputs, and one line in {@link GravityLaws}.
 */
public interface GravityLaw {
  /**
   * Downward acceleration, cm s^-2.
   *
   * @param height z above the midplane, cm, at least 0
   */
  double acceleration(double height);

  /**
   * Potential {@code Phi(z) = Integral_0^z g dz}, cm^2 s^-2, zero at the midplane.
   *
   * @param height z above the midplane, cm, at least 0
   */
  double potential(double height);

  /**
   * Heights near which the law bends, cm, positive: where a mesh must look closely. The law is smooth there.
   */
  double[] landmarks();

  /** Heights where some derivative of the law jumps, cm, positive and ascending: a mesh must put an edge there. */
  default double[] kinks() {
    return new double[0];
  }

  /** Greatest height for which the law is defined, cm; infinite for a formula. */
  default double greatestHeight() {
    return Double.POSITIVE_INFINITY;
  }
}
