package org.archspan.stability;

/**
 * The edge of the continuum of the uniform atmosphere above an open top: waves without vertical variation of zeta there
 * (the kz = 0 branch of Parker's 1966 atmosphere). Slower waves propagate away upwards; their number is infinite.
 */
final class HaloEdge {
  private static final int BISECTIONS = 60;

  private final Atmosphere atmosphere;
  private final PressureResponse response;
  private final CondensedForm form;
  private final WaveSquared wave = new WaveSquared();
  private final Displacement displacement;
  private final int top;

  HaloEdge(Atmosphere atmosphere, PressureResponse response) {
    this.atmosphere = atmosphere;
    this.response = response;
    this.form = new CondensedForm(atmosphere.nodes());
    this.displacement = new Displacement(atmosphere, response);
    this.top = atmosphere.nodes() - 1;
  }

  /**
   * Growth rate of the edge at a wavenumber; 0 when the atmosphere above is stable. O(1).
   *
   * @param highest a growth rate that exceeds it
   */
  double growth(double kx, double ky, double highest) {
    double low = 1e-9 * highest;
    if (curvature(low, kx, ky) >= 0.0) {
      return 0.0;
    }
    double high = highest;
    for (int step = 0; step < BISECTIONS && high - low > 4.0 * Math.ulp(high); step++) {
      double middle = 0.5 * (low + high);
      if (curvature(middle, kx, ky) < 0.0) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return 0.5 * (low + high);
  }

  /** The coefficient c of zeta^2 above the top: negative where waves propagate; rises with s. */
  private double curvature(double growth, double kx, double ky) {
    response.evaluate(growth, kx);
    wave.exact(kx, ky);
    form.fill(atmosphere, top, top + 1, growth * growth, wave, response.gas, response.cosmicRay);
    return form.c[top];
  }

  /** ds/dkx of the edge at a growth rate on it. */
  double slope(double growth, double kx, double ky) {
    displacement.uniformAtTop(growth, kx, ky);
    return -displacement.byWavenumber / displacement.byGrowth;
  }
}
