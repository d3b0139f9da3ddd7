package org.archspan.stability;

import org.archspan.mesh.ReferenceElement;

/**
 * The displacement that belongs to a vector zeta, and the slopes of the quadratic form along it. By the envelope theorem
 * the derivative of the condensed form with respect to any input is that of the full form at the X and Y that make it
 * stationary; the part above an open top is integrated exactly.
 *
 * <p>All quantities in {@link Scales}. Owns its work arrays: one instance for one thread.
 */
final class Displacement {
  /** Rounding of a term of the form, relative; a few units in the last place, enlarged by the slopes of the elements. */
  private static final double ROUNDING = 4e-15;

  private final Atmosphere atmosphere;
  private final PressureResponse response;
  private final double[] slope;
  /** sqrt(rho) times X, Y, Z and the divergence D on the nodes. */
  final double[] along;
  final double[] across;
  final double[] zeta;
  final double[] divergence;

  /** Derivatives of the form along the vector with respect to s and kx. */
  double byGrowth;
  double byWavenumber;
  /** Integral of rho (X^2 + Y^2 + Z^2), and of that times height. */
  double inertia;
  double inertiaMoment;

  private double magnitude;
  private double growth;
  private double kx;
  private double ky;

  Displacement(Atmosphere atmosphere, PressureResponse response) {
    this.atmosphere = atmosphere;
    this.response = response;
    int n = atmosphere.nodes();
    slope = new double[n];
    along = new double[n];
    across = new double[n];
    zeta = new double[n];
    divergence = new double[n];
  }

  /**
   * Completes the displacement from {@link #zeta} and evaluates the slopes. O(elements * degree^2).
   *
   * @param growth s
   * @param kx     along the field
   * @param ky     across it
   * @param decay  decay rate of zeta above an open top, 0 otherwise
   */
  void complete(double growth, double kx, double ky, double decay) {
    this.growth = growth;
    this.kx = kx;
    this.ky = ky;
    response.evaluate(growth, kx);
    differentiate();
    byGrowth = 0.0;
    byWavenumber = 0.0;
    inertia = 0.0;
    inertiaMoment = 0.0;
    magnitude = 0.0;
    int n = atmosphere.nodes();
    for (int i = 0; i < n; i++) {
      accumulate(i, slope[i], atmosphere.weight[i], atmosphere.height[i]);
    }
    if (decay > 0.0) {
      accumulateAbove(decay);
    }
  }

  private void differentiate() {
    ReferenceElement element = atmosphere.mesh.reference();
    double[] derivative = element.derivative();
    int n = element.degree() + 1;
    for (int e = 0; e < atmosphere.mesh.elements(); e++) {
      double scale = 2.0 / atmosphere.mesh.length(e);
      for (int i = 0; i < n; i++) {
        double sum = 0.0;
        for (int j = 0; j < n; j++) {
          sum += derivative[i * n + j] * zeta[e * n + j];
        }
        slope[e * n + i] = scale * sum;
      }
    }
  }

  /** Adds the integrand at node i, with a given slope of zeta, times a weight. */
  private void accumulate(int i, double zetaSlope, double weight, double height) {
    double z = zeta[i];
    double g = atmosphere.gravity[i];
    double v = atmosphere.alfvenSquared[i];
    double h = atmosphere.inverseScaleHeight[i];
    double stiffness = response.gas * atmosphere.gasPerMass[i] + response.cosmicRay * atmosphere.cosmicRayPerMass[i];
    double q = 1.0 / (growth * growth + stiffness * kx * kx);
    double m = growth * growth * q;
    double verticalSlope = zetaSlope + 0.5 * h * z;
    double tension = growth * growth + kx * kx * v;
    double squeeze = m * stiffness + v;
    double y = -ky * (squeeze * verticalSlope - m * g * z) / (tension + squeeze * ky * ky);
    double perpendicular = ky * y + verticalSlope;
    double drive = stiffness * perpendicular - g * z;
    double x = -kx * q * drive;
    double d = kx * x + perpendicular;
    double square = x * x + y * y + z * z;
    double answer = atmosphere.cosmicRayPerMass[i] * d * d;
    along[i] = x;
    across[i] = y;
    divergence[i] = d;
    byGrowth += weight * (2.0 * growth * square + response.cosmicRayByGrowth * answer);
    byWavenumber += weight * (2.0 * kx * (v * (y * y + z * z) - q * m * drive * drive)
        + response.cosmicRayByWavenumber * answer);
    magnitude += weight * (squeeze * verticalSlope * verticalSlope + (tension + g * h) * z * z);
    inertia += weight * square;
    inertiaMoment += weight * square * height;
  }

  /** Above an open top everything falls as exp(-2 decay z): the integrals are the top's integrand over 2 decay. */
  private void accumulateAbove(double decay) {
    int last = atmosphere.nodes() - 1;
    double top = atmosphere.height[last];
    accumulate(last, -decay * zeta[last], 0.5 / decay, top + 0.5 / decay);
    slopeAtTop();
  }

  /** Slopes of the form of the atmosphere at the top alone, for zeta = 1 without vertical variation. */
  void uniformAtTop(double newGrowth, double newKx, double newKy) {
    growth = newGrowth;
    kx = newKx;
    ky = newKy;
    response.evaluate(growth, kx);
    byGrowth = 0.0;
    byWavenumber = 0.0;
    int last = atmosphere.nodes() - 1;
    zeta[last] = 1.0;
    accumulate(last, 0.0, 1.0, 0.0);
  }

  /** Restores the pointwise values at the top, which belong to the side below it. */
  private void slopeAtTop() {
    int last = atmosphere.nodes() - 1;
    accumulate(last, slope[last], 0.0, 0.0);
  }

  /** Relative rounding error of a growth rate: terms of this size cancel in the form. */
  double rounding(double s) {
    return ROUNDING * magnitude / (s * byGrowth);
  }

  /** Height of the kinetic-energy centroid. */
  double centroid() {
    return inertiaMoment / inertia;
  }
}
