package org.archspan.table;

import java.util.List;
import org.archspan.spacing.PlaneResult;
import org.archspan.units.OutputUnits;

/** Growth over the plane of wavenumbers, as one long table; the limit of short waves across has an infinite wavenumber. */
public final class PlaneTable {
  private PlaneTable() {
  }

  /** One row for each pair of wavenumbers. */
  public static Table of(PlaneResult plane, OutputUnits units) {
    int columns = plane.across().length + 1;
    int rows = plane.along().length * columns;
    double[] along = new double[rows];
    double[] across = new double[rows];
    double[] growth = new double[rows];
    for (int row = 0; row < rows; row++) {
      int i = row / columns;
      int j = row % columns;
      boolean limit = j == columns - 1;
      along[row] = units.wavenumber(plane.along()[i]);
      across[row] = limit ? Double.POSITIVE_INFINITY : units.wavenumber(plane.across()[j]);
      growth[row] = units.rate(limit ? plane.limit()[i] : plane.growthRate()[i][j]);
    }
    return new Table("growth rate over the plane of wavenumbers", List.of(
        Column.of("along", "1/" + units.length(), "wavenumber along the field", along),
        Column.of("across", "1/" + units.length(), "wavenumber across the field", across),
        Column.of("growth_rate", "1/" + units.time(), "of the fastest mode; 0 where stable", growth)));
  }
}
