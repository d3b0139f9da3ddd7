package org.archspan.stability;

/**
 * The quadratic form of the energy principle (Bernstein et al. 1958) per unit mass, after the horizontal displacements X
 * and Y, which carry no vertical derivative, have been eliminated at each height. With zeta = sqrt(rho) Z there remains
 * {@code a zeta'^2 + 2 b zeta zeta' + c zeta^2}.
 *
 * <p>The wavenumber along the field enters twice: where it compresses (its growth lowers the form) and where it bends
 * the field (its growth raises it). With the upper end of a wavenumber interval in the first place and the lower end in
 * the second, the form lies below that of every wavenumber in between: a count of zero then holds for all of them.
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
   * @param growthSquared   s^2, not negative
   * @param compressing     kx^2 in the compression
   * @param bending         kx^2 in the tension
   * @param acrossSquared   ky^2
   * @param gasFactor       gamma of the gas
   * @param cosmicRayFactor effective gamma of the cosmic rays
   */
  void fill(Atmosphere atmosphere, int from, int to, double growthSquared, double compressing, double bending,
      double acrossSquared, double gasFactor, double cosmicRayFactor) {
    double[] gravity = atmosphere.gravity;
    double[] alfvenSquared = atmosphere.alfvenSquared;
    double[] gasPerMass = atmosphere.gasPerMass;
    double[] cosmicRayPerMass = atmosphere.cosmicRayPerMass;
    double[] inverseScaleHeight = atmosphere.inverseScaleHeight;
    for (int i = from; i < to; i++) {
      double g = gravity[i];
      double v = alfvenSquared[i];
      double h = inverseScaleHeight[i];
      double stiffness = gasFactor * gasPerMass[i] + cosmicRayFactor * cosmicRayPerMass[i];
      double q = 1.0 / (growthSquared + stiffness * compressing);
      double m = growthSquared * q;
      double tension = growthSquared + bending * v;
      double squeeze = m * stiffness + v;
      double share = 1.0 / (tension + squeeze * acrossSquared);
      double n = tension * share;
      double mg = m * g;
      double slope = n * squeeze;
      double mixed = -n * mg;
      double flat = tension - compressing * q * g * g - acrossSquared * share * mg * mg + g * h;
      double half = 0.5 * h;
      a[i] = slope;
      b[i] = mixed + slope * half;
      c[i] = flat + h * mixed + slope * half * half;
    }
  }
}
