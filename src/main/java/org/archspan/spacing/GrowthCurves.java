package org.archspan.spacing;

import java.util.ArrayList;
import java.util.List;
import org.archspan.stability.BranchSolver;
import org.archspan.stability.GrowthCurve;

/** Growth against wavelength of the branches that are reported. */
public final class GrowthCurves {
  private static final int POINTS = 120;
  private static final double LONGEST_OVER_FASTEST = 12.0;

  private GrowthCurves() {
  }

  /** One curve for each branch, from the shortest wave that grows to well beyond the fastest. */
  static List<GrowthCurve> of(BranchSearch search, WaveRange range) {
    List<GrowthCurve> curves = new ArrayList<>();
    double slowest = search.found().stream().mapToDouble(branch -> branch.peak().wavenumber()).filter(k -> k > 0.0)
        .min().orElse(search.marginalWavenumber());
    for (BranchSearch.Found branch : search.found()) {
      double highest = Math.min(range.highest(), branch.solver().marginalWavenumber(branch.peak().order()));
      double lowest = Math.max(range.lowest(), slowest / LONGEST_OVER_FASTEST);
      if (lowest < highest && Double.isFinite(highest)) {
        curves.add(branch.solver().curve(branch.peak().order(), wavenumbers(lowest, highest, POINTS), false));
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
