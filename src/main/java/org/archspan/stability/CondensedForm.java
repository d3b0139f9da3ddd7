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
  private final double[] stiffness;
  private final double[] compression;
  private final double[] relief;

  /** Room for so many nodes. */
  CondensedForm(int nodes) {
    a = new double[nodes];
    b = new double[nodes];
    c = new double[nodes];
    stiffness = new double[nodes];
    compression = new double[nodes];
    relief = new double[nodes];
  }

  /** Sets the coefficients of one node. */
  void put(int i, double newA, double newB, double newC, double newStiffness) {
    a[i] = newA;
    b[i] = newB;
    c[i] = newC;
    stiffness[i] = newStiffness;
  }

  /** Resistance to compression per mass at each node, as last filled. */
  double[] stiffness() {
    return stiffness;
  }

  /**
   * Fills the coefficients at nodes {@code from} to {@code to - 1}. O(to - from), no allocation. Short loops over flat
   * arrays: the compiler turns each into vector instructions, which it does not do for one long loop.
   *
   * @param growthSquared   s^2, positive, or 0 where kx is positive
   * @param wave            kx^2 where it bends and where it compresses, and ky^2
   * @param gasFactor       gamma of the gas
   * @param cosmicRayFactor effective gamma of the cosmic rays
   */
  void fill(Atmosphere atmosphere, int from, int to, double growthSquared, WaveSquared wave, double gasFactor,
      double cosmicRayFactor) {
    stiffen(atmosphere.gasPerMass, atmosphere.cosmicRayPerMass, from, to, gasFactor, cosmicRayFactor);
    compress(from, to, growthSquared, wave);
    double[] fall = atmosphere.fall;
    double[] gravitySquared = atmosphere.gravitySquared;
    double[] alfvenSquared = atmosphere.alfvenSquared;
    double bending = wave.bending;
    for (int i = from; i < to; i++) {
      a[i] = compression[i] * stiffness[i] + alfvenSquared[i];
      c[i] = growthSquared + bending * alfvenSquared[i] - relief[i] * gravitySquared[i] + fall[i];
    }
    if (wave.across > 0.0) {
      squeezeAcross(atmosphere, from, to, growthSquared, wave);
    } else {
      mix(atmosphere.gravity, from, to);
    }
    scale(atmosphere.inverseScaleHeight, from, to);
  }

  private void stiffen(double[] gasPerMass, double[] cosmicRayPerMass, int from, int to, double gasFactor,
      double cosmicRayFactor) {
    for (int i = from; i < to; i++) {
      stiffness[i] = gasFactor * gasPerMass[i] + cosmicRayFactor * cosmicRayPerMass[i];
    }
  }

  /** m, and the coefficient of -g^2 zeta^2 that the elimination of X leaves. */
  private void compress(int from, int to, double growthSquared, WaveSquared wave) {
    double tangent = wave.tangent;
    double distance = wave.compressing - tangent;
    for (int i = from; i < to; i++) {
      relief[i] = 1.0 / (growthSquared + stiffness[i] * tangent);
    }
    for (int i = from; i < to; i++) {
      double q = relief[i];
      compression[i] = growthSquared * q * (1.0 - stiffness[i] * q * distance);
      relief[i] = q * (tangent + growthSquared * q * distance);
    }
  }

  /** The coefficient of 2 Z Z' for ky = 0. */
  private void mix(double[] gravity, int from, int to) {
    for (int i = from; i < to; i++) {
      b[i] = -compression[i] * gravity[i];
    }
  }

  /** Elimination of Y. */
  private void squeezeAcross(Atmosphere atmosphere, int from, int to, double growthSquared, WaveSquared wave) {
    double[] gravity = atmosphere.gravity;
    double[] alfvenSquared = atmosphere.alfvenSquared;
    double bending = wave.bending;
    double across = wave.across;
    for (int i = from; i < to; i++) {
      relief[i] = 1.0 / (growthSquared + bending * alfvenSquared[i] + a[i] * across);
    }
    for (int i = from; i < to; i++) {
      double share = (growthSquared + bending * alfvenSquared[i]) * relief[i];
      double mg = compression[i] * gravity[i];
      a[i] *= share;
      b[i] = -share * mg;
      c[i] -= across * relief[i] * mg * mg;
    }
  }

  /** From Z = zeta/sqrt(rho) to zeta. */
  private void scale(double[] inverseScaleHeight, int from, int to) {
    for (int i = from; i < to; i++) {
      double half = 0.5 * inverseScaleHeight[i];
      double mixed = b[i] + a[i] * half;
      c[i] += half * (b[i] + mixed);
      b[i] = mixed;
    }
  }
}
