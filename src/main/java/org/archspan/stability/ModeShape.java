package org.archspan.stability;

import org.archspan.boundary.Parity;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.GasState;

/**
 * Turns the displacement of a root into a mode in CGS, normalised so that the midplane layer moves by one scale height:
 * the root-mean-square displacement, weighted by the square of the density, is one scale height.
 */
final class ModeShape {
  private static final int HEIGHTS = 201;

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
    rootDensity = atmosphere.rootDensity(equilibrium, solver.scales());
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

  /** The mode on equidistant heights, whatever the mesh. */
  EigenMode mode(int order, double wavenumber, double growthRate) {
    double length = solver.scales().length();
    double norm = length / layerDisplacement() * (halfColumn() < 0.0 ? -1.0 : 1.0);
    double[][] values = new double[7][HEIGHTS];
    double bottomDensity = equilibrium.at(equilibrium.bottom()).logDensity();
    MeshInterpolation at = new MeshInterpolation(atmosphere.mesh);
    double greatest = 0.0;
    for (int i = 0; i < HEIGHTS; i++) {
      double z = equilibrium.bottom() + (equilibrium.top() - equilibrium.bottom()) * i / (HEIGHTS - 1);
      at.moveTo(z / length);
      GasState state = equilibrium.at(z);
      double scale = norm * Math.exp(0.5 * (bottomDensity - state.logDensity()));
      double x = at.value(displacement.along);
      double y = at.value(displacement.across);
      double zeta = at.value(displacement.zeta);
      double divergence = at.value(displacement.divergence);
      values[0][i] = z;
      values[1][i] = scale * x;
      values[2][i] = scale * y;
      values[3][i] = scale * zeta;
      values[4][i] = scale * divergence / length;
      values[5][i] = scale * (-state.logDensityGradient() * zeta - divergence / length);
      values[6][i] = x * x + y * y + zeta * zeta;
      greatest = Math.max(greatest, values[6][i]);
    }
    for (int i = 0; i < HEIGHTS; i++) {
      values[6][i] /= greatest;
    }
    return new EigenMode(solver.problem().parity(), order, wavenumber, solver.problem().crossWavenumber(), growthRate,
        values[0], values[1], values[2], values[3], values[4], values[5], values[6], centroidHeight(),
        columnContrast(), work());
  }

  private WorkTerms work() {
    WorkTerms scaled = displacement.work(solver.checking().stiffness().top().surface());
    double square = 1.0 / (solver.scales().time() * solver.scales().time());
    return new WorkTerms(scaled.gasCompression() * square, scaled.cosmicRayCompression() * square,
        scaled.fieldCompression() * square, scaled.fieldTension() * square, scaled.weight() * square,
        scaled.stratification() * square, scaled.topSurface() * square, scaled.selfGravity() * square);
  }
}
