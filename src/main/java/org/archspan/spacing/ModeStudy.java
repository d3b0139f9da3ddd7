package org.archspan.spacing;

import java.util.Optional;
import org.archspan.boundary.Parity;
import org.archspan.disk.Disk;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.stability.BranchSolver;
import org.archspan.stability.EigenMode;
import org.archspan.stability.Peak;

/** The shape of one mode, without rotation. Immutable. */
public final class ModeStudy {
  private final Disk disk;
  private final Equilibrium equilibrium;
  private final SearchOptions options;
  private final Arm arm;

  /** A study of a disk whose equilibrium is known. */
  public ModeStudy(Disk disk, Equilibrium equilibrium, SearchOptions options, Arm arm) {
    this.disk = disk;
    this.equilibrium = equilibrium;
    this.options = options;
    this.arm = arm;
  }

  /** The mode that sets the spacing; empty when stable, or when the fastest growth is a continuum. */
  public Optional<EigenMode> spacingMode() {
    SpacingResult result = new SpacingStudy(disk.withoutRotation(), options, arm).solve();
    return spacingMode(result);
  }

  /** The same, for a result at hand. */
  public Optional<EigenMode> spacingMode(SpacingResult result) {
    return result.withoutRotation().spacingPeak().filter(peak -> !peak.continuum() && peak.wavenumber() > 0.0)
        .flatMap(peak -> mode(peak.parity(), peak.order(), peak.wavenumber()));
  }

  /**
   * One mode; empty when it does not grow.
   *
   * @param wavenumber cm^-1; NaN for the fastest of its branch
   */
  public Optional<EigenMode> mode(Parity parity, int order, double wavenumber) {
    WaveRange range = WaveRange.of(disk, equilibrium, options);
    BranchSolver solver = new BranchSolver(range.problem(disk, equilibrium, parity, options.tolerance()));
    if (Double.isNaN(wavenumber)) {
      return solver.fastest(order, range.lowest(), range.highest(), 0.0).map(Peak::mode);
    }
    return solver.mode(wavenumber, order);
  }
}
