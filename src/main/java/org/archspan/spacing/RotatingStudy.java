package org.archspan.spacing;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.archspan.boundary.Parity;
import org.archspan.disk.Disk;
import org.archspan.disk.RefusedModelException;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.stability.RotatingCount;
import org.archspan.stability.RotatingMode;
import org.archspan.stability.RotatingSolver;
import org.archspan.stability.UnsolvedException;

/**
 * The main job for a disk that rotates rigidly: each branch without rotation is followed into rotation and climbed to its
 * fastest wavelength; at many wavelengths the argument principle then shows that nothing is faster. What is proved without
 * rotation bounds growth with it as well. Immutable.
 */
final class RotatingStudy {
  private static final int CHECKED_WAVELENGTHS = 24;
  private static final double CLEARANCE = 1e-5;
  private static final double SAME = 1e-5;
  private static final int MOST_RESTARTS = 6;
  /** The climb settles the wavelength to about this. */
  private static final double WAVELENGTH_ERROR = 1e-5;
  private final Disk disk;
  private final SearchOptions options;
  private final double angularSpeed;
  private final SpacingResult without;

  /** A study of a disk whose result without rotation is known. */
  RotatingStudy(Disk disk, SearchOptions options, SpacingResult without) {
    this.disk = disk;
    this.options = options;
    this.angularSpeed = disk.rotation().orElseThrow().angularSpeed();
    this.without = without;
  }

  /** A peak of a branch and the solver that found it. */
  private record Found(RotatingSolver solver, RotatingMode mode) {
  }

  /**
   * What was found.
   *
   * @param peaks  fastest first
   * @param counts of all modes at the wavelength of each
   */
  record Branches(List<BranchPeak> peaks, Map<BranchPeak, RotatingCount> counts) {
  }

  /** Searches. */
  Branches branches() {
    Map<Parity, RotatingSolver> solvers = new EnumMap<>(Parity.class);
    List<Found> found = new ArrayList<>();
    for (BranchPeak still : without.branches()) {
      if (still.wavenumber() > 0.0 && !still.continuum()) {
        RotatingSolver solver = solvers.computeIfAbsent(still.parity(), this::solver);
        follow(still, solver).ifPresent(mode -> add(found, new Found(solver, mode)));
      }
    }
    for (RotatingSolver solver : solvers.values()) {
      check(solver, found);
    }
    Map<BranchPeak, RotatingCount> counts = new LinkedHashMap<>();
    for (Found branch : found) {
      RotatingCount count = branch.solver().modes(branch.mode().wavenumber());
      counts.put(judged(branch, count), count);
    }
    List<BranchPeak> peaks = counts.keySet().stream()
        .sorted(Comparator.comparingDouble(BranchPeak::growthRate).reversed()).toList();
    return new Branches(peaks, counts);
  }

  private RotatingSolver solver(Parity parity) {
    return new RotatingSolver(without.range().problem(disk, without.equilibrium(), parity, options.tolerance()),
        angularSpeed);
  }

  private Optional<RotatingMode> follow(BranchPeak still, RotatingSolver solver) {
    RotatingMode start = new RotatingMode(still.wavenumber(), still.growthRate(), 0.0, still.growthError());
    return RotatingBranch.spunUp(solver, angularSpeed, start)
        .map(mode -> new RotatingBranch(solver, without.range()).climb(mode));
  }

  private static void add(List<Found> found, Found candidate) {
    for (Found known : found) {
      boolean same = known.solver() == candidate.solver()
          && Math.abs(known.mode().wavenumber() / candidate.mode().wavenumber() - 1.0) < 1e3 * SAME
          && Math.abs(known.mode().growthRate() / candidate.mode().growthRate() - 1.0) < SAME;
      if (same) {
        return;
      }
    }
    found.add(candidate);
  }

  /** At wavelengths over the whole range nothing may be faster than the fastest peak of a parity; what is, is climbed too. */
  private void check(RotatingSolver solver, List<Found> found) {
    for (int restart = 0; restart < MOST_RESTARTS; restart++) {
      double fastest = found.stream().filter(branch -> branch.solver() == solver)
          .mapToDouble(branch -> branch.mode().growthRate()).max().orElse(0.0);
      double at = faster(solver, fastest * (1.0 + CLEARANCE));
      if (Double.isNaN(at)) {
        return;
      }
      RotatingCount count = solver.modes(at);
      if (count.modes().isEmpty()) {
        return;
      }
      add(found, new Found(solver, new RotatingBranch(solver, without.range()).climb(count.modes().get(0))));
    }
    throw new UnsolvedException("under rotation ever faster modes turn up; narrow the range with waves.shortest and"
        + " waves.longest");
  }

  /** A wavenumber at which a mode is faster than a rate, NaN if none of those checked. */
  private double faster(RotatingSolver solver, double growthRate) {
    double highest = Math.min(without.range().highest(), solver.marginalWavenumber());
    double lowest = Math.max(without.range().lowest(), highest / 50.0);
    for (int i = 0; i < CHECKED_WAVELENGTHS; i++) {
      double k = lowest * Math.pow(highest / lowest, (i + 0.5) / CHECKED_WAVELENGTHS);
      boolean slow = growthRate == 0.0 ? solver.modes(k).modes().isEmpty() : solver.fasterThan(growthRate, k) == 0;
      if (!slow) {
        return k;
      }
    }
    return Double.NaN;
  }

  private BranchPeak judged(Found branch, RotatingCount count) {
    RotatingMode mode = branch.mode();
    Parity parity = branch.solver().problem().parity();
    Optional<RotatingMode> taller = inTallerDomain(parity, mode);
    double growthChange = taller.map(other -> other.growthRate() / mode.growthRate() - 1.0).orElse(Double.NaN);
    double wavelengthChange = taller.map(other -> mode.wavenumber() / other.wavenumber() - 1.0).orElse(Double.NaN);
    boolean held = Math.abs(growthChange) <= DomainInfluence.HELD && Math.abs(wavelengthChange) <= DomainInfluence.HELD;
    int order = (int) count.modes().stream()
        .filter(other -> other.growthRate() > mode.growthRate() * (1.0 + CLEARANCE)).count();
    return new BranchPeak(parity, order, mode.wavenumber(), without.range().crossWavenumber(), mode.growthRate(),
        mode.growthError(), WAVELENGTH_ERROR, count.number(), branch.solver().centroidHeight(mode),
        branch.solver().columnContrast(mode), held ? HeldBy.DISK : HeldBy.LID, growthChange, wavelengthChange,
        mode.frequency(), Optional.empty());
  }

  private Optional<RotatingMode> inTallerDomain(Parity parity, RotatingMode mode) {
    Optional<Equilibrium> stretched = DomainInfluence.stretched(without.equilibrium());
    if (stretched.isEmpty()) {
      return Optional.empty();
    }
    try {
      RotatingSolver solver = new RotatingSolver(
          without.range().problem(disk, stretched.get(), parity, options.tolerance()), angularSpeed);
      return solver.follow(mode.wavenumber(), mode)
          .map(start -> new RotatingBranch(solver, without.range()).climb(start));
    } catch (RefusedModelException | UnsolvedException impossible) {
      return Optional.empty();
    }
  }

  /** What belongs to the answer, beside the branches; counted at the wavelength of the peak, if one is left. */
  RotatingAnswer answer(Optional<RotatingCount> count) {
    return new RotatingAnswer(angularSpeed, CHECKED_WAVELENGTHS, count.map(RotatingCount::edge).orElse(0.0),
        count.map(RotatingCount::contourPoints).orElse(0), without);
  }
}
