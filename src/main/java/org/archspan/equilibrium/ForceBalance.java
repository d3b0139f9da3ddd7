package org.archspan.equilibrium;

import java.util.Arrays;
import java.util.Locale;
import java.util.function.DoubleUnaryOperator;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import org.archspan.disk.RefusedModelException;

/**
 * Checks the balance of an equilibrium from its pressures alone, independently of how it was built: over thin slabs
 * the drop of total pressure is compared with the weight between. What rounding of the pressures explains is not counted.
 */
public final class ForceBalance {
  private static final double LARGEST = 1e-10;
  private static final int SLABS = 100;
  /** A slab is cut into pieces over which the density falls by about one e-folding, up to so many. */
  private static final int MOST_PIECES = 400;
  /** Rounding of two pressures, relative: the drop between them cannot be known better. */
  private static final double ROUNDING = 1e-15;
  private static final double AGREEMENT = 1e-13;
  private static final int MOST_HALVINGS = 12;

  private ForceBalance() {
  }

  /** Greatest |drop of pressure - weight| / weight over slabs that fill the domain, dimensionless. O(slabs + kinks). */
  public static double residual(Equilibrium equilibrium) {
    double greatest = 0.0;
    for (int i = 0; i < SLABS; i++) {
      greatest = Math.max(greatest, residual(equilibrium, slabEdge(equilibrium, i), slabEdge(equilibrium, i + 1)));
    }
    return greatest;
  }

  /**
   * The same residual, dimensionless, but a state whose balance is not good enough to stand on is refused.
   *
   * @throws RefusedModelException when the residual exceeds 1e-10
   */
  public static double required(Equilibrium equilibrium) {
    double residual = residual(equilibrium);
    if (!(residual <= LARGEST)) {
      throw new RefusedModelException(String.format(Locale.ROOT, "the force balance holds to %.1e of the weight only,"
          + " where %.0e is asked: lengths or speeds of the model differ too much from one another, or domain.top is far"
          + " above the gas", residual, LARGEST));
    }
    return residual;
  }

  private static double slabEdge(Equilibrium equilibrium, int i) {
    return equilibrium.bottom() + (equilibrium.top() - equilibrium.bottom()) * i / SLABS;
  }

  /** The same over one slab between two heights, cm. */
  public static double residual(Equilibrium equilibrium, double from, double to) {
    double reference = equilibrium.at(from).logDensity();
    double drop = pressure(equilibrium.at(from), reference) - pressure(equilibrium.at(to), reference);
    DoubleUnaryOperator weightDensity = z -> {
      GasState state = equilibrium.at(z);
      return Math.exp(state.logDensity() - reference) * state.gravity();
    };
    double weight = 0.0;
    double edge = from;
    for (double cut : cuts(equilibrium)) {
      if (cut > edge && cut < to) {
        weight += integrate(equilibrium, weightDensity, edge, cut);
        edge = cut;
      }
    }
    weight += integrate(equilibrium, weightDensity, edge, to);
    double rounding = ROUNDING * pressure(equilibrium.at(from), reference);
    return Math.max(0.0, Math.abs(drop - weight) - rounding) / weight;
  }

  /** The rule is exact for smooth functions only: no piece straddles a kink, or spans a bend of gravity. */
  private static double[] cuts(Equilibrium equilibrium) {
    DoubleStream bends = Arrays.stream(equilibrium.landmarks())
        .flatMap(height -> IntStream.range(-2, 6).mapToDouble(power -> Math.scalb(height, power)));
    return DoubleStream.concat(bends, Arrays.stream(equilibrium.kinks())).sorted().toArray();
  }

  private static double integrate(Equilibrium equilibrium, DoubleUnaryOperator weight, double from, double to) {
    double fall = Math.abs(equilibrium.at(from).logDensity() - equilibrium.at(to).logDensity());
    int pieces = (int) Math.min(MOST_PIECES, Math.ceil(1.0 + fall));
    double sum = 0.0;
    for (int i = 0; i < pieces; i++) {
      double left = from + (to - from) * i / pieces;
      double right = from + (to - from) * (i + 1) / pieces;
      sum += integrate(weight, left, right, HeightPanels.integrate(weight, left, right), MOST_HALVINGS);
    }
    return sum;
  }

  /** Halves a piece until the rule gives the same on both halves. */
  private static double integrate(DoubleUnaryOperator weight, double from, double to, double whole, int halvings) {
    double middle = 0.5 * (from + to);
    double left = HeightPanels.integrate(weight, from, middle);
    double right = HeightPanels.integrate(weight, middle, to);
    if (halvings == 0 || Math.abs(left + right - whole) <= AGREEMENT * Math.abs(whole)) {
      return left + right;
    }
    return integrate(weight, from, middle, left, halvings - 1) + integrate(weight, middle, to, right, halvings - 1);
  }

  private static double pressure(GasState state, double referenceLogDensity) {
    return Math.exp(state.logDensity() - referenceLogDensity)
        * (state.gasPerMass() + state.magneticPerMass() + state.cosmicRayPerMass());
  }
}
