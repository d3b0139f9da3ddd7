package org.archspan.table;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.function.ToDoubleBiFunction;
import org.archspan.stability.GrowthCurve;
import org.archspan.stability.GrowthPoint;
import org.archspan.units.OutputUnits;

/** Growth curves in one long table. */
public final class GrowthTable {
  private GrowthTable() {
  }

  /** All points of all curves. */
  public static Table of(List<GrowthCurve> curves, OutputUnits units) {
    List<String> parities = new ArrayList<>();
    List<Integer> orders = new ArrayList<>();
    List<Integer> modes = new ArrayList<>();
    for (GrowthCurve curve : curves) {
      for (GrowthPoint point : curve.points()) {
        parities.add(curve.parity().name().toLowerCase(Locale.ROOT));
        orders.add(curve.order());
        modes.add(point.unstableModes());
      }
    }
    List<Column> columns = new ArrayList<>(List.of(
        Column.of("parity", "symmetry about the midplane", parities),
        Column.of("mode_order", "0 for the fastest", ints(orders)),
        column(curves, "wavelength", units.length(), "along the field", (c, p) -> units.length(p.wavelength())),
        column(curves, "wavenumber", "1/" + units.length(), "along the field",
            (c, p) -> units.wavenumber(p.wavenumber())),
        column(curves, "cross_wavenumber", "1/" + units.length(), "across the field",
            (c, p) -> units.wavenumber(c.crossWavenumber())),
        column(curves, "growth_rate", "1/" + units.time(), "0 where the branch does not grow",
            (c, p) -> units.rate(p.growthRate())),
        column(curves, "growth_time", units.time(), "e-folding time", (c, p) -> units.time(1.0 / p.growthRate())),
        column(curves, "relative_error", "", "estimated, of the growth rate", (c, p) -> p.relativeError())));
    if (modes.stream().anyMatch(count -> count != 0)) {
      columns.add(Column.of("unstable_modes", "modes of this parity that grow; -1 for infinitely many", ints(modes)));
    }
    return new Table("growth rate against wavelength", columns);
  }

  private static int[] ints(List<Integer> values) {
    return values.stream().mapToInt(Integer::intValue).toArray();
  }

  private static Column column(List<GrowthCurve> curves, String name, String unit, String description,
      ToDoubleBiFunction<GrowthCurve, GrowthPoint> value) {
    double[] values = curves.stream()
        .flatMapToDouble(curve -> curve.points().stream().mapToDouble(point -> value.applyAsDouble(curve, point)))
        .toArray();
    return Column.of(name, unit, description, values);
  }
}
