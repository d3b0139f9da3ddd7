package org.archspan.comparison;

import java.util.List;
import java.util.OptionalDouble;
import org.apache.commons.math3.analysis.solvers.BracketingNthOrderBrentSolver;
import org.apache.commons.math3.analysis.solvers.UnivariateSolverUtils;
import org.apache.commons.math3.exception.MathIllegalArgumentException;
import org.apache.commons.math3.exception.TooManyEvaluationsException;
import org.archspan.disk.Disk;
import org.archspan.disk.Gas;
import org.archspan.disk.GasComponent;
import org.archspan.disk.RefusedModelException;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.EquilibriumBuilder;

/**
 * The amount of gas of one disk, given to others.
 *
 * @param held           which amount
 * @param surfaceDensity of the disk it was taken from, g cm^-2
 * @param bottomDensity  of that disk at its lower end, g cm^-3
 * @param tolerance      relative accuracy asked of growth rates, dimensionless
 */
public record GasAmount(HeldAmount held, double surfaceDensity, double bottomDensity, double tolerance) {
  private static final int MOST_EVALUATIONS = 100;
  private static final double SETTLED = 1e-13;

  /**
   * The amount of a disk.
   *
   * @param tolerance relative accuracy asked of growth rates, dimensionless
   * @throws RefusedModelException when the disk has no equilibrium
   */
  public static GasAmount of(Disk disk, HeldAmount held, double tolerance) {
    Equilibrium equilibrium = EquilibriumBuilder.build(disk, tolerance);
    HeldAmount meant = disk.gas() instanceof Gas.Stratified && held != HeldAmount.NEITHER ? HeldAmount.BOTH : held;
    return new GasAmount(meant, equilibrium.surfaceDensity(), equilibrium.at(equilibrium.bottom()).density(),
        tolerance);
  }

  /**
   * A disk with this amount of gas; several components keep their shares at the lower end.
   *
   * @throws RefusedModelException when no such disk has an equilibrium
   */
  public Disk in(Disk disk) {
    if (held == HeldAmount.NEITHER || held == HeldAmount.BOTH) {
      return disk;
    }
    boolean column = held == HeldAmount.SURFACE_DENSITY;
    OptionalDouble bottom = column ? OptionalDouble.empty() : OptionalDouble.of(bottomDensity);
    OptionalDouble surface = column ? OptionalDouble.of(surfaceDensity) : OptionalDouble.empty();
    if (disk.gas() instanceof Gas.Isothermal gas) {
      return disk.withGas(new Gas.Isothermal(gas.dispersion(), bottom, surface));
    }
    if (disk.gas() instanceof Gas.Layered gas) {
      return disk.withGas(new Gas.Layered(gas.layers(), bottom, surface));
    }
    if (disk.gas() instanceof Gas.Components several) {
      return column ? withColumn(disk, several)
          : disk.withGas(scaled(several, bottomDensity / density(several)));
    }
    throw new RefusedModelException("a prescribed stratification cannot take the amount of another gas");
  }

  /** The factor on all densities is sought by its logarithm. */
  private Disk withColumn(Disk disk, Gas.Components gas) {
    double guess = Math.log(bottomDensity / density(gas));
    try {
      double[] bracket = UnivariateSolverUtils.bracket(x -> excess(disk, gas, x), guess, guess - 40.0, guess + 40.0,
          0.3, 1.4, MOST_EVALUATIONS);
      double factor = new BracketingNthOrderBrentSolver(SETTLED, SETTLED, SETTLED, 5).solve(MOST_EVALUATIONS,
          x -> excess(disk, gas, x), bracket[0], bracket[1]);
      return disk.withGas(scaled(gas, Math.exp(factor)));
    } catch (MathIllegalArgumentException | TooManyEvaluationsException none) {
      throw new RefusedModelException("no common factor on the densities of the components gives the surface density"
          + " that is held; hold the midplane density instead");
    }
  }

  private double excess(Disk disk, Gas.Components gas, double logFactor) {
    Disk trial = disk.withGas(scaled(gas, Math.exp(logFactor)));
    return Math.log(EquilibriumBuilder.build(trial, tolerance).surfaceDensity() / surfaceDensity);
  }

  private static double density(Gas.Components gas) {
    return gas.components().stream().mapToDouble(GasComponent::bottomDensity).sum();
  }

  private static Gas.Components scaled(Gas.Components gas, double factor) {
    List<GasComponent> scaled = gas.components().stream()
        .map(part -> new GasComponent(part.name(), part.dispersion(), factor * part.bottomDensity())).toList();
    return new Gas.Components(scaled);
  }
}
