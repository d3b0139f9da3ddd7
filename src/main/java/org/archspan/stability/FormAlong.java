package org.archspan.stability;

import org.archspan.boundary.TopBoundary;
import org.archspan.mesh.Mesh;

/**
 * The quadratic form of a problem along a given vector: what the matrix of {@link DynamicStiffness} makes of it, without
 * the matrix. All quantities in {@link Scales}. Owns its work arrays: one instance for one thread.
 */
final class FormAlong {
  private final Atmosphere atmosphere;
  private final NodalForm nodal;
  private final double ky;

  FormAlong(ModeProblem problem, TopBoundary topBoundary, Scales scales, Mesh mesh) {
    atmosphere = new Atmosphere(problem.equilibrium(), scales, mesh, problem.perturbedGravity(), problem.turn());
    nodal = new NodalForm(atmosphere, new PressureResponse(problem.gas(), problem.cosmicRays(), scales), topBoundary);
    ky = problem.crossWavenumber() * scales.length();
  }

  /** The form along a vector at its own growth rate and wavenumber; NaN in the continuum above. O(elements * degree^2). */
  double of(ModeVector vector) {
    nodal.wave.exact(vector.kx(), ky);
    if (!nodal.fill(vector.growth(), vector.kx())) {
      return Double.NaN;
    }
    double zeta = vector.zeta()[atmosphere.nodes() - 1];
    double sum = nodal.top.entry() * zeta * zeta + light(vector);
    return atmosphere.gravitating ? sum + gravitating(vector) : sum;
  }

  private double light(ModeVector vector) {
    CondensedForm form = nodal.light;
    double[] slope = atmosphere.mesh.slopes(vector.zeta());
    double sum = 0.0;
    for (int i = 0; i < slope.length; i++) {
      double zeta = vector.zeta()[i];
      sum += atmosphere.weight[i]
          * (form.a[i] * slope[i] * slope[i] + 2.0 * form.b[i] * zeta * slope[i] + form.c[i] * zeta * zeta);
    }
    return sum;
  }

  private double gravitating(ModeVector vector) {
    PotentialForm potential = nodal.potential;
    double[] psi = vector.potential();
    double[] zeta = vector.zeta();
    double[] slope = atmosphere.mesh.slopes(zeta);
    double[] psiSlope = atmosphere.mesh.slopes(psi);
    double sum = 0.0;
    for (int i = 0; i < psi.length; i++) {
      sum += atmosphere.weight[i] * (psiSlope[i] * psiSlope[i] + potential.own[i] * psi[i] * psi[i]
          + 2.0 * psi[i] * (potential.slope[i] * slope[i] + potential.value[i] * zeta[i]));
    }
    int last = psi.length - 1;
    return sum + Math.sqrt(nodal.wave.bending + nodal.wave.across) * psi[last] * psi[last]
        + 2.0 * atmosphere.jeansFrequency[last] * psi[last] * zeta[last];
  }
}
