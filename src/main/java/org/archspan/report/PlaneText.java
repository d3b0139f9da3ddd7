package org.archspan.report;

import org.archspan.disk.Disk;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.spacing.PlaneResult;
import org.archspan.units.OutputUnits;

/** The plane of wavenumbers in words. */
public final class PlaneText {
  private PlaneText() {
  }

  /** The summary, wrapped to a width in characters. */
  public static String text(String title, Disk disk, Equilibrium equilibrium, PlaneResult plane, OutputUnits units,
      int width) {
    int bestAlong = 0;
    int bestAcross = 0;
    double limit = 0.0;
    for (int i = 0; i < plane.along().length; i++) {
      limit = Math.max(limit, plane.limit()[i]);
      for (int j = 0; j < plane.across().length; j++) {
        if (plane.growthRate()[i][j] > plane.growthRate()[bestAlong][bestAcross]) {
          bestAlong = i;
          bestAcross = j;
        }
      }
    }
    TextBlock block = Assumptions.stillBlock(title, disk, equilibrium, units, width).heading("Plane of wavenumbers");
    double best = plane.growthRate()[bestAlong][bestAcross];
    if (best == 0.0) {
      block.sentence("No wave grows on this grid.");
    } else {
      block.sentence("Fastest on the grid: one e-folding in " + Numbers.time(1.0 / best, units) + " at a wavelength of "
          + Numbers.length(2.0 * Math.PI / plane.along()[bestAlong], units) + " along and "
          + Numbers.length(2.0 * Math.PI / Math.abs(plane.across()[bestAcross]), units)
              + " across the field" + (disk.fieldTurn() == 0.0 ? "." : " at the lower end."));
    }
    block.sentence(limit == 0.0 ? "Infinitely short waves across the field, which no ideal wave outgrows, do not grow"
        + " at the wavelengths of the grid either."
        : "Infinitely short waves across the field grow in " + Numbers.time(1.0 / limit, units)
            + ", the fastest at the wavelengths of the grid; at those no ideal wave outgrows them.");
    block.sentence("Linear theory on a static base state; between the points of the grid growth may be faster.");
    return block.text();
  }
}
