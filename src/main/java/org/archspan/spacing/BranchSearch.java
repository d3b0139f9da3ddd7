package org.archspan.spacing;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.archspan.boundary.Parity;
import org.archspan.disk.Disk;
import org.archspan.disk.RefusedModelException;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.stability.BranchSolver;
import org.archspan.stability.GrowthPoint;
import org.archspan.stability.Peak;

/** Finds the fastest mode of every branch of every parity over a range of waves. */
final class BranchSearch {
  /**
   * The peak of one branch.
   *
   * @param solver that found it
   * @param peak   what it found
   */
  record Found(BranchSolver solver, Peak peak) {
    Parity parity() {
      return solver.problem().parity();
    }
  }

  private final List<BranchSolver> solvers = new ArrayList<>();
  private final List<Found> found = new ArrayList<>();
  private final WaveRange range;
  private final Optional<GrowthPoint> halo;
  private double bound;
  private int intervals;

  /**
   * Searches.
   *
   * @param branches greatest number of branches of each parity
   * @throws RefusedModelException when growth has no shortest wave and none is given
   */
  BranchSearch(Disk disk, Equilibrium equilibrium, SearchOptions options, WaveRange range, int branches) {
    this.range = range;
    for (Parity parity : parities(options.parities(), equilibrium)) {
      solvers.add(new BranchSolver(range.problem(disk, equilibrium, parity, options.tolerance())));
    }
    requireShortest(solvers.get(0), range);
    halo = solvers.get(0).haloPeak(range.lowest(), range.highest());
    for (BranchSolver solver : solvers) {
      collect(solver, branches);
    }
  }

  /** Refuses a search for the fastest wave where shorter waves are always faster. */
  static void requireShortest(BranchSolver solver, WaveRange range) {
    if (Double.isInfinite(solver.marginalWavenumber(0)) && Double.isInfinite(range.highest())) {
      throw new RefusedModelException("somewhere the gas has no field and is unstable: growth then rises without limit"
          + " towards short waves and no wavelength is fastest; give waves.shortest, or a field");
    }
  }

  static List<Parity> parities(Set<Parity> asked, Equilibrium equilibrium) {
    if (!equilibrium.aboutMidplane()) {
      return List.of(Parity.FLOOR);
    }
    return asked.stream().filter(parity -> parity != Parity.FLOOR).sorted().toList();
  }

  private void collect(BranchSolver solver, int branches) {
    double haloGrowth = halo.map(GrowthPoint::growthRate).orElse(0.0);
    for (int order = 0; order < branches; order++) {
      Optional<Peak> peak = solver.fastest(order, range.lowest(), range.highest(), haloGrowth);
      if (order == 0) {
        bound = Math.max(bound, solver.provedBound());
        intervals += solver.provedIntervals();
      }
      if (peak.isEmpty()) {
        return;
      }
      found.add(new Found(solver, peak.get()));
    }
  }

  List<BranchSolver> solvers() {
    return solvers;
  }

  List<Found> found() {
    return found;
  }

  /** The fastest of the continuum of the atmosphere above an open top. */
  Optional<GrowthPoint> halo() {
    return halo;
  }

  /** Greatest wavenumber at which anything grows, cm^-1; 0 when nothing does. */
  double marginalWavenumber() {
    return solvers.stream().mapToDouble(solver -> solver.marginalWavenumber(0)).max().orElse(0.0);
  }

  /** What the proofs of the branches of order 0 add up to. */
  Certificate certificate() {
    long spent = solvers.stream().mapToLong(BranchSolver::factorisations).sum();
    return new Certificate(bound, 2.0 * Math.PI / range.highest(), 2.0 * Math.PI / range.lowest(), intervals, spent);
  }
}
