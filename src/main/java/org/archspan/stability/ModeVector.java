package org.archspan.stability;

/**
 * The vector that a form almost annihilates, with the place where it does. In {@link Scales}.
 *
 * @param kx           along the field
 * @param growth       s
 * @param zeta         sqrt(rho) Z on the nodes
 * @param potential    psi on the nodes; 0 where the gas is light
 * @param byGrowth     derivative of the form along the vector with respect to s
 * @param byWavenumber and to kx
 */
record ModeVector(double kx, double growth, double[] zeta, double[] potential, double byGrowth, double byWavenumber) {
  /** The vector of the root nearest to a growth rate; O(elements * degree^3). */
  static ModeVector near(Discretisation mesh, double kx, double ky, double guess) {
    double growth = guess;
    for (int step = 0; step < 2; step++) {
      if (mesh.stiffness().count(growth, kx, ky) == DynamicStiffness.INFINITE) {
        throw new UnsolvedException("the mode lies too close to the continuum above the open top to be followed");
      }
      growth += mesh.newtonStep(growth, kx, ky);
    }
    Displacement shape = mesh.displacement();
    return new ModeVector(kx, growth, shape.zeta.clone(), shape.potential.clone(), shape.byGrowth, shape.byWavenumber);
  }

  /** ds/dkx. */
  double slope() {
    return -byWavenumber / byGrowth;
  }
}
