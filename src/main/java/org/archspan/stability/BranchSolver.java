package org.archspan.stability;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Growth rates, curves, peaks and shapes of the modes of one parity at one cross-field wavenumber, in CGS.
 *
 * <p>The user sets no grid: the mesh follows from the tolerance of the {@link ModeProblem}, and every growth rate carries
 * the error that a finer mesh finds. Owns its work arrays: one instance for one thread.
 */
public final class BranchSolver {
  private final ModeSolver solver;
  private final double length;
  private final double time;
  private double provedBound;
  private int provedIntervals;

  /** A solver for a problem. */
  public BranchSolver(ModeProblem problem) {
    solver = new ModeSolver(problem);
    length = solver.scales().length();
    time = solver.scales().time();
  }

  /** The problem that is solved. */
  public ModeProblem problem() {
    return solver.problem();
  }

  /**
   * Growth of the mode of an order at one wavenumber; empty when fewer modes grow. The number of modes is not counted.
   *
   * @param wavenumber kx, cm^-1, positive
   * @throws UnsolvedException when the tolerance is missed
   */
  public Optional<GrowthPoint> growth(double wavenumber, int order) {
    return growth(wavenumber, order, Double.NaN);
  }

  /**
   * The same from a guess, which saves most of the work where it is good to a few per cent.
   *
   * @param guess growth rate, s^-1; NaN for none
   */
  public Optional<GrowthPoint> growth(double wavenumber, int order, double guess) {
    return solver.growth(wavenumber * length, order, guess * time).map(root -> point(root, 0));
  }

  private GrowthPoint point(GrowthRoot root, int modes) {
    return new GrowthPoint(root.wavenumber() / length, root.growth() / time, root.error(), modes);
  }

  /**
   * Growth of one branch at several wavenumbers, each started from the last.
   *
   * @param wavenumbers kx, cm^-1, positive, ascending
   * @param countModes  whether to count the growing modes at each
   */
  public GrowthCurve curve(int order, double[] wavenumbers, boolean countModes) {
    List<GrowthPoint> points = new ArrayList<>(wavenumbers.length);
    GrowthRoot before = null;
    GrowthRoot last = null;
    for (double wavenumber : wavenumbers) {
      double kx = wavenumber * length;
      double guess = extrapolated(before, last, kx);
      before = last;
      last = solver.growth(kx, order, guess).orElse(null);
      int modes = countModes ? unstableModes(wavenumber) : 0;
      points.add(last == null ? new GrowthPoint(wavenumber, 0.0, 0.0, modes) : point(last, modes));
    }
    return new GrowthCurve(problem().parity(), order, problem().crossWavenumber(), points);
  }

  /** The cubic through the last two points and their slopes, continued. */
  private static double extrapolated(GrowthRoot before, GrowthRoot last, double kx) {
    if (last == null) {
      return Double.NaN;
    }
    if (before == null) {
      return last.growth() + (kx - last.wavenumber()) * last.slope();
    }
    return new SlopeCubic(before, last).value(kx);
  }

  /** Number of modes that grow at a wavenumber (cm^-1); -1 where a continuum makes it infinite, or too large to count. */
  public int unstableModes(double wavenumber) {
    if (haloGrowth(wavenumber) > 0.0) {
      return -1;
    }
    return solver.unstableModes(wavenumber * length);
  }

  /** Growth rate of the edge of the continuum above an open top at a wavenumber (cm^-1), s^-1; 0 where there is none. */
  public double haloGrowth(double wavenumber) {
    return solver.haloEdge(wavenumber * length) / time;
  }

  /**
   * The greatest growth rate of that edge over a range of wavenumbers.
   *
   * @param lowest  cm^-1, 0 or more
   * @param highest cm^-1; may be infinite
   */
  public Optional<GrowthPoint> haloPeak(double lowest, double highest) {
    return solver.haloPeak(lowest * length, highest * length).map(root -> point(root, -1));
  }

  /** Greatest wavenumber at which more than {@code order} modes grow, cm^-1; 0 for none, infinite without field. */
  public double marginalWavenumber(int order) {
    return solver.marginalWavenumber(order) / length;
  }

  /**
   * The fastest mode of a branch over a range of wavenumbers, with the proof that the branch is nowhere faster.
   *
   * @param lowest   cm^-1, 0 or more
   * @param highest  cm^-1; infinite for the marginal one
   * @param haloPeak greatest growth rate of the continuum above an open top, s^-1; 0 where there is none
   */
  public Optional<Peak> fastest(int order, double lowest, double highest, double haloPeak) {
    FastestMode found = FastestMode.find(solver, order, lowest * length, highest * length, haloPeak * time);
    provedBound = found.bound() / time;
    provedIntervals = found.intervals();
    return found.root().map(root -> peak(order, found, root));
  }

  /** Growth rate that the branch of the latest {@link #fastest} exceeds nowhere, s^-1. */
  public double provedBound() {
    return provedBound;
  }

  /** Intervals of wavenumber that this proof took. */
  public int provedIntervals() {
    return provedIntervals;
  }

  private Peak peak(int order, FastestMode found, GrowthRoot root) {
    double wavenumber = root.wavenumber() / length;
    EigenMode mode = new ModeShape(solver).mode(order, wavenumber, root.growth() / time);
    return new Peak(order, wavenumber, root.growth() / time, root.error(), found.wavelengthError(),
        root.wavenumber() > 0.0 ? unstableModes(wavenumber) : -1, mode,
        provedBound, provedIntervals);
  }

  /** The shape of the mode of an order at a wavenumber (cm^-1); empty when fewer modes grow. */
  public Optional<EigenMode> mode(double wavenumber, int order) {
    return solver.growth(wavenumber * length, order, Double.NaN)
        .map(root -> new ModeShape(solver).mode(order, wavenumber, root.growth() / time));
  }

  /** Matrix factorisations spent so far. */
  public long factorisations() {
    return solver.factorisations();
  }
}
