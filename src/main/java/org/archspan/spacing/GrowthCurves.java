package org.archspan.spacing;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import org.archspan.boundary.Parity;
import org.archspan.disk.Disk;
import org.archspan.stability.BranchSolver;
import org.archspan.stability.GrowthCurve;

/** Growth against wavelength of the branches that are reported. */
public final class GrowthCurves {
  private static final int POINTS = 120;
  private static final double LONGEST_OVER_FASTEST = 12.0;

  private GrowthCurves() {
  }

  /** One curve for each branch of a result, from the shortest wave that grows to well beyond the fastest. */
  public static List<GrowthCurve> of(SpacingResult result, Disk disk, SearchOptions options) {
    WaveRange range = result.range();
    double slowest = result.branches().stream().mapToDouble(BranchPeak::wavenumber).filter(k -> k > 0.0).min()
        .orElse(0.0);
    Map<Parity, BranchSolver> solvers = new EnumMap<>(Parity.class);
    List<GrowthCurve> curves = new ArrayList<>();
    for (BranchPeak peak : result.branches()) {
      BranchSolver solver = solvers.computeIfAbsent(peak.parity(), parity -> new BranchSolver(
          range.problem(disk, result.equilibrium(), parity, options.tolerance())));
      double highest = Math.min(range.highest(), solver.marginalWavenumber(peak.order()));
      double lowest = Math.max(range.lowest(), slowest / LONGEST_OVER_FASTEST);
      if (lowest > 0.0 && lowest < highest && Double.isFinite(highest)) {
        curves.add(of(solver, peak.order(), lowest, highest, POINTS, false));
      }
    }
    return curves;
  }

  /** The curve of one branch over a range of wavenumbers, cm^-1, crowded towards the short end where growth dies. */
  public static GrowthCurve of(BranchSolver solver, int order, double lowest, double highest, int points,
      boolean countModes) {
    return solver.curve(order, wavenumbers(lowest, highest, points), countModes);
  }

  /** Logarithmic steps that shrink towards the marginal wavenumber, which growth reaches as a square root. */
  static double[] wavenumbers(double lowest, double highest, int points) {
    double[] wavenumbers = new double[points];
    double span = Math.log(highest / lowest);
    for (int i = 0; i < points; i++) {
      double left = 1.0 - (double) i / (points - 1);
      wavenumbers[i] = highest * Math.exp(-span * left * left);
    }
    return wavenumbers;
  }
}
