package org.archspan.table;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.ToDoubleFunction;
import org.archspan.observe.ComplexOnArm;
import org.archspan.observe.ObservedArm;
import org.archspan.observe.PeriodogramPeak;
import org.archspan.units.OutputUnits;

/** Complexes along their arm, and the periodogram of their positions. */
public final class ComplexTable {
  private ComplexTable() {
  }

  /**
   * One row for each complex of the arm, from the inner end outward, then those off the arm, without an arc position.
   */
  public static Table complexes(ObservedArm arm, List<String> names, OutputUnits units) {
    List<ComplexOnArm> rows = new ArrayList<>(arm.chain().complexes());
    boolean[] member = new boolean[names.size()];
    rows.forEach(each -> member[each.index()] = true);
    for (int i = 0; i < names.size(); i++) {
      if (!member[i]) {
        rows.add(new ComplexOnArm(i, arm.positions().get(i).azimuth(), Double.NaN, Double.NaN));
      }
    }
    return new Table("complexes along the arm", List.of(
        Column.of("name", "as in the table that was read", rows.stream().map(each -> names.get(each.index())).toList()),
        column(rows, "x", units.length(), "along the line of nodes",
            each -> units.length(arm.positions().get(each.index()).x())),
        column(rows, "y", units.length(), "across it, in the plane of the disk",
            each -> units.length(arm.positions().get(each.index()).y())),
        column(rows, "radius", units.length(), "in the plane of the disk",
            each -> units.length(arm.positions().get(each.index()).radius())),
        column(rows, "azimuth", "deg", "from the line of nodes, turns counted", each -> Math.toDegrees(each.azimuth())),
        column(rows, "membership", "", "probability that it belongs to the arm",
            each -> arm.arm().membership()[each.index()]),
        column(rows, "arc_position", units.length(), "along the arm from its innermost complex",
            each -> units.length(each.arcPosition())),
        lengths("separation", "arc length to the next complex outward", arm.chain().separations(), rows, units),
        lengths("nearest", "arc length to the nearest complex", arm.chain().nearestDistances(), rows, units),
        column(rows, "across", units.length(), "from the middle of the arm, positive outward",
            each -> units.length(each.across()))));
  }

  /** The power at each wavelength that was searched. */
  public static Table periodogram(PeriodogramPeak peak, OutputUnits units) {
    double[] wavelengths = new double[peak.powers().length];
    Arrays.setAll(wavelengths, k -> units.length(1.0 / peak.grid().frequency(k)));
    return new Table("periodogram of the arc positions", List.of(
        Column.of("wavelength", units.length(), "along the arm", wavelengths),
        Column.of("power", "", "Rayleigh power", peak.powers())));
  }

  private static Column column(List<ComplexOnArm> rows, String name, String unit, String description,
      ToDoubleFunction<ComplexOnArm> value) {
    return Column.of(name, unit, description, rows.stream().mapToDouble(value).toArray());
  }

  private static Column lengths(String name, String description, double[] lengths, List<ComplexOnArm> rows,
      OutputUnits units) {
    double[] padded = new double[rows.size()];
    Arrays.setAll(padded, i -> i < lengths.length ? units.length(lengths[i]) : Double.NaN);
    return Column.of(name, units.length(), description, padded);
  }
}
