package org.archspan.stability;

/**
 * {@link CondensedForm} where the field turns with height: kx and ky differ from node to node, both proportional to the one
 * wavenumber k. No further term appears. The form stays convex in k^2 where the gas compresses along the field, linear where
 * the field bends; the elimination of Y leaves {@code s^2/(k^2 sin^2)}, which is convex too, so that tangents still prove whole
 * intervals of k.
 */
final class TurningForm {
  /** beta and the full coefficient of -F^2, F the force along D, for {@link PotentialForm}. */
  final double[] mixed;
  final double[] relief;
  private final PressureResponse response;

  /** Room for so many nodes. */
  TurningForm(int nodes, PressureResponse response) {
    mixed = new double[nodes];
    relief = new double[nodes];
    this.response = response;
  }

  /**
   * Fills the form at all nodes. O(nodes), no allocation.
   *
   * @param growth     s, positive
   * @param softestAt  wavenumber k at which the cosmic rays are softest
   */
  void fill(CondensedForm form, Atmosphere atmosphere, double growth, WaveSquared wave, double softestAt) {
    double growthSquared = growth * growth;
    for (int i = 0; i < mixed.length; i++) {
      double c = atmosphere.alongShare[i];
      double alongShare = c * c;
      double acrossShare = atmosphere.acrossShare[i] * atmosphere.acrossShare[i];
      response.evaluate(growth, Math.abs(c) * softestAt);
      double stiffness = response.gas * atmosphere.gasPerMass[i] + response.cosmicRay * atmosphere.cosmicRayPerMass[i];
      double v = atmosphere.alfvenSquared[i];
      double g = atmosphere.gravity[i];
      double touching = alongShare * wave.tangent;
      double distance = alongShare * (wave.compressing - wave.tangent);
      double q = 1.0 / (growthSquared + stiffness * touching);
      double m = growthSquared * q * (1.0 - stiffness * q * distance);
      double squeezed = m * stiffness + v;
      double yielding = acrossShare / (growthSquared * wave.inverse + alongShare * v);
      double share = 1.0 / (1.0 + squeezed * yielding);
      mixed[i] = share * m;
      relief[i] = q * (touching + growthSquared * q * distance) + yielding * share * m * m;
      double half = 0.5 * atmosphere.inverseScaleHeight[i];
      double a = share * squeezed;
      double b = -mixed[i] * g;
      double c0 = growthSquared + alongShare * wave.bending * v - relief[i] * g * g + atmosphere.fall[i];
      form.put(i, a, b + a * half, c0 + half * (2.0 * b + a * half), stiffness);
    }
  }
}
