package org.archspan.report;

import java.nio.file.Path;
import org.archspan.figure.EnsembleFigure;
import org.archspan.figure.FigureStyle;
import org.archspan.table.EnsembleTable;
import org.archspan.table.WriteException;
import org.archspan.uncertainty.EnsembleSummary;
import org.archspan.units.OutputUnits;

/** Everything that an ensemble writes beside its draws. */
public final class EnsembleFiles {
  private EnsembleFiles() {
  }

  /**
   * Writes tables, figure and summary.
   *
   * @param armWidth whether the arm has one, so that masses are whole
   */
  public static void write(EnsembleSummary summary, OutputUnits units, boolean armWidth, ModelEcho model, String json,
      String text, Path folder, boolean overwrite) throws WriteException {
    ReportPage page = new ReportPage().table("Ranges", EnsembleTable.ranges(summary, units, armWidth));
    OutputFolder output = new OutputFolder().text("summary.json", json).text("summary.txt", text)
        .table("ensemble", EnsembleTable.ranges(summary, units, armWidth));
    if (summary.design().sensitivities()) {
      output.table("sensitivity", EnsembleTable.sensitivities(summary));
      page.table("Sobol' indices of the logarithm of the wavelength, and of the growth rate (0 where stable)",
          EnsembleTable.sensitivities(summary));
    }
    if (summary.wavelength().total() > 0.0) {
      output.figure("ensemble", new EnsembleFigure(summary, units, FigureStyle.journal()));
      page.figure("Distribution of the spacing, growth time beside it, and what drives it",
          output.content("ensemble.svg"));
    }
    output.text("report.html", page.html(model, EnsembleText.sentence(summary, units), text)).write(folder, overwrite);
  }
}
