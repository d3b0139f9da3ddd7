package org.archspan.stability;

import org.archspan.boundary.Parity;
import org.archspan.equilibrium.Equilibrium;

/**
 * Turns the displacement of a root into a mode in CGS, normalised so that the midplane layer moves by one scale height:
 * the root-mean-square displacement, weighted by the square of the density, is one scale height.
 */
final class ModeShape {
  private final ModeSolver solver;
  private final Atmosphere atmosphere;
  private final Displacement displacement;
  private final Equilibrium equilibrium;
  private final double[] rootDensity;

  /** The shape of the root that the checking mesh of a solver holds. */
  ModeShape(ModeSolver solver) {
    this.solver = solver;
    atmosphere = solver.checking().stiffness().atmosphere();
    displacement = solver.checking().displacement();
    equilibrium = solver.problem().equilibrium();
    double bottom = equilibrium.at(equilibrium.bottom()).logDensity();
    rootDensity = new double[atmosphere.nodes()];
    for (int i = 0; i < rootDensity.length; i++) {
      double z = atmosphere.height[i] * solver.scales().length();
      rootDensity[i] = Math.exp(0.5 * (equilibrium.at(z).logDensity() - bottom));
    }
  }

  /** Root-mean-square displacement weighted by the square of the density, in the vector's own unit. */
  private double layerDisplacement() {
    double weightSum = 0.0;
    double square = 0.0;
    for (int i = 0; i < atmosphere.nodes(); i++) {
      double density = rootDensity[i] * rootDensity[i];
      double x = displacement.along[i];
      double y = displacement.across[i];
      double z = displacement.zeta[i];
      weightSum += atmosphere.weight[i] * density * density;
      square += atmosphere.weight[i] * density * (x * x + y * y + z * z);
    }
    return Math.sqrt(square / weightSum);
  }

  /** Integral of rho_1 from the lower end up, over the bottom density times the scale length. */
  private double halfColumn() {
    double sum = 0.0;
    for (int i = 0; i < atmosphere.nodes(); i++) {
      sum += atmosphere.weight[i] * densityChange(i) * rootDensity[i];
    }
    double decay = solver.checking().stiffness().top().decay();
    if (solver.checking().stiffness().top().open()) {
      int last = atmosphere.nodes() - 1;
      sum += densityChange(last) * rootDensity[last] / (decay + 0.5 * atmosphere.inverseScaleHeight[last]);
    }
    return sum;
  }

  /** sqrt(rho) times rho_1/rho at a node. */
  private double densityChange(int i) {
    return atmosphere.inverseScaleHeight[i] * displacement.zeta[i] - displacement.divergence[i];
  }

  /** Amplitude of the surface-density contrast, dimensionless; exactly 0 where the two sides of a disk cancel. */
  double columnContrast() {
    if (solver.problem().parity() == Parity.FLEXING) {
      return 0.0;
    }
    return Math.abs(halfColumn()) / layerDisplacement();
  }

  /** Height of the kinetic-energy centroid, cm. */
  double centroidHeight() {
    return displacement.centroid() * solver.scales().length();
  }

  /** All nodes, each shared end of two elements once. */
  private int[] distinctNodes() {
    int perElement = atmosphere.mesh.degree() + 1;
    return java.util.stream.IntStream.range(0, atmosphere.nodes()).filter(i -> i == 0 || i % perElement != 0).toArray();
  }

  EigenMode mode(int order, double wavenumber, double growthRate) {
    double length = solver.scales().length();
    int[] nodes = distinctNodes();
    int n = nodes.length;
    double norm = length / layerDisplacement() * (halfColumn() < 0.0 ? -1.0 : 1.0);
    double[][] values = new double[7][n];
    double greatest = 0.0;
    for (int to = 0; to < n; to++) {
      int i = nodes[to];
      double scale = norm / rootDensity[i];
      values[0][to] = atmosphere.height[i] * length;
      values[1][to] = scale * displacement.along[i];
      values[2][to] = scale * displacement.across[i];
      values[3][to] = scale * displacement.zeta[i];
      values[4][to] = scale * displacement.divergence[i] / length;
      values[5][to] = scale * densityChange(i) / length;
      double x = displacement.along[i];
      double y = displacement.across[i];
      double z = displacement.zeta[i];
      values[6][to] = x * x + y * y + z * z;
      greatest = Math.max(greatest, values[6][to]);
    }
    for (int i = 0; i < n; i++) {
      values[6][i] /= greatest;
    }
    return new EigenMode(solver.problem().parity(), order, wavenumber, solver.problem().crossWavenumber(), growthRate,
        values[0], values[1], values[2], values[3], values[4], values[5], values[6], centroidHeight(),
        columnContrast());
  }
}
