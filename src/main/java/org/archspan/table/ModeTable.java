package org.archspan.table;

import java.util.Arrays;
import java.util.List;
import org.archspan.stability.EigenMode;
import org.archspan.units.OutputUnits;

/** The shape of a mode against height. */
public final class ModeTable {
  private ModeTable() {
  }

  /** One row for each height. */
  public static Table of(EigenMode mode, OutputUnits units) {
    return new Table("mode", List.of(
        Column.of("height", units.length(), "height z", lengths(mode.height(), units)),
        Column.of("along", units.length(), "displacement amplitude along the field", lengths(mode.along(), units)),
        Column.of("across", units.length(), "across the field", lengths(mode.across(), units)),
        Column.of("vertical", units.length(), "upward", lengths(mode.vertical(), units)),
        Column.of("divergence", "", "of the displacement", mode.divergence()),
        Column.of("density_contrast", "", "rho_1/rho", mode.densityContrast()),
        Column.of("kinetic_energy", "", "density over its maximum", mode.kineticEnergy())));
  }

  private static double[] lengths(double[] values, OutputUnits units) {
    return Arrays.stream(values).map(units::length).toArray();
  }
}
