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
  private final double[] verticalSlope;
  private final double[] force;
  private final double[] gasStiffness;
  private final double[] cosmicRayStiffness;
  private final double[] stiffnessByGrowth;
  private final double[] stiffnessByWavenumber;
  /** sqrt(rho) times X, Y, Z and the divergence D on the nodes. */
  final double[] along;
  final double[] across;
  final double[] zeta;
  final double[] divergence;

  /** The perturbed potential psi (see {@link PotentialForm}); 0 where the gas is light. */
  final double[] potential;

  /** Derivatives of the form along the vector with respect to s and kx. */
  double byGrowth;
  double byWavenumber;

  private double growth;
  private double kx;
  private double ky;
  private double decay;

  Displacement(Atmosphere atmosphere, PressureResponse response) {
    this.atmosphere = atmosphere;
    this.response = response;
    int n = atmosphere.nodes();
    verticalSlope = new double[n];
    along = new double[n];
    across = new double[n];
    zeta = new double[n];
    divergence = new double[n];
    potential = new double[n];
    force = new double[n];
    gasStiffness = new double[n];
    cosmicRayStiffness = new double[n];
    stiffnessByGrowth = new double[n];
    stiffnessByWavenumber = new double[n];
  }

  /**
   * Completes the displacement from {@link #zeta} and evaluates the slopes. O(elements * degree^2), no allocation.
   *
   * @param newGrowth s
   * @param newKx     along the field
   * @param newKy     across it
   * @param newDecay  decay rate of zeta above an open top, 0 otherwise
   */
  void complete(double newGrowth, double newKx, double newKy, double newDecay) {
    growth = newGrowth;
    kx = newKx;
    ky = newKy;
    decay = newDecay;
    int last = atmosphere.nodes() - 1;
    soften(0, last + 1);
    differentiate();
    byGrowth = 0.0;
    byWavenumber = 0.0;
    weighDown();
    if (decay > 0.0) {
      double below = aboveTop(last);
      slopes(last, last + 1, 0.5 / (decay * atmosphere.weight[last]));
      verticalSlope[last] = below;
      force[last] += atmosphere.jeansFrequency[last] * potential[last];
    }
    horizontal(0, last + 1, ky);
    slopes(0, last + 1, 1.0);
    if (atmosphere.gravitating) {
      byWavenumber += potentialByWavenumber();
    }
  }

  /** The force along D: gravity on what is displaced, and the perturbed potential. */
  private void weighDown() {
    double[] gravity = atmosphere.gravity;
    for (int i = 0; i < force.length; i++) {
      force[i] = gravity[i] * zeta[i];
    }
    if (atmosphere.gravitating) {
      double[] jeans = atmosphere.jeansFrequency;
      for (int i = 0; i < force.length; i++) {
        force[i] += jeans[i] * potential[i];
      }
    }
  }

  /** Sets the last node to what the light gas above an open top does; returns the slope to be put back. */
  private double aboveTop(int last) {
    double below = verticalSlope[last];
    verticalSlope[last] = (0.5 * atmosphere.inverseScaleHeight[last] - decay) * zeta[last];
    force[last] -= atmosphere.jeansFrequency[last] * potential[last];
    horizontal(last, last + 1, ky);
    return below;
  }

  /** Derivative of the energy of the potential, with what it has above the top, with respect to kx. */
  private double potentialByWavenumber() {
    double square = 0.0;
    for (int i = 0; i < potential.length; i++) {
      square += atmosphere.weight[i] * potential[i] * potential[i];
    }
    double top = potential[potential.length - 1];
    return 2.0 * kx * square + kx / Math.hypot(kx, ky) * top * top;
  }

  /** sqrt(rho) Z' on the nodes: zeta' + zeta/(2 h). */
  private void differentiate() {
    ReferenceElement element = atmosphere.mesh.reference();
    double[] derivative = element.derivative();
    double[] inverseScaleHeight = atmosphere.inverseScaleHeight;
    int n = element.degree() + 1;
    for (int e = 0; e < atmosphere.mesh.elements(); e++) {
      double scale = 2.0 / atmosphere.mesh.length(e);
      int start = e * n;
      for (int i = 0; i < n; i++) {
        double sum = 0.0;
        int row = i * n;
        for (int j = 0; j < n; j++) {
          sum += derivative[row + j] * zeta[start + j];
        }
        verticalSlope[start + i] = scale * sum + 0.5 * inverseScaleHeight[start + i] * zeta[start + i];
      }
    }
  }

  /** How stiff gas and cosmic rays are at each node, and how that changes with s and kx. */
  private void soften(int from, int to) {
    response.evaluate(growth, kx);
    for (int i = from; i < to; i++) {
      if (atmosphere.turning) {
        response.evaluate(growth, Math.abs(atmosphere.alongShare[i]) * kx);
      }
      double cosmicRays = atmosphere.cosmicRayPerMass[i];
      double gas = atmosphere.gasPerMass[i];
      gasStiffness[i] = response.gas * gas;
      cosmicRayStiffness[i] = response.cosmicRay * cosmicRays;
      stiffnessByGrowth[i] = response.gasByGrowth * gas + response.cosmicRayByGrowth * cosmicRays;
      stiffnessByWavenumber[i] = response.cosmicRayByWavenumber * Math.abs(atmosphere.alongShare[i]) * cosmicRays;
    }
  }

  /** The X, Y and D that make the form stationary at each node. */
  private void horizontal(int from, int to, double acrossStraight) {
    double[] alfvenSquared = atmosphere.alfvenSquared;
    double[] alongShare = atmosphere.alongShare;
    double[] acrossShare = atmosphere.acrossShare;
    double growthSquared = growth * growth;
    for (int i = from; i < to; i++) {
      double v = alfvenSquared[i];
      double fall = force[i];
      double slope = verticalSlope[i];
      double stiffness = gasStiffness[i] + cosmicRayStiffness[i];
      double waveAlong = kx * alongShare[i];
      double waveAcross = acrossStraight + kx * acrossShare[i];
      double alongSquared = waveAlong * waveAlong;
      double q = 1.0 / (growthSquared + stiffness * alongSquared);
      double m = growthSquared * q;
      double squeeze = m * stiffness + v;
      double y = -waveAcross * (squeeze * slope - m * fall)
          / (growthSquared + alongSquared * v + squeeze * waveAcross * waveAcross);
      double perpendicular = waveAcross * y + slope;
      double x = -waveAlong * q * (stiffness * perpendicular - fall);
      along[i] = x;
      across[i] = y;
      divergence[i] = waveAlong * x + perpendicular;
    }
  }

  /** Adds the derivatives of the full form at fixed X, Y, Z over a range of nodes, times a factor. */
  private void slopes(int from, int to, double factor) {
    double[] weight = atmosphere.weight;
    double inertia = 0.0;
    double work = 0.0;
    double answer = 0.0;
    double softening = 0.0;
    for (int i = from; i < to; i++) {
      double x = along[i];
      double y = across[i];
      double z = zeta[i];
      double d = divergence[i];
      double w = weight[i];
      double v = atmosphere.alfvenSquared[i];
      double c = atmosphere.alongShare[i];
      double s = atmosphere.acrossShare[i];
      double perpendicular = d - kx * c * x;
      double pressure = (gasStiffness[i] + cosmicRayStiffness[i]) * d - force[i];
      inertia += w * (x * x + y * y + z * z);
      work += w * (pressure * (c * x + s * y) + v * (perpendicular * s * y + kx * c * c * (y * y + z * z)));
      answer += w * stiffnessByGrowth[i] * d * d;
      softening += w * stiffnessByWavenumber[i] * d * d;
    }
    byGrowth += factor * (2.0 * growth * inertia + answer);
    byWavenumber += factor * (2.0 * work + softening);
  }

  /** Slopes of the form of the atmosphere at the top alone, for zeta = 1 without vertical variation. */
  void uniformAtTop(double newGrowth, double newKx, double ky) {
    growth = newGrowth;
    kx = newKx;
    byGrowth = 0.0;
    byWavenumber = 0.0;
    int last = atmosphere.nodes() - 1;
    soften(last, last + 1);
    zeta[last] = 1.0;
    force[last] = atmosphere.gravity[last];
    verticalSlope[last] = 0.5 * atmosphere.inverseScaleHeight[last];
    horizontal(last, last + 1, ky);
    slopes(last, last + 1, 1.0);
  }

  /**
   * The terms of the form along the vector, over its inertia, with the sign of their part in s^2.
   *
   * @param topSurface coefficient of zeta^2 at a free surface, 0 without one
   */
  WorkTerms work(double topSurface) {
    int last = atmosphere.nodes() - 1;
    double[] sums = new double[7];
    addWork(sums, 0, last + 1, 1.0);
    double gravitation = atmosphere.gravitating ? gravitation() : 0.0;
    if (decay > 0.0) {
      double below = aboveTop(last);
      addWork(sums, last, last + 1, 0.5 / (decay * atmosphere.weight[last]));
      verticalSlope[last] = below;
      force[last] += atmosphere.jeansFrequency[last] * potential[last];
      horizontal(last, last + 1, ky);
    }
    double inertia = sums[6];
    return new WorkTerms(-sums[0] / inertia, -sums[1] / inertia, -sums[2] / inertia, -sums[3] / inertia,
        -sums[4] / inertia, -sums[5] / inertia, -topSurface * zeta[last] * zeta[last] / inertia,
        -gravitation / inertia);
  }

  /** The terms of the form that hold the potential. */
  private double gravitation() {
    double[] slope = atmosphere.mesh.slopes(potential);
    double waveSquared = kx * kx + ky * ky;
    double sum = 0.0;
    for (int i = 0; i < potential.length; i++) {
      double compression = divergence[i] - atmosphere.inverseScaleHeight[i] * zeta[i];
      sum += atmosphere.weight[i] * (slope[i] * slope[i] + waveSquared * potential[i] * potential[i]
          - 2.0 * atmosphere.jeansFrequency[i] * potential[i] * compression);
    }
    int last = potential.length - 1;
    double sheet = 2.0 * atmosphere.jeansFrequency[last] * potential[last] * zeta[last];
    return sum + Math.sqrt(waveSquared) * potential[last] * potential[last] + sheet;
  }

  private void addWork(double[] sums, int from, int to, double factor) {
    for (int i = from; i < to; i++) {
      double w = factor * atmosphere.weight[i];
      double d = divergence[i];
      double waveAlong = kx * atmosphere.alongShare[i];
      double perpendicular = d - waveAlong * along[i];
      double sideways = across[i] * across[i] + zeta[i] * zeta[i];
      sums[0] += w * gasStiffness[i] * d * d;
      sums[1] += w * cosmicRayStiffness[i] * d * d;
      sums[2] += w * atmosphere.alfvenSquared[i] * perpendicular * perpendicular;
      sums[3] += w * waveAlong * waveAlong * atmosphere.alfvenSquared[i] * sideways;
      sums[4] -= w * 2.0 * atmosphere.gravity[i] * zeta[i] * d;
      sums[5] += w * atmosphere.fall[i] * zeta[i] * zeta[i];
      sums[6] += w * (along[i] * along[i] + sideways);
    }
  }

  /** Relative rounding error of a growth rate: terms of this size cancel in the form. */
  double rounding(double s) {
    double magnitude = 0.0;
    for (int i = 0; i < atmosphere.nodes(); i++) {
      double z = zeta[i];
      double slope = verticalSlope[i];
      double v = atmosphere.alfvenSquared[i];
      double flat = s * s + kx * kx * v + atmosphere.gravity[i] * atmosphere.inverseScaleHeight[i];
      double pull = Math.abs(atmosphere.jeansFrequency[i] * potential[i]);
      magnitude += atmosphere.weight[i] * (pull * (pull + Math.abs(slope))
          + (atmosphere.gasPerMass[i] + v) * slope * slope + flat * z * z);
    }
    return ROUNDING * magnitude / (s * byGrowth);
  }

  /** Height of the kinetic-energy centroid, including what lies above an open top. */
  double centroid() {
    double inertia = 0.0;
    double moment = 0.0;
    for (int i = 0; i < atmosphere.nodes(); i++) {
      double energy = atmosphere.weight[i] * square(i);
      inertia += energy;
      moment += energy * atmosphere.height[i];
    }
    if (decay > 0.0) {
      int last = atmosphere.nodes() - 1;
      double above = square(last) * 0.5 / decay;
      inertia += above;
      moment += above * (atmosphere.height[last] + 0.5 / decay);
    }
    return moment / inertia;
  }

  private double square(int i) {
    return along[i] * along[i] + across[i] * across[i] + zeta[i] * zeta[i];
  }
}
