package org.archspan.spacing;

import java.util.Optional;
import java.util.OptionalDouble;
import org.archspan.boundary.Parity;
import org.archspan.disk.Disk;
import org.archspan.disk.RefusedModelException;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.stability.BranchSolver;
import org.archspan.stability.Peak;
import org.archspan.stability.UnsolvedException;

/**
 * Whether a peak stays where it is in a domain 1.5 times as tall, asked at its own wavelength and at those 5 per
 * cent beside it. {@link DomainInfluence} measures by how much it moves, at the cost of a search.
 */
final class LidTest {
  /** Orders may shift in the taller domain, where gas above the old top has modes of its own. */
  private static final int MORE_ORDERS = 2;
  private final Disk disk;
  private final Equilibrium equilibrium;
  private final WaveRange range;
  private final double tolerance;

  LidTest(Disk disk, Equilibrium equilibrium, WaveRange range, double tolerance) {
    this.disk = disk;
    this.equilibrium = equilibrium;
    this.range = range;
    this.tolerance = tolerance;
  }

  /** Whether the disk holds the peak. */
  boolean passes(Peak peak, Parity parity) {
    Optional<BranchSolver> taller = taller(parity);
    for (int order = peak.order(); taller.isPresent() && order <= peak.order() + MORE_ORDERS; order++) {
      if (stays(taller.get(), peak, order)) {
        return true;
      }
    }
    return false;
  }

  private Optional<BranchSolver> taller(Parity parity) {
    try {
      return DomainInfluence.stretched(equilibrium)
          .map(stretched -> new BranchSolver(range.problem(disk, stretched, parity, tolerance)));
    } catch (RefusedModelException | UnsolvedException impossible) {
      return Optional.empty();
    }
  }

  private static boolean stays(BranchSolver solver, Peak peak, int order) {
    double k = peak.wavenumber();
    OptionalDouble here = growth(solver, k, order, peak.growthRate());
    if (here.isEmpty() || Math.abs(here.getAsDouble() / peak.growthRate() - 1.0) > DomainInfluence.HELD) {
      return false;
    }
    double factor = 1.0 + DomainInfluence.HELD;
    return here.getAsDouble() > growth(solver, k * factor, order, here.getAsDouble()).orElse(0.0)
        && here.getAsDouble() > growth(solver, k / factor, order, here.getAsDouble()).orElse(0.0);
  }

  private static OptionalDouble growth(BranchSolver solver, double wavenumber, int order, double guess) {
    try {
      return solver.growth(wavenumber, order, guess).map(point -> OptionalDouble.of(point.growthRate()))
          .orElse(OptionalDouble.empty());
    } catch (UnsolvedException missed) {
      return OptionalDouble.empty();
    }
  }
}
