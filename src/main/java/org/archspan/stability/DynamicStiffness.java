package org.archspan.stability;

import org.archspan.boundary.TopBoundary;
import org.archspan.linalg.ElementAssembly;
import org.archspan.linalg.PackedElimination;
import org.archspan.linalg.TwistedTridiagonal;
import org.archspan.mesh.ReferenceElement;

/**
 * The matrix S(s, kx, ky) of the condensed form on a mesh, factored element by element.
 *
 * <p>Every term grows with s, so the number of its negative eigenvalues is the number of modes that grow faster than s:
 * the count of Wittrick and Williams (1971), Q. J. Mech. Appl. Math. 24, 263. The inner nodes of each element are
 * eliminated first; what is left couples the element ends in a tridiagonal matrix of Schur complements.
 *
 * <p>All quantities in {@link Scales}. Owns its work arrays: one instance for one thread.
 */
final class DynamicStiffness {
  /** Stands for infinitely many modes: the growth rate lies in the continuum of the atmosphere above. */
  static final int INFINITE = Integer.MAX_VALUE;

  private final Atmosphere atmosphere;
  private final PressureResponse response;
  private final TopCondition top;
  private final ReferenceElement element;
  private final int elements;
  private final int first;
  private final int unknowns;
  private final CondensedForm form;
  private final WaveSquared wave = new WaveSquared();
  private final double[] packed;
  private final double[] diagonal;
  private final double[] offDiagonal;
  private final double[] ends;
  private final boolean[] crowded;
  private final TwistedTridiagonal tridiagonal;
  private long factorisations;

  /**
   * A problem on a mesh.
   *
   * @param bottomFixed whether zeta vanishes at the lower end
   */
  DynamicStiffness(Atmosphere atmosphere, PressureResponse response, boolean bottomFixed, TopBoundary topBoundary) {
    this.atmosphere = atmosphere;
    this.response = response;
    this.top = new TopCondition(topBoundary);
    this.element = atmosphere.mesh.reference();
    this.elements = atmosphere.mesh.elements();
    this.first = bottomFixed ? 1 : 0;
    this.unknowns = elements + 1 - first - (top.fixed() ? 1 : 0);
    this.form = new CondensedForm(atmosphere.nodes());
    this.packed = new double[elements * element.pairFirst().length];
    this.diagonal = new double[elements + 1];
    this.offDiagonal = new double[elements];
    this.ends = new double[elements + 1];
    this.crowded = new boolean[elements];
    this.tridiagonal = new TwistedTridiagonal(elements + 1);
  }

  Atmosphere atmosphere() {
    return atmosphere;
  }

  PressureResponse response() {
    return response;
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
    wave.tangent(lowest, highest, lowest, ky);
    if (count(growth, highest) > 0) {
      return false;
    }
    wave.tangent(lowest, highest, highest, ky);
    return count(growth, highest) == 0;
  }

  private int count(double growth, double softestAt) {
    factorisations++;
    response.evaluate(growth, softestAt);
    form.fill(atmosphere, 0, atmosphere.nodes(), growth * growth, wave, response.gas, response.cosmicRay);
    if (!top.evaluate(form, atmosphere, atmosphere.nodes() - 1)) {
      return INFINITE;
    }
    weigh();
    return condense() + tridiagonal.count(diagonal, offDiagonal, first, unknowns);
  }

  private int condense() {
    int n = element.degree() + 1;
    int pairs = element.pairFirst().length;
    int negative = 0;
    diagonal[0] = 0.0;
    for (int e = 0; e < elements; e++) {
      int offset = e * pairs;
      ElementAssembly.assemble(form.a, form.b, form.c, e * n, n, element.slopeProducts(), element.pairFirst(),
          element.pairSecond(), element.pairSlope(), element.pairSlopeReversed(), packed, offset);
      int inside = PackedElimination.eliminate(packed, offset, n, n - 2);
      crowded[e] = inside > 0;
      negative += inside;
      diagonal[e] += packed[offset + pairs - 3];
      offDiagonal[e] = packed[offset + pairs - 2];
      diagonal[e + 1] = packed[offset + pairs - 1];
    }
    diagonal[elements] += top.entry();
    return negative;
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

  private void weigh() {
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
   * After a count at one kx: the vector zeta that S almost annihilates, on all nodes.
   *
   * @param zeta receives the values, shape [elements * (degree + 1)]
   * @return the quadratic form zeta^T S zeta
   */
  double nullVector(double[] zeta) {
    tridiagonal.nullVector(diagonal, offDiagonal, first, ends);
    int n = element.degree() + 1;
    int pairs = element.pairFirst().length;
    ends[0] = first == 1 ? 0.0 : ends[0];
    ends[elements] = top.fixed() ? 0.0 : ends[elements];
    double[] local = new double[n];
    for (int e = 0; e < elements; e++) {
      local[n - 2] = ends[e];
      local[n - 1] = ends[e + 1];
      PackedElimination.extend(packed, e * pairs, n, n - 2, local);
      System.arraycopy(local, 0, zeta, e * n + 1, n - 2);
      zeta[e * n] = local[n - 2];
      zeta[e * n + n - 1] = local[n - 1];
    }
    return tridiagonal.residual();
  }

  /** The quadratic form of the latest null vector. */
  double residual() {
    return tridiagonal.residual();
  }
}
