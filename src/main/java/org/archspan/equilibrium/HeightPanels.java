package org.archspan.equilibrium;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.function.DoubleUnaryOperator;
import org.archspan.disk.RefusedModelException;
import org.archspan.mesh.ReferenceElement;

/**
 * Cuts the height above a level into panels over which the density falls by a few e-foldings at most, out to where
 * nothing is left, and integrates over them with a Gauss-Lobatto rule.
 */
final class HeightPanels {
  /** Density left at the far end, relative to the bottom: exp(-45). */
  private static final double FAR_EFOLDINGS = 45.0;
  private static final double WIDEST_EFOLDINGS = 2.0;
  private static final double GROWTH = 1.5;
  /** Of the floor's height: a smaller scale of the gas would lose the digits that eigenvalues need. */
  private static final double FINEST_FOLD = 1e-6;
  /** Where the potential levels off, as around a point mass, the density stops falling; the gas is bound if by then
   * exp(-20) of it is left, and is counted up to there. */
  private static final double BOUND_EFOLDINGS = 20.0;
  private static final double FARTHEST_FOLDS = 1e4;
  private static final int MOST_PANELS = 2000;
  private static final ReferenceElement RULE = ReferenceElement.ofDegree(16);
  private static final ReferenceElement SHORT_RULE = ReferenceElement.ofDegree(7);

  private final double[] edges;

  private HeightPanels(double[] edges) {
    this.edges = edges;
  }

  /**
   * Panels for a density.
   *
   * @param logDensity     ln rho against height in cm
   * @param bottom         lower end, cm
   * @param landmarks      heights of fast change, cm
   * @param kinks          heights that must be edges, cm, ascending
   * @param greatestHeight where the density ceases to be defined, cm
   * @throws RefusedModelException when the gas is not bound
   */
  static HeightPanels of(DoubleUnaryOperator logDensity, double bottom, double[] landmarks, double[] kinks,
      double greatestHeight) {
    double start = logDensity.applyAsDouble(bottom);
    double fold = heightOfFall(logDensity, bottom, 1.0, greatestHeight);
    if (fold < FINEST_FOLD * bottom) {
      throw tooHigh(bottom, fold);
    }
    double width = 0.5 * fold;
    for (double landmark : landmarks) {
      width = Math.min(width, 0.5 * landmark);
    }
    List<Double> edges = new ArrayList<>();
    edges.add(bottom);
    double z = bottom;
    double fallen = 0.0;
    while (fallen < FAR_EFOLDINGS && z < greatestHeight) {
      double next = Math.min(nextKink(kinks, z), Math.min(z + width, greatestHeight));
      double fall = start - logDensity.applyAsDouble(next) - fallen;
      if (fall > WIDEST_EFOLDINGS && next - z > 1e-9 * fold) {
        width = 0.5 * (next - z);
        continue;
      }
      z = next;
      fallen += fall;
      edges.add(z);
      width *= GROWTH;
      if (z - bottom > FARTHEST_FOLDS * fold) {
        if (fallen < BOUND_EFOLDINGS) {
          throw unbound(z, fallen);
        }
        break;
      }
      if (edges.size() > MOST_PANELS + kinks.length) {
        throw new RefusedModelException("the shortest length over which gravity bends is too small beside the height of"
            + " the gas: no number of panels resolves both");
      }
    }
    return new HeightPanels(edges.stream().mapToDouble(Double::doubleValue).toArray());
  }

  private static double nextKink(double[] kinks, double z) {
    for (double kink : kinks) {
      if (kink > z) {
        return kink;
      }
    }
    return Double.POSITIVE_INFINITY;
  }

  private static RefusedModelException tooHigh(double bottom, double fold) {
    return new RefusedModelException(String.format(Locale.ROOT, "the floor stands at %.4g pc, but there the density falls"
        + " by an e-folding within %.3g pc: too little of that height for rounding; count heights from the floor",
        bottom / org.archspan.units.Constants.PARSEC, fold / org.archspan.units.Constants.PARSEC));
  }

  private static RefusedModelException unbound(double z, double fallen) {
    return new RefusedModelException(String.format(Locale.ROOT, "the gas is not bound: %.4g pc above the bottom its "
        + "density has fallen by %.3g e-foldings only; a static disk needs stronger gravity or a smaller dispersion",
        z / org.archspan.units.Constants.PARSEC, fallen));
  }

  /**
   * Height above the bottom by which the density has fallen by so many e-foldings, cm.
   *
   * @throws RefusedModelException when it never does
   */
  static double heightOfFall(DoubleUnaryOperator logDensity, double bottom, double efoldings, double greatestHeight) {
    double start = logDensity.applyAsDouble(bottom);
    double low = 0.0;
    double high = 1.0;
    while (start - logDensity.applyAsDouble(Math.min(bottom + high, greatestHeight)) < efoldings) {
      low = high;
      high *= 2.0;
      if (bottom + low >= greatestHeight) {
        return greatestHeight - bottom;
      }
      if (high > 1e40) {
        throw unbound(high, start - logDensity.applyAsDouble(bottom + high));
      }
    }
    for (int step = 0; step < 60; step++) {
      double middle = 0.5 * (low + high);
      if (start - logDensity.applyAsDouble(Math.min(bottom + middle, greatestHeight)) < efoldings) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return high;
  }

  /** Edges, cm, ascending. */
  double[] edges() {
    return edges;
  }

  /** Integral of a function of height over all panels, in its unit times cm. */
  double integrate(DoubleUnaryOperator function) {
    double sum = 0.0;
    for (int panel = edges.length - 2; panel >= 0; panel--) {
      sum += integrate(function, edges[panel], edges[panel + 1]);
    }
    return sum;
  }

  /** Integral of a function between two heights by one rule, in its unit times cm. */
  static double integrate(DoubleUnaryOperator function, double from, double to) {
    return integrate(RULE, function, from, to);
  }

  /** The same between neighbouring nodes of a panel, over which the density falls by a fraction of an e-folding. */
  static double integrateShort(DoubleUnaryOperator function, double from, double to) {
    return integrate(SHORT_RULE, function, from, to);
  }

  private static double integrate(ReferenceElement rule, DoubleUnaryOperator function, double from, double to) {
    double half = 0.5 * (to - from);
    double sum = 0.0;
    for (int q = 0; q <= rule.degree(); q++) {
      sum += rule.weights()[q] * function.applyAsDouble(from + half * (1.0 + rule.nodes()[q]));
    }
    return half * sum;
  }
}
