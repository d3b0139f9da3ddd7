package org.archspan.stability;

import org.archspan.boundary.TopBoundary;
import org.archspan.mesh.ReferenceElement;

/**
 * The matrix S(s, kx, ky) of the condensed form on a mesh, factored element by element.
 *
 * <p>Every term grows with s, so the number of its negative eigenvalues is the number of modes that grow faster than s:
 * the count of Wittrick and Williams (1971), Q. J. Mech. Appl. Math. 24, 263. The inner nodes of each element are
 * eliminated first; what is left couples the element ends in a (block) tridiagonal matrix of Schur complements.
 *
 * <p>All quantities in {@link Scales}. Owns its work arrays: one instance for one thread.
 */
abstract sealed class DynamicStiffness permits LightStiffness, GravitatingStiffness {
  /** Stands for infinitely many modes: the growth rate lies in the continuum of the atmosphere above. */
  static final int INFINITE = Integer.MAX_VALUE;
  final Atmosphere atmosphere;
  final TopCondition top;
  final ReferenceElement element;
  final int elements;
  final boolean bottomFixed;
  final CondensedForm form;
  final PotentialForm potential;
  final WaveSquared wave;
  final boolean[] crowded;
  private final NodalForm nodal;
  private long factorisations;

  DynamicStiffness(Atmosphere atmosphere, PressureResponse response, boolean bottomFixed, TopBoundary topBoundary) {
    this.atmosphere = atmosphere;
    nodal = new NodalForm(atmosphere, response, topBoundary);
    this.bottomFixed = bottomFixed;
    this.top = nodal.top;
    this.wave = nodal.wave;
    this.element = atmosphere.mesh.reference();
    this.elements = atmosphere.mesh.elements();
    this.form = nodal.light;
    this.potential = nodal.potential;
    this.crowded = new boolean[elements];
  }

  /** The matrix of a problem on a mesh. */
  static DynamicStiffness of(ModeProblem problem, Atmosphere atmosphere, PressureResponse response) {
    return problem.perturbedGravity()
        ? new GravitatingStiffness(atmosphere, response, problem.bottomFixed(), problem.topBoundary())
        : new LightStiffness(atmosphere, response, problem.bottomFixed(), problem.topBoundary());
  }

  Atmosphere atmosphere() {
    return atmosphere;
  }

  TopCondition top() {
    return top;
  }

  /** Number of factorisations since the start. */
  long factorisations() {
    return factorisations;
  }

  /** Number of modes with wavenumber kx that grow faster than s. O(elements * degree^3). */
  int count(double growth, double kx, double ky) {
    wave.exact(kx, ky);
    return count(growth, kx);
  }

  /** An upper bound on the number of modes that grow faster than s at any one kx between two values. */
  int countBetween(double growth, double lowest, double highest, double ky) {
    wave.below(lowest, highest, ky);
    return count(growth, highest);
  }

  /** Whether the form at s is positive for every kx between two values: no mode grows faster at any of them. */
  boolean positiveBetween(double growth, double lowest, double highest, double ky) {
    double touching = tangentPoint(lowest, highest);
    wave.tangent(touching, lowest, highest, ky);
    if (count(growth, highest) > 0) {
      return false;
    }
    wave.tangent(touching, highest, highest, ky);
    return count(growth, highest) == 0;
  }

  /** The kx^2 at which the tangent form of an interval touches the true one: its middle, which leaves the widest margin. */
  double tangentPoint(double lowest, double highest) {
    return 0.5 * (lowest * lowest + highest * highest);
  }

  private int count(double growth, double softestAt) {
    factorisations++;
    return nodal.fill(growth, softestAt) ? factor() : INFINITE;
  }

  /** Weighs the filled form, factors the matrix and counts its negative eigenvalues. */
  abstract int factor();

  /** From coefficients at a height to those of the quadrature. */
  final void weigh() {
    double[] slopeWeight = atmosphere.slopeWeight;
    double[] mixedWeight = atmosphere.mixedWeight;
    double[] weight = atmosphere.weight;
    for (int i = 0; i < weight.length; i++) {
      form.a[i] *= slopeWeight[i];
      form.b[i] *= mixedWeight[i];
      form.c[i] *= weight[i];
    }
  }

  /**
   * The elements that held a whole mode between fixed ends at the last count. There the Schur complement has a pole
   * beside its root, and the root's vector is lost in rounding: such elements must be split.
   */
  boolean[] crowded() {
    return crowded;
  }

  /** Whether any element is {@link #crowded()}. */
  boolean anyCrowded() {
    for (boolean full : crowded) {
      if (full) {
        return true;
      }
    }
    return false;
  }

  /**
   * After a count at one kx: the vector that S almost annihilates, on all nodes.
   *
   * @param into receives zeta, and the potential where the gas is not light
   * @return the quadratic form of that vector
   */
  abstract double nullVector(Displacement into);

  /** The quadratic form of the latest null vector. */
  abstract double residual();
}
