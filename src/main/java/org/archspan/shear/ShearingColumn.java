package org.archspan.shear;

import java.util.ArrayList;
import java.util.List;
import org.archspan.boundary.TopBoundary;
import org.archspan.closure.CosmicRayClosure;
import org.archspan.closure.GasClosure;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.GasState;
import org.archspan.mesh.Mesh;

/**
 * The base state of a column on the nodes of a mesh, per unit mass, in units of the scale height and the isothermal speed at
 * the lower end. Immutable; the arrays are shared and must not be written.
 */
final class ShearingColumn {
  final Mesh mesh;
  /** Unit of length, cm, and of time, s. */
  final double length;
  final double time;
  /** Wavenumber along the field. */
  final double kx;
  final boolean bottomFixed;
  final boolean topFixed;
  /** Quadrature weights of the nodes, shape [elements * (degree + 1)] as all below. */
  final double[] weight;
  final double[] gravity;
  final double[] alfvenSquared;
  final double[] inverseScaleHeight;
  /** Stiffness per mass of what answers compression without relaxing. */
  final double[] stiffness;
  /** What relaxes meanwhile. */
  final List<Relaxation> relaxations;

  /**
   * Samples a base state.
   *
   * @param wavenumber along the field, cm^-1
   */
  ShearingColumn(Equilibrium equilibrium, GasClosure gas, CosmicRayClosure cosmicRays, Mesh mesh, double wavenumber,
      boolean bottomFixed) {
    this.mesh = mesh;
    this.bottomFixed = bottomFixed;
    topFixed = equilibrium.topBoundary() != TopBoundary.FREE;
    length = equilibrium.scaleHeight();
    double speed = equilibrium.dispersion();
    time = length / speed;
    kx = wavenumber * length;
    double[] height = mesh.nodes();
    int n = height.length;
    weight = new double[n];
    gravity = new double[n];
    alfvenSquared = new double[n];
    inverseScaleHeight = new double[n];
    double[] gasPerMass = new double[n];
    double[] cosmicRayPerMass = new double[n];
    double[] reference = mesh.reference().weights();
    double energy = speed * speed;
    for (int i = 0; i < n; i++) {
      int e = i / reference.length;
      weight[i] = 0.5 * mesh.length(e) * reference[i % reference.length];
      GasState state = equilibrium.at(insideElement(e, height[i]) * length);
      gravity[i] = state.gravity() * length / energy;
      alfvenSquared[i] = 2.0 * state.magneticPerMass() / energy;
      gasPerMass[i] = state.gasPerMass() / energy;
      cosmicRayPerMass[i] = state.cosmicRayPerMass() / energy;
      inverseScaleHeight[i] = -state.logDensityGradient() * length;
    }
    stiffness = new double[n];
    relaxations = new ArrayList<>();
    soften(gas, gasPerMass);
    soften(cosmicRays, cosmicRayPerMass, length * speed);
  }

  /** Moves a node on an element's end a hair inwards, so that a kink there is seen from the right side. */
  private double insideElement(int e, double z) {
    double hair = 1e-14 * mesh.length(e);
    return Math.max(mesh.edges()[e] + hair, Math.min(mesh.edges()[e + 1] - hair, z));
  }

  private void soften(GasClosure gas, double[] perMass) {
    add(perMass, gas.cools() ? 1.0 : gas.adiabaticIndex(), 0.0);
    if (gas.cools() && gas.adiabaticIndex() > 1.0) {
      add(perMass, gas.adiabaticIndex() - 1.0, time / gas.coolingTime());
    }
  }

  private void soften(CosmicRayClosure cosmicRays, double[] perMass, double diffusivityUnit) {
    if (Double.isFinite(cosmicRays.diffusivity())) {
      add(perMass, cosmicRays.adiabaticIndex(), cosmicRays.diffusivity() / diffusivityUnit * kx * kx);
    }
  }

  private void add(double[] perMass, double index, double rate) {
    double[] modulus = rate == 0.0 ? stiffness : new double[perMass.length];
    for (int i = 0; i < perMass.length; i++) {
      modulus[i] += index * perMass[i];
    }
    if (rate > 0.0) {
      relaxations.add(new Relaxation(modulus, rate));
    }
  }

  int nodes() {
    return weight.length;
  }

  /** Slope of z with height at each node. O(elements * degree^2), no allocation. */
  void differentiate(double[] z, double[] slopes) {
    double[] slope = mesh.reference().derivative();
    int n = mesh.degree() + 1;
    for (int e = 0; e < mesh.elements(); e++) {
      double toSlope = 2.0 / mesh.length(e);
      for (int q = 0; q < n; q++) {
        double sum = 0.0;
        for (int i = 0; i < n; i++) {
          sum += slope[q * n + i] * z[e * n + i];
        }
        slopes[e * n + q] = toSlope * sum;
      }
    }
  }
}
