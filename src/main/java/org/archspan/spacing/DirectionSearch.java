package org.archspan.spacing;

import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;
import org.apache.commons.math3.optim.univariate.UnivariatePointValuePair;
import org.archspan.boundary.Parity;
import org.archspan.disk.Disk;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.stability.BranchSolver;
import org.archspan.stability.Peak;

/**
 * The direction of the wavevector in which a disk whose field turns with height grows fastest. Opposite directions are the
 * same wave. For each direction the fastest wavelength is proved; between the directions that are scanned it is not.
 */
final class DirectionSearch {
  private static final int DIRECTIONS = 36;
  private static final double SETTLED = 1e-7;
  private static final int MOST_EVALUATIONS = 60;
  private final Disk disk;
  private final Equilibrium equilibrium;
  private final SearchOptions options;
  private final WaveRange range;

  DirectionSearch(Disk disk, Equilibrium equilibrium, SearchOptions options, WaveRange range) {
    this.disk = disk;
    this.equilibrium = equilibrium;
    this.options = options;
    this.range = range;
  }

  /** The direction, rad from the field at the lower end, in (-pi/2, pi/2]; 0 when nothing grows in any. */
  double fastest() {
    double step = Math.PI / DIRECTIONS;
    double best = 0.0;
    double greatest = 0.0;
    for (int i = 0; i < DIRECTIONS; i++) {
      double direction = -0.5 * Math.PI + (i + 1) * step;
      double growth = growth(direction);
      if (growth > greatest) {
        greatest = growth;
        best = direction;
      }
    }
    if (greatest == 0.0) {
      return 0.0;
    }
    UnivariatePointValuePair refined = new BrentOptimizer(SETTLED, SETTLED).optimize(new MaxEval(MOST_EVALUATIONS),
        new UnivariateObjectiveFunction(this::growth), GoalType.MAXIMIZE,
        new SearchInterval(best - step, best + step, best));
    double direction = refined.getValue() > greatest ? refined.getPoint() : best;
    return direction > 0.5 * Math.PI ? direction - Math.PI : direction <= -0.5 * Math.PI ? direction + Math.PI : direction;
  }

  private double growth(double direction) {
    double greatest = 0.0;
    for (Parity parity : BranchSearch.parities(options.parities(), equilibrium)) {
      BranchSolver solver = new BranchSolver(
          range.directed(direction).problem(disk, equilibrium, parity, options.tolerance()));
      greatest = Math.max(greatest, solver.fastest(0, range.lowest(), range.highest(), 0.0)
          .map(Peak::growthRate).orElse(0.0));
    }
    return greatest;
  }
}
