package org.archspan.spacing;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.archspan.boundary.Parity;
import org.archspan.disk.Disk;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.stability.BranchSolver;
import org.archspan.stability.GrowthCurve;
import org.archspan.stability.GrowthPoint;
import org.archspan.stability.ModeProblem;
import org.archspan.stability.ShortCrossWaves;

/** Growth over the plane of wavenumbers along and across the field. Immutable. */
public final class PlaneStudy {
  private static final double ACROSS_OVER_ALONG = 2.0;

  private final Disk disk;
  private final Equilibrium equilibrium;
  private final SearchOptions options;

  /** A study of a disk whose equilibrium is known. */
  public PlaneStudy(Disk disk, Equilibrium equilibrium, SearchOptions options) {
    this.disk = disk;
    this.equilibrium = equilibrium;
    this.options = options;
  }

  /**
   * Solves on a grid; the same digits whatever the number of threads.
   *
   * @param points  wavenumbers along each axis, at least 2
   * @param threads at least 1
   * @param done    told after each wavenumber across the field, from any thread
   * @throws org.archspan.stability.UnsolvedException when the tolerance is missed
   */
  public PlaneResult solve(int points, int threads, Runnable done) {
    double highest = highest();
    double[] along = new double[points];
    double[] across = new double[points];
    for (int i = 0; i < points; i++) {
      along[i] = highest * (i + 0.5) / points;
      across[i] = turning() ? highest * (2.0 * i / (points - 1) - 1.0) : ACROSS_OVER_ALONG * highest * i / (points - 1);
    }
    double[][] growth = new double[points][points];
    ExecutorService pool = Executors.newFixedThreadPool(threads);
    try {
      List<Future<?>> columns = new ArrayList<>();
      for (int j = 0; j < points; j++) {
        int column = j;
        columns.add(pool.submit(() -> {
          fill(growth, column, along, across[column]);
          done.run();
        }));
      }
      for (Future<?> column : columns) {
        column.get();
      }
    } catch (ExecutionException failed) {
      throw failed.getCause() instanceof RuntimeException cause ? cause : new IllegalStateException(failed.getCause());
    } catch (InterruptedException stopped) {
      Thread.currentThread().interrupt();
      throw new IllegalStateException("interrupted before the plane was complete", stopped);
    } finally {
      pool.shutdownNow();
    }
    ShortCrossWaves limit = new ShortCrossWaves(equilibrium, disk.gasClosure(), disk.cosmicRays().closure());
    double[] limits = new double[points];
    for (int i = 0; i < points; i++) {
      limits[i] = turning() ? limit.fastest().growthRate() : limit.fastestAt(along[i]).growthRate();
    }
    return new PlaneResult(along, across, growth, limits);
  }

  /** The greatest wavenumber at which waves of any cross-field wavelength grow, cm^-1. */
  private double highest() {
    double highest = BranchSearch.parities(options.parities(), equilibrium).stream()
        .map(parity -> solver(parity, 0.0)).mapToDouble(solver -> solver.marginalWavenumber(0)).max().orElse(0.0);
    double given = options.shortest().map(wave -> 2.0 * Math.PI / wave.resolve(equilibrium.scaleHeight()))
        .orElse(Double.POSITIVE_INFINITY);
    double end = Math.min(highest, given);
    return end > 0.0 && Double.isFinite(end) ? 1.1 * end : 2.0 / equilibrium.scaleHeight();
  }

  private BranchSolver solver(Parity parity, double across) {
    return new BranchSolver(ModeProblem.of(disk, equilibrium, parity, across, options.tolerance()));
  }

  /** Where the field turns, waves that lean to one side differ from those that lean to the other. */
  private boolean turning() {
    return disk.fieldTurn() != 0.0;
  }

  private void fill(double[][] growth, int column, double[] along, double across) {
    if (turning()) {
      for (int i = 0; i < along.length; i++) {
        growth[i][column] = directed(along[i], across);
      }
      return;
    }
    for (Parity parity : BranchSearch.parities(options.parities(), equilibrium)) {
      GrowthCurve curve = solver(parity, across).curve(0, along, false);
      for (int i = 0; i < along.length; i++) {
        growth[i][column] = Math.max(growth[i][column], curve.points().get(i).growthRate());
      }
    }
  }

  private double directed(double along, double across) {
    double greatest = 0.0;
    for (Parity parity : BranchSearch.parities(options.parities(), equilibrium)) {
      BranchSolver solver = new BranchSolver(ModeProblem.turning(disk, equilibrium, parity, Math.atan2(across, along),
          options.tolerance()));
      greatest = Math.max(greatest, solver.growth(Math.hypot(along, across), 0).map(GrowthPoint::growthRate).orElse(0.0));
    }
    return greatest;
  }
}
