package org.archspan.report;

import org.archspan.spacing.PlaneResult;
import org.archspan.units.OutputUnits;

/** The plane of wavenumbers in words. */
public final class PlaneText {
  private PlaneText() {
  }

  /** The summary, wrapped to a width in characters. */
  public static String text(String title, PlaneResult plane, OutputUnits units, int width) {
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
    TextBlock block = new TextBlock(width).heading(title).heading("Plane of wavenumbers");
    double best = plane.growthRate()[bestAlong][bestAcross];
    if (best == 0.0) {
      return block.sentence("No wave grows on this grid.").text();
    }
    block.sentence("Fastest on the grid: one e-folding in " + Numbers.time(1.0 / best, units) + " at a wavelength of "
        + Numbers.length(2.0 * Math.PI / plane.along()[bestAlong], units) + " along and "
        + Numbers.length(2.0 * Math.PI / plane.across()[bestAcross], units) + " across the field.");
    block.sentence("Infinitely short waves across the field: " + Numbers.time(1.0 / limit, units)
        + ", which no ideal wave outgrows.");
    return block.text();
  }
}
