package org.archspan.rivals;

import org.archspan.units.Constants;

/**
 * Jeans's instability of uniform gas as dense as the midplane.
 *
 * <p>Source: Jeans (1902), Phil. Trans. R. Soc. A 199, 1.
 */
public final class JeansScale {
  private JeansScale() {
  }

  /**
   * Shortest wave that grows, {@code c sqrt(pi/(G rho))}, cm.
   *
   * @param soundSpeed c, cm s^-1, positive
   * @param density    g cm^-3, positive
   */
  public static double length(double soundSpeed, double density) {
    return soundSpeed * Math.sqrt(Math.PI / (Constants.GRAVITATIONAL_CONSTANT * density));
  }

  /**
   * Growth rate of infinitely long waves, {@code sqrt(4 pi G rho)}, which none exceeds, s^-1.
   *
   * @param density g cm^-3, positive
   */
  public static double fastestGrowth(double density) {
    return Math.sqrt(4.0 * Math.PI * Constants.GRAVITATIONAL_CONSTANT * density);
  }
}
