package org.archspan.spacing;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.archspan.boundary.Parity;
import org.archspan.boundary.TopBoundary;
import org.archspan.disk.Disk;
import org.archspan.disk.RefusedModelException;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.stability.GrowthPoint;
import org.archspan.stability.Peak;
import org.archspan.stability.UnsolvedException;

/** How much each mode owes to the upper end of the domain: the same search in a domain 1.5 times as tall. */
final class DomainInfluence {
  static final double TALLER = 1.5;
  /** A mode whose growth rate or wavelength moves by more than this is held by the lid. */
  static final double HELD = 0.05;
  private static final int MORE_BRANCHES = 4;

  private final Optional<BranchSearch> taller;
  private final boolean open;

  DomainInfluence(Disk disk, Equilibrium equilibrium, SearchOptions options, WaveRange range) {
    open = equilibrium.topBoundary() == TopBoundary.OPEN;
    taller = search(disk, equilibrium, options, range);
  }

  /** The search in the taller domain; empty where there is no such domain. */
  private static Optional<BranchSearch> search(Disk disk, Equilibrium equilibrium, SearchOptions options,
      WaveRange range) {
    Optional<Equilibrium> stretched = stretched(equilibrium);
    try {
      return stretched.map(state -> new BranchSearch(disk, state, options, range, options.branches() + MORE_BRANCHES));
    } catch (RefusedModelException | UnsolvedException impossible) {
      return Optional.empty();
    }
  }

  /** The same state in the taller domain; empty where gravity is not known, or the field is not supported, so far up. */
  static Optional<Equilibrium> stretched(Equilibrium equilibrium) {
    double top = equilibrium.bottom() + TALLER * (equilibrium.top() - equilibrium.bottom());
    Equilibrium stretched = equilibrium.withTop(top);
    return stretched.top() < top || !(stretched.at(top).magneticPerMass() >= 0.0) ? Optional.empty()
        : Optional.of(stretched);
  }

  /** The edge of the continuum above an open top: what the taller domain changes is its error. */
  BranchPeak judgeHalo(GrowthPoint edge, Parity parity, double crossWavenumber) {
    Optional<GrowthPoint> other = taller.flatMap(BranchSearch::halo);
    double growthChange = other.map(point -> point.growthRate() / edge.growthRate() - 1.0).orElse(Double.NaN);
    double wavelengthChange = other.map(point -> edge.wavenumber() / point.wavenumber() - 1.0).orElse(Double.NaN);
    return new BranchPeak(parity, 0, edge.wavenumber(), crossWavenumber, edge.growthRate(),
        edge.relativeError() + Math.abs(growthChange), edge.relativeError() + Math.abs(wavelengthChange), -1,
        Double.POSITIVE_INFINITY, Double.NaN, HeldBy.HALO, growthChange, wavelengthChange, Optional.empty());
  }

  /** Every peak with what holds it. */
  List<BranchPeak> judge(List<BranchSearch.Found> found) {
    List<BranchPeak> judged = new ArrayList<>();
    for (BranchSearch.Found branch : found) {
      judged.add(judge(branch));
    }
    return judged;
  }

  private BranchPeak judge(BranchSearch.Found branch) {
    Peak peak = branch.peak();
    double growthChange = Double.NaN;
    double wavelengthChange = Double.NaN;
    Optional<Peak> match = match(branch);
    if (match.isPresent()) {
      growthChange = match.get().growthRate() / peak.growthRate() - 1.0;
      wavelengthChange = peak.wavenumber() == match.get().wavenumber() ? 0.0
          : peak.wavenumber() / match.get().wavenumber() - 1.0;
    }
    boolean lid = !(Math.abs(growthChange) <= HELD && Math.abs(wavelengthChange) <= HELD);
    boolean truncated = open && match.isPresent();
    return new BranchPeak(branch.parity(), peak.order(), peak.wavenumber(),
        branch.solver().problem().crossWavenumber(), peak.growthRate(),
        peak.growthError() + (truncated ? Math.abs(growthChange) : 0.0),
        peak.wavelengthError() + (truncated ? Math.abs(wavelengthChange) : 0.0), peak.unstableModes(),
        peak.mode().centroidHeight(), peak.mode().columnContrast(), heldBy(peak, lid), growthChange,
        wavelengthChange, Optional.of(peak.mode().work()));
  }

  /** A branch that still rises where it ends in the continuum above an open top is held by neither disk nor lid. */
  private HeldBy heldBy(Peak peak, boolean lid) {
    if (open && Double.isNaN(peak.wavelengthError())) {
      return HeldBy.HALO;
    }
    return lid ? HeldBy.LID : HeldBy.DISK;
  }

  /** The branch of the taller domain whose shape is most like this one: orders may have shifted. */
  private Optional<Peak> match(BranchSearch.Found branch) {
    Peak best = null;
    double greatest = 0.0;
    for (BranchSearch.Found candidate : taller.map(BranchSearch::found).orElse(List.of())) {
      if (candidate.parity() == branch.parity()) {
        double overlap = ShapeOverlap.of(branch.peak().mode(), candidate.peak().mode());
        if (overlap > greatest) {
          greatest = overlap;
          best = candidate.peak();
        }
      }
    }
    return Optional.ofNullable(best);
  }
}
