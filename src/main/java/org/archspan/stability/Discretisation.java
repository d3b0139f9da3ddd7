package org.archspan.stability;

import org.archspan.mesh.Mesh;

/**
 * A problem on a mesh of one degree, with the vector of its latest root. One instance for one thread.
 */
final class Discretisation {
  private final DynamicStiffness stiffness;
  private final Displacement displacement;

  Discretisation(ModeProblem problem, Scales scales, Mesh mesh) {
    Atmosphere atmosphere = new Atmosphere(problem.equilibrium(), scales, mesh, problem.perturbedGravity(),
        problem.turn());
    PressureResponse response = new PressureResponse(problem.gas(), problem.cosmicRays(), scales);
    stiffness = DynamicStiffness.of(problem, atmosphere, response);
    displacement = new Displacement(atmosphere, response);
  }

  DynamicStiffness stiffness() {
    return stiffness;
  }

  Displacement displacement() {
    return displacement;
  }

  /**
   * After a finite count at (growth, kx, ky): the Newton correction of the growth rate. Leaves the displacement and its
   * slopes in {@link #displacement()}.
   */
  double newtonStep(double growth, double kx, double ky) {
    double form = stiffness.nullVector(displacement);
    displacement.complete(growth, kx, ky, stiffness.top().decay());
    return -form / displacement.byGrowth;
  }

  /** After a finite count: the Newton correction of the wavenumber at a fixed growth rate. */
  double newtonStepInWavenumber(double growth, double kx, double ky) {
    newtonStep(growth, kx, ky);
    return -stiffness.residual() / displacement.byWavenumber;
  }

  /** ds/dkx of the latest root. */
  double slope() {
    return -displacement.byWavenumber / displacement.byGrowth;
  }
}
