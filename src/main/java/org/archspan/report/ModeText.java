package org.archspan.report;

import java.util.ArrayList;
import java.util.List;
import org.archspan.boundary.Parity;
import org.archspan.disk.Disk;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.stability.EigenMode;
import org.archspan.units.OutputUnits;

/** One mode in words and a short table. */
public final class ModeText {
  private static final int ROWS = 11;

  private ModeText() {
  }

  /** The summary, wrapped to a width in characters. */
  public static String text(String title, Disk disk, EigenMode mode, Equilibrium equilibrium, OutputUnits units,
      int width) {
    TextBlock block = Assumptions.stillBlock(title, disk, equilibrium, units, width).heading("Mode");
    String parity = switch (mode.parity()) {
      case MIRROR -> "mirror-symmetric about the midplane";
      case FLEXING -> "flexing the midplane";
      case FLOOR -> "above a rigid floor";
    };
    block.labelled("symmetry", parity + ", order " + mode.order())
        .labelled("wavelength", Numbers.length(2.0 * Math.PI / mode.wavenumber(), units)
            + (disk.fieldTurn() == 0.0 ? " along the field"
                : " along the wavevector; amplitudes along and across are those of the field at each height"))
        .labelled("growth time", Numbers.time(1.0 / mode.growthRate(), units))
        .labelled("centroid", Numbers.length(mode.centroidHeight(), units) + " (kinetic energy)")
        .labelled("column", mode.parity() == Parity.FLEXING
            ? "unchanged to first order: what one side gains the other loses"
            : "contrast " + Numbers.plain(mode.columnContrast())
                + " when the midplane layer moves by one scale height");
    block.heading("What drives it, in units of the square of the growth rate, to which the terms add up")
        .table(work(mode));
    block.heading("Amplitudes, for a midplane layer that moves by one scale height ("
        + Numbers.length(equilibrium.scaleHeight(), units) + ")").table(2, rows(mode, units));
    return block.text();
  }

  private static List<List<String>> work(EigenMode mode) {
    List<List<String>> rows = new ArrayList<>();
    rows.add(List.of("term", "share", ""));
    Drivers.of(mode.work()).forEach(term -> rows.add(List.of(term.name(), term.words(), term.verdict())));
    return rows;
  }

  private static List<List<String>> rows(EigenMode mode, OutputUnits units) {
    List<List<String>> rows = new ArrayList<>();
    rows.add(List.of("height", "along", "across", "vertical", "density", "energy"));
    rows.add(List.of(units.length(), units.length(), units.length(), units.length(), "contrast", "of maximum"));
    double length = 1.0 / units.centimetresPerLength();
    List<List<String>> columns = List.of(column(mode.height(), length), column(mode.along(), length),
        column(mode.across(), length), column(mode.vertical(), length), column(mode.densityContrast(), 1.0),
        column(mode.kineticEnergy(), 1.0));
    for (int row = 0; row < ROWS; row++) {
      int at = row;
      rows.add(columns.stream().map(column -> column.get(at)).toList());
    }
    return rows;
  }

  /** Equidistant values; what is below a millionth of the greatest is the mesh's own noise and reads 0. */
  private static List<String> column(double[] values, double unit) {
    double greatest = java.util.Arrays.stream(values).map(Math::abs).max().orElse(0.0);
    List<String> column = new ArrayList<>();
    for (int row = 0; row < ROWS; row++) {
      double value = values[Math.round((float) (values.length - 1) * row / (ROWS - 1))];
      column.add(Numbers.plain(Math.abs(value) < 1e-6 * greatest ? 0.0 : value * unit));
    }
    return column;
  }
}
