package org.archspan.stability;

/**
 * What the perturbed gravity of the gas adds to {@link CondensedForm}. With the potential {@code phi = sqrt(4 pi G) psi} and
 * omega the Jeans frequency {@code sqrt(4 pi G rho)}, the terms {@code 2 rho_1 phi + (phi'^2 + k^2 phi^2)/(4 pi G)} become
 * {@code -2 omega psi (D - h zeta) + psi'^2 + k^2 psi^2} (h = -d ln(rho)/dz): the potential pulls where gravity pushes. The
 * elimination of X and Y, which sees the force {@code g zeta + omega psi}, leaves
 * {@code 2 slope psi zeta' + 2 value psi zeta + psi'^2 + own psi^2}. Convex and linear in kx^2 where the form without it is.
 */
final class PotentialForm {
  final double[] slope;
  final double[] value;
  final double[] own;

  /** Room for so many nodes. */
  PotentialForm(int nodes) {
    slope = new double[nodes];
    value = new double[nodes];
    own = new double[nodes];
  }

  /** Fills the coefficients at all nodes where the field turns, after that form. O(nodes), no allocation. */
  void fill(Atmosphere atmosphere, WaveSquared wave, TurningForm turning) {
    System.arraycopy(turning.mixed, 0, slope, 0, slope.length);
    System.arraycopy(turning.relief, 0, own, 0, own.length);
    couple(atmosphere, wave.bending);
  }

  /** Fills the coefficients at all nodes, after the form without gravity. O(nodes), no allocation. */
  void fill(Atmosphere atmosphere, double growthSquared, WaveSquared wave, double[] stiffness) {
    double tangent = wave.tangent;
    double distance = wave.compressing - tangent;
    for (int i = 0; i < slope.length; i++) {
      double q = 1.0 / (growthSquared + stiffness[i] * tangent);
      slope[i] = growthSquared * q * (1.0 - stiffness[i] * q * distance);
      own[i] = q * (tangent + growthSquared * q * distance);
    }
    if (wave.across > 0.0) {
      squeezeAcross(atmosphere.alfvenSquared, growthSquared, wave, stiffness);
    }
    couple(atmosphere, wave.bending + wave.across);
  }

  /** From the mixed and the relieving coefficient before the elimination of Y to those after it. */
  private void squeezeAcross(double[] alfvenSquared, double growthSquared, WaveSquared wave, double[] stiffness) {
    for (int i = 0; i < slope.length; i++) {
      double tension = growthSquared + wave.bending * alfvenSquared[i];
      double q = 1.0 / (tension + (slope[i] * stiffness[i] + alfvenSquared[i]) * wave.across);
      own[i] += wave.across * q * slope[i] * slope[i];
      slope[i] *= tension * q;
    }
  }

  private void couple(Atmosphere atmosphere, double waveSquared) {
    double[] jeans = atmosphere.jeansFrequency;
    double[] gravity = atmosphere.gravity;
    double[] inverseScaleHeight = atmosphere.inverseScaleHeight;
    for (int i = 0; i < slope.length; i++) {
      double relief = own[i];
      double mixed = -slope[i] * jeans[i];
      slope[i] = mixed;
      value[i] = jeans[i] * (inverseScaleHeight[i] - relief * gravity[i]) + 0.5 * inverseScaleHeight[i] * mixed;
      own[i] = waveSquared - relief * jeans[i] * jeans[i];
    }
  }
}
