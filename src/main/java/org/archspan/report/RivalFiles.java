package org.archspan.report;

import java.nio.file.Path;
import org.archspan.figure.FigureStyle;
import org.archspan.figure.RivalFigure;
import org.archspan.rivals.RivalResult;
import org.archspan.table.RivalTable;
import org.archspan.table.WriteException;
import org.archspan.units.OutputUnits;

/** Everything that the rivals write. */
public final class RivalFiles {
  private RivalFiles() {
  }

  /** Writes tables, figure and summary. */
  public static void write(RivalResult result, OutputUnits units, ModelEcho model, String json, String text,
      Path folder, boolean overwrite) throws WriteException {
    OutputFolder output = new OutputFolder().text("summary.json", json).text("summary.txt", text)
        .table("rivals", RivalTable.of(result, units));
    if (!result.interfaces().isEmpty()) {
      output.table("interfaces", RivalTable.limits(result.interfaces(), units))
          .table("interface-growth", RivalTable.interfaces(result.interfaces(), units));
    }
    output.figure("rivals", new RivalFigure(result, units, FigureStyle.journal()));
    ReportPage page = new ReportPage().figure("E-folding time against wavelength", output.content("rivals.svg"))
        .table("Instabilities of the same gas", RivalTable.of(result, units));
    output.text("report.html", page.html(model, RivalText.sentence(result, units), text)).write(folder, overwrite);
  }
}
