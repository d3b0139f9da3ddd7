package org.archspan.spacing;

import java.util.ArrayList;
import java.util.List;
import org.archspan.boundary.Parity;
import org.archspan.disk.Disk;
import org.archspan.disk.RefusedModelException;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.stability.BranchSolver;
import org.archspan.stability.GrowthCurve;

/** Growth curves for several cross-field wavelengths, orders and parities. Immutable. */
public final class DispersionStudy {
  private static final double LONGEST_OVER_SHORTEST = 30.0;

  private final Disk disk;
  private final Equilibrium equilibrium;
  private final SearchOptions options;

  /** A study of a disk whose equilibrium is known. */
  public DispersionStudy(Disk disk, Equilibrium equilibrium, SearchOptions options) {
    this.disk = disk;
    this.equilibrium = equilibrium;
    this.options = options;
  }

  /**
   * The curves; branches that grow nowhere are left out.
   *
   * @param across cross-field wavenumbers, cm^-1; empty: the model's own, or the direction of its waves
   * @param orders mode orders from 0
   * @param points wavelengths on each curve
   * @throws RefusedModelException when growth has no short end and none is given
   */
  public List<GrowthCurve> solve(double[] across, int orders, int points) {
    WaveRange range = WaveRange.of(disk, equilibrium, options);
    if (range.direction().isPresent() && across.length > 0) {
      throw new RefusedModelException("wavelengths across the field have no meaning where the field turns (field.turn); fix"
          + " the direction with waves.direction");
    }
    List<GrowthCurve> curves = new ArrayList<>();
    for (double ky : across.length == 0 ? new double[] {range.crossWavenumber()} : across) {
      WaveRange waves = new WaveRange(range.lowest(), range.highest(), ky, range.direction());
      for (Parity parity : BranchSearch.parities(options.parities(), equilibrium)) {
        BranchSolver solver = new BranchSolver(waves.problem(disk, equilibrium, parity, options.tolerance()));
        for (int order = 0; order < orders; order++) {
          curve(solver, order, range, points).ifPresent(curves::add);
        }
      }
    }
    return curves;
  }

  private static java.util.Optional<GrowthCurve> curve(BranchSolver solver, int order, WaveRange range, int points) {
    double highest = Math.min(range.highest(), solver.marginalWavenumber(order));
    if (Double.isInfinite(highest)) {
      throw new RefusedModelException("without field growth has no shortest wave; give waves.shortest");
    }
    double lowest = range.lowest() > 0.0 ? range.lowest() : highest / LONGEST_OVER_SHORTEST;
    return lowest < highest ? java.util.Optional.of(GrowthCurves.of(solver, order, lowest, highest, points, true))
        : java.util.Optional.empty();
  }
}
