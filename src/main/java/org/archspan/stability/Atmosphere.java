package org.archspan.stability;

import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.GasState;
import org.archspan.mesh.Mesh;
import org.archspan.units.Constants;

/**
 * The base state on the nodes of a mesh, per unit mass and in {@link Scales}: all the eigenproblem needs. The density
 * itself drops out, so exp(-1000) does no harm. Immutable; the flat arrays are shared and must not be written.
 */
final class Atmosphere {
  /** The mesh, in scale lengths. */
  final Mesh mesh;

  /** Node heights, quadrature weights times element length, and the base state; shape [elements * (degree + 1)]. */
  final double[] height;
  final double[] weight;
  final double[] gravity;
  final double[] alfvenSquared;
  final double[] gasPerMass;
  final double[] cosmicRayPerMass;
  /** Minus d ln(rho)/dz. */
  final double[] inverseScaleHeight;
  /** g times minus d ln(rho)/dz, and g^2. */
  final double[] fall;
  final double[] gravitySquared;
  /** Quadrature weights for products of two, one and no slopes taken on the reference element. */
  final double[] slopeWeight;
  final double[] mixedWeight;
  /** sqrt(4 pi G rho) where the perturbed gravity of the gas acts, 0 otherwise. */
  final double[] jeansFrequency;
  /** Whether it acts. */
  final boolean gravitating;
  /** Components of the wavevector along and across the local field, for each unit of kx: 1 and 0 in a straight field. */
  final double[] alongShare;
  final double[] acrossShare;
  /** Whether they differ from that. */
  final boolean turning;

  Atmosphere(Equilibrium equilibrium, Scales scales, Mesh mesh, boolean gravitating, FieldTurn turn) {
    this.gravitating = gravitating;
    turning = turn.turns();
    this.mesh = mesh;
    height = mesh.nodes();
    int n = height.length;
    weight = new double[n];
    gravity = new double[n];
    alfvenSquared = new double[n];
    gasPerMass = new double[n];
    cosmicRayPerMass = new double[n];
    inverseScaleHeight = new double[n];
    fall = new double[n];
    gravitySquared = new double[n];
    slopeWeight = new double[n];
    mixedWeight = new double[n];
    jeansFrequency = new double[n];
    alongShare = new double[n];
    acrossShare = new double[n];
    double[] reference = mesh.reference().weights();
    double energy = scales.speed() * scales.speed();
    for (int i = 0; i < n; i++) {
      int e = i / reference.length;
      weight[i] = 0.5 * mesh.length(e) * reference[i % reference.length];
      mixedWeight[i] = reference[i % reference.length];
      slopeWeight[i] = 2.0 / mesh.length(e) * reference[i % reference.length];
      GasState state = equilibrium.at(insideElement(mesh, e, height[i]) * scales.length());
      gravity[i] = state.gravity() * scales.length() / energy;
      alfvenSquared[i] = 2.0 * state.magneticPerMass() / energy;
      gasPerMass[i] = state.gasPerMass() / energy;
      cosmicRayPerMass[i] = state.cosmicRayPerMass() / energy;
      inverseScaleHeight[i] = -state.logDensityGradient() * scales.length();
      fall[i] = gravity[i] * inverseScaleHeight[i];
      gravitySquared[i] = gravity[i] * gravity[i];
      double angle = turn.angle(height[i] * scales.length() - equilibrium.bottom());
      alongShare[i] = Math.cos(angle);
      acrossShare[i] = Math.sin(angle);
      jeansFrequency[i] = gravitating
          ? scales.time() * Math.sqrt(4.0 * Math.PI * Constants.GRAVITATIONAL_CONSTANT * state.density()) : 0.0;
    }
  }

  /** Moves a node on an element's end a hair inwards, so that a kink there is seen from the right side. */
  private static double insideElement(Mesh mesh, int e, double z) {
    double hair = 1e-14 * mesh.length(e);
    return Math.max(mesh.edges()[e] + hair, Math.min(mesh.edges()[e + 1] - hair, z));
  }

  int nodes() {
    return height.length;
  }

  /** Square root of the density at the nodes over that at the lower end. */
  double[] rootDensity(Equilibrium equilibrium, Scales scales) {
    double bottom = equilibrium.at(equilibrium.bottom()).logDensity();
    double[] root = new double[height.length];
    for (int i = 0; i < root.length; i++) {
      root[i] = Math.exp(0.5 * (equilibrium.at(height[i] * scales.length()).logDensity() - bottom));
    }
    return root;
  }
}
