package org.archspan.report;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import org.archspan.disk.Disk;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.stability.GrowthCurve;
import org.archspan.stability.GrowthPoint;
import org.archspan.units.OutputUnits;

/** Growth curves in words: the fastest point and the short end of each. */
public final class CurvesText {
  private CurvesText() {
  }

  /** The summary, wrapped to a width in characters. */
  public static String text(String title, Disk disk, Equilibrium equilibrium, List<GrowthCurve> curves,
      OutputUnits units, int width) {
    TextBlock block = Assumptions.stillBlock(title, disk, equilibrium, units, width);
    block.heading("Growth curves");
    if (curves.isEmpty()) {
      return block.sentence("No branch grows at any wavelength of the range.").text();
    }
    List<List<String>> rows = new ArrayList<>();
    rows.add(List.of("parity", "order", "across", "fastest point", "growth time", "error", "modes", "short end"));
    curves.forEach(curve -> rows.add(row(curve, units)));
    return block.table(rows).sentence("The fastest point is the fastest of the wavelengths on the curve; archspan spacing"
        + " finds the true maximum.").text();
  }

  private static List<String> row(GrowthCurve curve, OutputUnits units) {
    GrowthPoint best = curve.points().stream().max(Comparator.comparingDouble(GrowthPoint::growthRate)).orElseThrow();
    GrowthPoint shortest = curve.points().get(curve.points().size() - 1);
    return List.of(curve.parity().name().toLowerCase(Locale.ROOT), Integer.toString(curve.order()),
        Numbers.length(2.0 * Math.PI / curve.crossWavenumber(), units), Numbers.length(best.wavelength(), units),
        Numbers.time(1.0 / best.growthRate(), units), Numbers.error(best.relativeError()),
        best.unstableModes() < 0 ? "many" : Integer.toString(best.unstableModes()),
        Numbers.length(shortest.wavelength(), units));
  }
}
