package org.archspan.stability;

import org.apache.commons.math3.complex.Complex;
import org.archspan.boundary.Parity;

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
    determinant.evaluate(s.getReal(), s.getImaginary(), kx, ky);
    determinant.nullVector(vector[0], vector[1], vector[2], vector[3]);
    double[] slopeReal = atmosphere.mesh.slopes(vector[0]);
    double[] slopeImaginary = atmosphere.mesh.slopes(vector[1]);
    for (int i = 0; i < n; i++) {
      Complex zeta = new Complex(vector[0][i], vector[1][i]);
      Complex slope = new Complex(slopeReal[i], slopeImaginary[i]).add(zeta.multiply(0.5 * atmosphere.inverseScaleHeight[i]));
      Complex force = zeta.multiply(atmosphere.gravity[i])
          .add(new Complex(vector[2][i], vector[3][i]).multiply(atmosphere.jeansFrequency[i]));
      Complex[] horizontal = determinant.form().horizontal(i, s, kx, ky, slope, force);
      Complex divergence = horizontal[0].multiply(kx).add(horizontal[1].multiply(ky)).add(slope);
      energy[i] = square(horizontal[0]) + square(horizontal[1]) + square(zeta);
      densityChange[i] = zeta.multiply(atmosphere.inverseScaleHeight[i]).subtract(divergence);
    }
  }

  private static double square(Complex value) {
    return value.getReal() * value.getReal() + value.getImaginary() * value.getImaginary();
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
      column = column.add(densityChange[i].multiply(atmosphere.weight[i] * rootDensity[i]));
      weights += atmosphere.weight[i] * density * density;
      moved += atmosphere.weight[i] * density * energy[i];
    }
    return column.abs() / Math.sqrt(moved / weights);
  }
}
