package org.archspan.spacing;

import java.util.Optional;
import org.archspan.boundary.Parity;
import org.archspan.boundary.TopBoundary;
import org.archspan.disk.Disk;
import org.archspan.disk.RefusedModelException;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.EquilibriumBuilder;
import org.archspan.stability.BranchSolver;
import org.archspan.stability.GrowthPoint;
import org.archspan.stability.Peak;

/**
 * The mode that sets the spacing and nothing else, for thousands of disks: branches are sought only until one
 * gathers the disk's own gas, and the influence of the lid is tested at three wavelengths of a taller domain. The
 * fastest wavelength of each branch that is sought is proved as in {@link SpacingStudy}. About half a millisecond
 * for a disk with uniform gravity far from the midplane and one parity.
 */
public final class QuickStudy {
  private final SearchOptions options;
  private final boolean testLid;

  /**
   * A study with these waves.
   *
   * @param testLid whether to ask what holds the mode, which costs about a third more
   */
  public QuickStudy(SearchOptions options, boolean testLid) {
    this.options = options;
    this.testLid = testLid;
  }

  /**
   * The answer for one disk and its base state; empty when no wave grows.
   *
   * @throws RefusedModelException                    when the waves have no meaning for this disk
   * @throws org.archspan.stability.UnsolvedException when the tolerance is missed
   */
  public Optional<QuickSpacing> solve(Disk disk, Equilibrium equilibrium) {
    if (disk.rotation().filter(rotation -> rotation.angularSpeed() > 0.0).isPresent()) {
      return full(disk);
    }
    WaveRange range = WaveRange.of(disk, equilibrium, options);
    Search search = new Search(disk, equilibrium, range);
    return search.answer();
  }

  /** Rotation is the business of the main job, which takes far longer for it. */
  private Optional<QuickSpacing> full(Disk disk) {
    SpacingResult result = new SpacingStudy(disk, options, Arm.unknown()).solve();
    return result.spacingPeak().map(peak -> new QuickSpacing(peak.wavelength(),
        result.range().crestSpacing(peak.wavelength()), peak.growthRate(), peak.centroidHeight(),
        result.spacing().isPresent(), testLid ? Optional.of(peak.heldBy()) : Optional.empty()));
  }

  /** The base state of a disk, as this study needs it. */
  public Equilibrium equilibrium(Disk disk) {
    return EquilibriumBuilder.build(disk, options.tolerance());
  }

  /** One disk. */
  private final class Search {
    private final Disk disk;
    private final Equilibrium equilibrium;
    private final WaveRange range;
    private final double highestCentroid;
    private Peak gathering;
    private BranchSolver gatheringSolver;
    private Peak fastest;
    private BranchSolver fastestSolver;
    private Optional<GrowthPoint> halo = Optional.empty();

    Search(Disk disk, Equilibrium equilibrium, WaveRange range) {
      this.disk = disk;
      this.equilibrium = equilibrium;
      this.range = range;
      highestCentroid = equilibrium.bottom() + options.gatheringHeight().resolve(equilibrium.scaleHeight());
    }

    Optional<QuickSpacing> answer() {
      for (Parity parity : BranchSearch.parities(options.parities(), equilibrium)) {
        BranchSolver solver = new BranchSolver(range.problem(disk, equilibrium, parity, options.tolerance()));
        BranchSearch.requireShortest(solver, range);
        halo = solver.haloPeak(range.lowest(), range.highest());
        seek(solver);
      }
      if (gathering != null) {
        return Optional.of(spacing(gathering, gatheringSolver, true));
      }
      Optional<GrowthPoint> edge = halo.filter(point -> fastest == null || point.growthRate() >= fastest.growthRate());
      if (edge.isPresent()) {
        return Optional.of(new QuickSpacing(edge.get().wavelength(), range.crestSpacing(edge.get().wavelength()),
            edge.get().growthRate(), Double.POSITIVE_INFINITY, false,
            testLid ? Optional.of(HeldBy.HALO) : Optional.empty()));
      }
      return fastest == null ? Optional.empty() : Optional.of(spacing(fastest, fastestSolver, false));
    }

    /** At no wavelength is a higher order faster: the first branch that gathers is the fastest that does. */
    private void seek(BranchSolver solver) {
      double haloGrowth = halo.map(GrowthPoint::growthRate).orElse(0.0);
      for (int order = 0; order < options.branches(); order++) {
        Optional<Peak> found = solver.fastest(order, range.lowest(), range.highest(), haloGrowth);
        if (found.isEmpty() || gathering != null && found.get().growthRate() <= gathering.growthRate()) {
          return;
        }
        Peak peak = found.get();
        if (fastest == null || peak.growthRate() > fastest.growthRate()) {
          fastest = peak;
          fastestSolver = solver;
        }
        if (peak.wavenumber() > 0.0 && peak.mode().centroidHeight() <= highestCentroid) {
          gathering = peak;
          gatheringSolver = solver;
          return;
        }
      }
    }

    private QuickSpacing spacing(Peak peak, BranchSolver solver, boolean gathers) {
      double wavelength = 2.0 * Math.PI / peak.wavenumber();
      return new QuickSpacing(wavelength, range.crestSpacing(wavelength), peak.growthRate(),
          peak.mode().centroidHeight(), gathers,
          testLid ? Optional.of(heldBy(peak, solver.problem().parity())) : Optional.empty());
    }

    private HeldBy heldBy(Peak peak, Parity parity) {
      if (equilibrium.topBoundary() == TopBoundary.OPEN && Double.isNaN(peak.wavelengthError())) {
        return HeldBy.HALO;
      }
      return new LidTest(disk, equilibrium, range, options.tolerance()).passes(peak, parity) ? HeldBy.DISK : HeldBy.LID;
    }
  }
}
