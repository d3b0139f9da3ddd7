package org.archspan.stability;

import org.archspan.boundary.TopBoundary;
import org.archspan.linalg.ElementAssembly;
import org.archspan.linalg.PackedElimination;
import org.archspan.linalg.TwistedTridiagonal;

/** The matrix of a gas too light to feel its own perturbed gravity: one unknown, zeta, at each node. */
final class LightStiffness extends DynamicStiffness {
  private final int first;
  private final int unknowns;
  private final double[] packed;
  private final double[] diagonal;
  private final double[] offDiagonal;
  private final double[] ends;
  private final double[] local;
  private final TwistedTridiagonal tridiagonal;

  /**
   * A problem on a mesh.
   *
   * @param bottomFixed whether zeta vanishes at the lower end
   */
  LightStiffness(Atmosphere atmosphere, PressureResponse response, boolean bottomFixed, TopBoundary topBoundary) {
    super(atmosphere, response, bottomFixed, topBoundary);
    this.first = bottomFixed ? 1 : 0;
    this.unknowns = elements + 1 - first - (top.fixed() ? 1 : 0);
    this.packed = new double[elements * element.pairFirst().length];
    this.diagonal = new double[elements + 1];
    this.offDiagonal = new double[elements];
    this.ends = new double[elements + 1];
    this.local = new double[element.degree() + 1];
    this.tridiagonal = new TwistedTridiagonal(elements + 1);
  }

  @Override
  int factor() {
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

  @Override
  double nullVector(Displacement into) {
    double[] zeta = into.zeta;
    tridiagonal.nullVector(diagonal, offDiagonal, first, ends);
    int n = element.degree() + 1;
    int pairs = element.pairFirst().length;
    ends[0] = first == 1 ? 0.0 : ends[0];
    ends[elements] = top.fixed() ? 0.0 : ends[elements];
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

  @Override
  double residual() {
    return tridiagonal.residual();
  }
}
