package org.archspan.stability;

/**
 * The edge of the continuum of the uniform atmosphere above an open top: waves without vertical variation of zeta there
 * (the kz = 0 branch of Parker's 1966 atmosphere). Slower waves propagate away upwards; their number is infinite.
 */
final class HaloEdge {
  private static final int BISECTIONS = 60;
  private static final int SAMPLES = 200;
  /** The edge is a root of an explicit function, found to rounding; its peak to the rounding of a slope. */
  private static final double WAVENUMBER_ERROR = 1e-12;

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
  private double slope(double growth, double kx, double ky) {
    displacement.uniformAtTop(growth, kx, ky);
    return -displacement.byWavenumber / displacement.byGrowth;
  }

  /**
   * The greatest growth rate of the edge over a range of wavenumbers, as (kx, s); s is 0 when the atmosphere is stable.
   *
   * @param lowest  0 or more
   * @param highest finite
   */
  GrowthRoot peak(double lowest, double highest, double ky, double fastestPossible) {
    GrowthRoot best = new GrowthRoot(lowest, 0.0, 0.0, 0.0);
    int at = 0;
    for (int i = 1; i <= SAMPLES; i++) {
      double kx = lowest + (highest - lowest) * i / SAMPLES;
      double s = growth(kx, ky, fastestPossible);
      if (s > best.growth()) {
        best = new GrowthRoot(kx, s, 0.0, 0.0);
        at = i;
      }
    }
    if (best.growth() == 0.0) {
      return best;
    }
    double low = lowest + (highest - lowest) * (at - 1) / SAMPLES;
    double high = Math.min(highest, lowest + (highest - lowest) * (at + 1) / SAMPLES);
    for (int step = 0; step < BISECTIONS && high - low > 4.0 * Math.ulp(high); step++) {
      double middle = 0.5 * (low + high);
      double s = growth(middle, ky, fastestPossible);
      if (s > 0.0 && slope(s, middle, ky) > 0.0) {
        low = middle;
      } else {
        high = middle;
      }
    }
    double kx = 0.5 * (low + high);
    return new GrowthRoot(kx, growth(kx, ky, fastestPossible), 0.0, WAVENUMBER_ERROR);
  }
}
