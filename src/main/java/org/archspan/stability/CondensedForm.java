package org.archspan.stability;

/**
 * The quadratic form of the energy principle (Bernstein et al. 1958) per unit mass, after the horizontal displacements X
 * and Y, which carry no vertical derivative, have been eliminated at each height. With zeta = sqrt(rho) Z there remains
 * {@code a zeta'^2 + 2 b zeta zeta' + c zeta^2}.
 *
 * <p>kx^2 enters through the compression, {@code m = s^2/(s^2 + a kx^2)} (a: stiffness per mass), where the form is convex
 * in it, and through the bending of the field, where it is linear. With m replaced by its tangent at a middle kx^2 the
 * form before elimination of Y lies below the true one and is linear in kx^2: if it is positive at both ends of an
 * interval, then the true form is positive at every kx^2 between. Alternatively, with the upper end of an interval in m
 * and the lower end in the bending, the form lies below all those between, whatever its sign.
 */
final class CondensedForm {
  final double[] a;
  final double[] b;
  final double[] c;

  /** Room for so many nodes. */
  CondensedForm(int nodes) {
    a = new double[nodes];
    b = new double[nodes];
    c = new double[nodes];
  }

  /**
   * Fills the coefficients at nodes {@code from} to {@code to - 1}. O(to - from), no allocation.
   *
   * @param growthSquared   s^2, positive, or 0 where kx is positive
   * @param wave            kx^2 where it bends and where it compresses, and ky^2
   * @param gasFactor       gamma of the gas
   * @param cosmicRayFactor effective gamma of the cosmic rays
   */
  void fill(Atmosphere atmosphere, int from, int to, double growthSquared, WaveSquared wave, double gasFactor,
      double cosmicRayFactor) {
    double[] gravity = atmosphere.gravity;
    double[] alfvenSquared = atmosphere.alfvenSquared;
    double[] gasPerMass = atmosphere.gasPerMass;
    double[] cosmicRayPerMass = atmosphere.cosmicRayPerMass;
    double[] inverseScaleHeight = atmosphere.inverseScaleHeight;
    double bending = wave.bending;
    double tangent = wave.tangent;
    double distance = wave.compressing - tangent;
    double acrossSquared = wave.across;
    for (int i = from; i < to; i++) {
      double g = gravity[i];
      double v = alfvenSquared[i];
      double h = inverseScaleHeight[i];
      double stiffness = gasFactor * gasPerMass[i] + cosmicRayFactor * cosmicRayPerMass[i];
      double q = 1.0 / (growthSquared + stiffness * tangent);
      double m = growthSquared * q * (1.0 - stiffness * q * distance);
      double relief = q * (tangent + growthSquared * q * distance);
      double tension = growthSquared + bending * v;
      double squeeze = m * stiffness + v;
      double share = 1.0 / (tension + squeeze * acrossSquared);
      double n = tension * share;
      double mg = m * g;
      double slope = n * squeeze;
      double mixed = -n * mg;
      double flat = tension - relief * g * g - acrossSquared * share * mg * mg + g * h;
      double half = 0.5 * h;
      a[i] = slope;
      b[i] = mixed + slope * half;
      c[i] = flat + h * mixed + slope * half * half;
    }
  }
}
