package org.archspan.stability;

import org.archspan.boundary.Parity;
import org.archspan.mesh.ReferenceElement;

/**
 * Where a rotating mode has its kinetic energy, and what it gathers. The displacement is complex; amplitudes are its magnitudes.
 * What lies above an open top is left out.
 */
final class RotatingShape {
  private final RotatingDeterminant determinant;
  private final Atmosphere atmosphere;
  private final double[] energy;
  private final Complex[] densityChange;

  /** The shape at a root that the determinant's mesh resolves. */
  RotatingShape(RotatingDeterminant determinant, Complex s, double kx, double ky) {
    this.determinant = determinant;
    atmosphere = determinant.atmosphere();
    int n = atmosphere.nodes();
    energy = new double[n];
    densityChange = new Complex[n];
    double[][] vector = new double[4][n];
    determinant.evaluate(s.re(), s.im(), kx, ky);
    determinant.nullVector(vector[0], vector[1], vector[2], vector[3]);
    for (int i = 0; i < n; i++) {
      Complex zeta = new Complex(vector[0][i], vector[1][i]);
      Complex slope = slope(vector, i).plus(zeta.times(0.5 * atmosphere.inverseScaleHeight[i]));
      Complex force = zeta.times(atmosphere.gravity[i])
          .plus(new Complex(vector[2][i], vector[3][i]).times(atmosphere.jeansFrequency[i]));
      Complex[] horizontal = determinant.form().horizontal(i, s, kx, ky, slope, force);
      Complex divergence = horizontal[0].times(kx).plus(horizontal[1].times(ky)).plus(slope);
      energy[i] = square(horizontal[0]) + square(horizontal[1]) + square(zeta);
      densityChange[i] = zeta.times(atmosphere.inverseScaleHeight[i]).minus(divergence);
    }
  }

  private static double square(Complex value) {
    return value.re() * value.re() + value.im() * value.im();
  }

  private Complex slope(double[][] vector, int node) {
    ReferenceElement element = atmosphere.mesh.reference();
    int n = element.degree() + 1;
    int start = node / n * n;
    double re = 0.0;
    double im = 0.0;
    for (int j = 0; j < n; j++) {
      double d = element.derivative()[(node - start) * n + j];
      re += d * vector[0][start + j];
      im += d * vector[1][start + j];
    }
    return new Complex(re, im).times(2.0 / atmosphere.mesh.length(node / n));
  }

  /** Height of the kinetic-energy centroid in scale lengths. */
  double centroid() {
    double inertia = 0.0;
    double moment = 0.0;
    for (int i = 0; i < energy.length; i++) {
      inertia += atmosphere.weight[i] * energy[i];
      moment += atmosphere.weight[i] * energy[i] * atmosphere.height[i];
    }
    return moment / inertia;
  }

  /** Amplitude of the surface-density contrast when the midplane layer moves by one scale height; 0 for flexing modes. */
  double columnContrast(Parity parity, double[] rootDensity) {
    if (parity == Parity.FLEXING) {
      return 0.0;
    }
    Complex column = new Complex(0.0, 0.0);
    double weights = 0.0;
    double moved = 0.0;
    for (int i = 0; i < energy.length; i++) {
      double density = rootDensity[i] * rootDensity[i];
      column = column.plus(densityChange[i].times(atmosphere.weight[i] * rootDensity[i]));
      weights += atmosphere.weight[i] * density * density;
      moved += atmosphere.weight[i] * density * energy[i];
    }
    return column.magnitude() / Math.sqrt(moved / weights);
  }
}
