package org.archspan.stability;

import org.archspan.boundary.TopBoundary;
import org.archspan.linalg.CoupledElement;
import org.archspan.linalg.PackedElimination;
import org.archspan.linalg.TwistedBlockTridiagonal;

/**
 * The matrix of a gas that feels its own perturbed gravity: two unknowns at each node, zeta and the potential psi. The
 * energy of the potential is positive, so that its elimination would add no negative eigenvalue (Haynsworth 1968) and the
 * count is that of the modes. Above the top the potential decays as exp(-k z), as in empty space.
 */
final class GravitatingStiffness extends DynamicStiffness {
  private final CoupledElement coupled;
  private final double[] packed;
  private final double[] diagonal;
  private final double[] offDiagonal;
  private final double[] ends;
  private final double[] local;
  private final TwistedBlockTridiagonal tridiagonal;

  /**
   * A problem on a mesh.
   *
   * @param bottomFixed whether zeta vanishes at the lower end; the potential is free there, otherwise the other way round
   */
  GravitatingStiffness(Atmosphere atmosphere, PressureResponse response, boolean bottomFixed, TopBoundary topBoundary) {
    super(atmosphere, response, bottomFixed, topBoundary);
    coupled = new CoupledElement(element.degree() + 1, element.derivative(), element.slopeGram(), element.pairFirst(),
        element.pairSecond());
    packed = new double[elements * coupled.packedLength()];
    diagonal = new double[3 * (elements + 1)];
    offDiagonal = new double[4 * elements];
    ends = new double[2 * (elements + 1)];
    local = new double[2 * (element.degree() + 1)];
    tridiagonal = new TwistedBlockTridiagonal(elements + 1);
  }

  /** At infinite wavelength the energy of the potential vanishes: only a form that touches there is positive. */
  @Override
  double tangentPoint(double lowest, double highest) {
    return lowest == 0.0 ? 0.0 : super.tangentPoint(lowest, highest);
  }

  @Override
  int factor() {
    weigh();
    double[] mixedWeight = atmosphere.mixedWeight;
    double[] weight = atmosphere.weight;
    for (int i = 0; i < weight.length; i++) {
      potential.slope[i] *= mixedWeight[i];
      potential.value[i] *= weight[i];
      potential.own[i] *= weight[i];
    }
    int negative = condense();
    close();
    return negative + tridiagonal.count(diagonal, offDiagonal, elements + 1);
  }

  private int condense() {
    int n = element.degree() + 1;
    int size = 2 * n;
    int negative = 0;
    java.util.Arrays.fill(diagonal, 0.0);
    for (int e = 0; e < elements; e++) {
      int offset = e * coupled.packedLength();
      coupled.assemble(form.a, form.b, form.c, potential.slope, potential.value, potential.own,
          2.0 / atmosphere.mesh.length(e), e * n, element.slopeProducts(), element.pairSlope(),
          element.pairSlopeReversed(), packed, offset);
      int inside = PackedElimination.eliminate(packed, offset, size, size - 4);
      crowded[e] = inside > 0;
      negative += inside;
      int schur = offset + coupled.packedLength() - 10;
      int at = 3 * e;
      diagonal[at] += packed[schur];
      diagonal[at + 1] += packed[schur + 1];
      diagonal[at + 2] += packed[schur + 4];
      offDiagonal[4 * e] = packed[schur + 2];
      offDiagonal[4 * e + 1] = packed[schur + 3];
      offDiagonal[4 * e + 2] = packed[schur + 5];
      offDiagonal[4 * e + 3] = packed[schur + 6];
      diagonal[at + 3] = packed[schur + 7];
      diagonal[at + 4] = packed[schur + 8];
      diagonal[at + 5] = packed[schur + 9];
    }
    return negative;
  }

  /**
   * Conditions at both ends. A fixed unknown becomes a decoupled pivot of 1. What rises through a top that is not a lid stays
   * just above it: a sheet of matter there. At k = 0 a constant potential about the midplane has no energy and pulls nowhere;
   * it is taken out by holding the potential at the top.
   */
  private void close() {
    int last = 3 * elements;
    double decay = Math.sqrt(wave.bending + wave.across);
    diagonal[last] += top.entry();
    diagonal[last + 1] += atmosphere.jeansFrequency[atmosphere.nodes() - 1];
    diagonal[last + 2] += decay;
    int fixed = bottomFixed ? 0 : 1;
    diagonal[2 * fixed] = 1.0;
    diagonal[1] = 0.0;
    offDiagonal[2 * fixed] = 0.0;
    offDiagonal[2 * fixed + 1] = 0.0;
    if (top.fixed()) {
      diagonal[last] = 1.0;
      diagonal[last + 1] = 0.0;
      offDiagonal[4 * elements - 4] = 0.0;
      offDiagonal[4 * elements - 2] = 0.0;
    }
    if (decay == 0.0 && bottomFixed) {
      diagonal[last + 1] = 0.0;
      diagonal[last + 2] = 1.0;
      offDiagonal[4 * elements - 3] = 0.0;
      offDiagonal[4 * elements - 1] = 0.0;
    }
  }

  @Override
  double nullVector(Displacement into) {
    tridiagonal.nullVector(diagonal, offDiagonal, ends);
    int n = element.degree() + 1;
    int inner = n - 2;
    ends[bottomFixed ? 0 : 1] = 0.0;
    if (top.fixed()) {
      ends[2 * elements] = 0.0;
    }
    for (int e = 0; e < elements; e++) {
      System.arraycopy(ends, 2 * e, local, 2 * inner, 4);
      PackedElimination.extend(packed, e * coupled.packedLength(), 2 * n, 2 * inner, local);
      int start = e * n;
      System.arraycopy(local, 0, into.zeta, start + 1, inner);
      System.arraycopy(local, inner, into.potential, start + 1, inner);
      into.zeta[start] = ends[2 * e];
      into.potential[start] = ends[2 * e + 1];
      into.zeta[start + n - 1] = ends[2 * e + 2];
      into.potential[start + n - 1] = ends[2 * e + 3];
    }
    return tridiagonal.residual();
  }

  @Override
  double residual() {
    return tridiagonal.residual();
  }
}
