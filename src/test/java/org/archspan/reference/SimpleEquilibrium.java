package org.archspan.reference;

import java.util.function.DoubleUnaryOperator;
import org.archspan.boundary.TopBoundary;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.GasState;

/**
 * Isothermal gas with constant pressure ratios and unit bottom density in any gravity:
 * {@code rho = exp(-Phi/C)}, {@code C = (1 + alpha + beta) c^2}. Any consistent units. The slow, obvious twin
 * of the equilibria under test.
 *
 * @param gravity       g(z), cm s^-2
 * @param potential     its integral from the bottom z = 0, cm^2 s^-2
 * @param alpha         magnetic over gas pressure, dimensionless, not negative
 * @param beta          cosmic-ray over gas pressure, dimensionless, not negative
 * @param dispersion    isothermal speed c, cm s^-1, positive
 * @param top           upper end, cm
 * @param aboutMidplane whether z = 0 is the midplane of a disk
 * @param topBoundary   what bounds the gas at the top
 */
public record SimpleEquilibrium(DoubleUnaryOperator gravity, DoubleUnaryOperator potential, double alpha,
    double beta, double dispersion, double top, boolean aboutMidplane, TopBoundary topBoundary)
    implements Equilibrium {

  /** {@code g = C tanh z}: density sech z, scale height of the gravity 1; units c = 1. */
  public static SimpleEquilibrium tanh(double alpha, double beta, double top, TopBoundary boundary) {
    double support = 1.0 + alpha + beta;
    return new SimpleEquilibrium(z -> support * Math.tanh(z), z -> support * Math.log(Math.cosh(z)), alpha,
        beta, 1.0, top, true, boundary);
  }

  /** The same under a lid. */
  public static SimpleEquilibrium tanh(double alpha, double beta, double top) {
    return tanh(alpha, beta, top, TopBoundary.LID);
  }

  @Override
  public GasState at(double height) {
    double c2 = dispersion * dispersion;
    double support = (1.0 + alpha + beta) * c2;
    double g = gravity.applyAsDouble(height);
    double logDensity = -potential.applyAsDouble(height) / support;
    return new GasState(logDensity, -g / support, g, c2, alpha * c2, beta * c2);
  }

  @Override
  public double bottom() {
    return 0.0;
  }

  /** Half or whole of the gas below the top, by Simpson's rule: a test fixture needs no more. */
  @Override
  public double surfaceDensity() {
    int panels = 20000;
    double step = top / panels;
    double sum = 0.0;
    for (int i = 0; i <= panels; i++) {
      double weight = i == 0 || i == panels ? 1.0 : 2.0 + 2.0 * (i % 2);
      sum += weight * at(i * step).density();
    }
    return sum * step / 3.0 * (aboutMidplane ? 2.0 : 1.0);
  }

  @Override
  public double scaleHeight() {
    return surfaceDensity() / (at(0.0).density() * (aboutMidplane ? 2.0 : 1.0));
  }

  @Override
  public double[] landmarks() {
    return new double[] {scaleHeight()};
  }

  @Override
  public double[] kinks() {
    return new double[0];
  }

  @Override
  public Equilibrium withTop(double newTop) {
    return new SimpleEquilibrium(gravity, potential, alpha, beta, dispersion, newTop, aboutMidplane,
        topBoundary);
  }
}
