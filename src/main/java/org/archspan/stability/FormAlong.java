package org.archspan.stability;

import org.archspan.boundary.TopBoundary;
import org.archspan.mesh.Mesh;

/**
 * The quadratic form of a problem along a given vector: what the matrix of {@link DynamicStiffness} makes of it, without
 * the matrix. All quantities in {@link Scales}. Owns its work arrays: one instance for one thread.
 */
final class FormAlong {
  private final Atmosphere atmosphere;
  private final PressureResponse response;
  private final TopCondition top;
  private final CondensedForm form;
  private final TurningForm turning;
  private final PotentialForm potential;
  private final WaveSquared wave = new WaveSquared();
  private final double ky;

  FormAlong(ModeProblem problem, TopBoundary topBoundary, Scales scales, Mesh mesh) {
    atmosphere = new Atmosphere(problem.equilibrium(), scales, mesh, problem.perturbedGravity(), problem.turn());
    response = new PressureResponse(problem.gas(), problem.cosmicRays(), scales);
    top = new TopCondition(topBoundary);
    form = new CondensedForm(atmosphere.nodes());
    turning = new TurningForm(atmosphere.turning ? atmosphere.nodes() : 0, response);
    potential = new PotentialForm(atmosphere.gravitating ? atmosphere.nodes() : 0);
    ky = problem.crossWavenumber() * scales.length();
  }

  /** The form along a vector at its own growth rate and wavenumber; NaN in the continuum above. O(elements * degree^2). */
  double of(ModeVector vector) {
    double square = vector.growth() * vector.growth();
    wave.exact(vector.kx(), ky);
    if (atmosphere.turning) {
      turning.fill(form, atmosphere, vector.growth(), wave, vector.kx());
    } else {
      response.evaluate(vector.growth(), vector.kx());
      form.fill(atmosphere, 0, atmosphere.nodes(), square, wave, response.gas, response.cosmicRay);
    }
    int last = atmosphere.nodes() - 1;
    if (!top.evaluate(form, atmosphere, last)) {
      return Double.NaN;
    }
    double zeta = vector.zeta()[last];
    double sum = top.entry() * zeta * zeta + light(vector);
    return atmosphere.gravitating ? sum + gravitating(vector, square) : sum;
  }

  private double light(ModeVector vector) {
    double[] slope = atmosphere.mesh.slopes(vector.zeta());
    double sum = 0.0;
    for (int i = 0; i < slope.length; i++) {
      double zeta = vector.zeta()[i];
      sum += atmosphere.weight[i]
          * (form.a[i] * slope[i] * slope[i] + 2.0 * form.b[i] * zeta * slope[i] + form.c[i] * zeta * zeta);
    }
    return sum;
  }

  private double gravitating(ModeVector vector, double growthSquared) {
    if (atmosphere.turning) {
      potential.fill(atmosphere, wave, turning);
    } else {
      potential.fill(atmosphere, growthSquared, wave, form.stiffness());
    }
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
    return sum + Math.sqrt(wave.bending + wave.across) * psi[last] * psi[last]
        + 2.0 * atmosphere.jeansFrequency[last] * psi[last] * zeta[last];
  }
}
