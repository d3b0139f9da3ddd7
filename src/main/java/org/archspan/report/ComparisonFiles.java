package org.archspan.report;

import java.nio.file.Path;
import org.archspan.comparison.Comparison;
import org.archspan.figure.ComparisonCurves;
import org.archspan.figure.ComparisonMap;
import org.archspan.figure.FigureStyle;
import org.archspan.table.ComparisonTable;
import org.archspan.table.Table;
import org.archspan.table.WriteException;
import org.archspan.units.OutputUnits;

/** Everything that a comparison writes. */
public final class ComparisonFiles {
  private ComparisonFiles() {
  }

  /** Writes table, figure (of one or two varied inputs), summary and report. */
  public static void write(Comparison comparison, OutputUnits units, ModelEcho model, String json, String text,
      Path folder, boolean overwrite) throws WriteException {
    Table table = ComparisonTable.of(comparison, units);
    OutputFolder output = new OutputFolder().text("summary.json", json).text("summary.txt", text).table("compare",
        table);
    ReportPage page = new ReportPage().table("All cases", table);
    if (comparison.inputs().size() == 1) {
      output.figure("compare", new ComparisonCurves(comparison, units, FigureStyle.journal()));
    } else if (comparison.inputs().size() == 2) {
      output.figure("compare", new ComparisonMap(comparison, units, FigureStyle.journal()));
    }
    if (comparison.inputs().size() <= 2) {
      page.figure("The mode that sets the spacing under several assumptions", output.content("compare.svg"));
    }
    output.text("report.html", page.html(model, ComparisonText.sentence(comparison, units), text))
        .write(folder, overwrite);
  }
}
