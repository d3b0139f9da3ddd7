package org.archspan.figure;

import org.apache.commons.math3.analysis.interpolation.SplineInterpolator;
import org.apache.commons.math3.analysis.polynomials.PolynomialSplineFunction;
import org.archspan.boundary.Parity;
import org.archspan.stability.EigenMode;

/** A mode as a smooth function of height, continued to the other side of the midplane. Lengths cm. */
final class ModeProfile {
  private final EigenMode mode;
  private final double bottom;
  private final double top;
  private final PolynomialSplineFunction along;
  private final PolynomialSplineFunction vertical;
  private final PolynomialSplineFunction density;
  private final PolynomialSplineFunction across;
  private final PolynomialSplineFunction energy;

  ModeProfile(EigenMode mode) {
    this.mode = mode;
    double[] height = mode.height();
    bottom = height[0];
    top = height[height.length - 1];
    SplineInterpolator interpolator = new SplineInterpolator();
    along = interpolator.interpolate(height, mode.along());
    vertical = interpolator.interpolate(height, mode.vertical());
    across = interpolator.interpolate(height, mode.across());
    energy = interpolator.interpolate(height, mode.kineticEnergy());
    density = interpolator.interpolate(height, mode.densityContrast());
  }

  private double inside(double z) {
    return Math.max(bottom, Math.min(top, Math.abs(z)));
  }

  private double sign(double z, Parity odd) {
    return z < 0.0 && mode.parity() == odd ? -1.0 : 1.0;
  }

  /** X: even about the midplane for mirror-symmetric modes, odd for flexing ones. */
  double along(double z) {
    return sign(z, Parity.FLEXING) * along.value(inside(z));
  }

  /** Z: odd for mirror-symmetric modes, even for flexing ones. */
  double vertical(double z) {
    return sign(z, Parity.MIRROR) * vertical.value(inside(z));
  }

  /** Y: as X. */
  double across(double z) {
    return sign(z, Parity.FLEXING) * across.value(inside(z));
  }

  /** Kinetic-energy density over its greatest value, dimensionless. */
  double kineticEnergy(double z) {
    return energy.value(inside(z));
  }

  /** rho_1/rho: even for mirror-symmetric modes, odd for flexing ones. */
  double density(double z) {
    return sign(z, Parity.FLEXING) * density.value(inside(z));
  }

  /** Height above which the mode carries less than a hundredth of its greatest kinetic-energy density, at most the top. */
  double visibleTop() {
    double visible = bottom;
    for (int i = 0; i < mode.height().length; i++) {
      if (mode.kineticEnergy()[i] > 0.01) {
        visible = mode.height()[i];
      }
    }
    return Math.max(visible, bottom + 0.2 * (top - bottom));
  }

  double bottom() {
    return bottom;
  }
}
