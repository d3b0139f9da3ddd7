package org.archspan.report;

import java.nio.file.Path;
import org.archspan.figure.FigureStyle;
import org.archspan.figure.InferenceFigure;
import org.archspan.inference.Inference;
import org.archspan.table.InferenceTable;
import org.archspan.table.WriteException;
import org.archspan.units.OutputUnits;

/** Everything that an inference writes. */
public final class InferenceFiles {
  private InferenceFiles() {
  }

  /**
   * Writes tables, figure and summary.
   *
   * @param armWidth whether the arm has one, so that masses are whole
   */
  public static void write(Inference inference, OutputUnits units, boolean armWidth, ModelEcho model, String json,
      String text, Path folder, boolean overwrite) throws WriteException {
    OutputFolder output = new OutputFolder().text("summary.json", json).text("summary.txt", text)
        .table("relation", InferenceTable.relation(inference, units, armWidth))
        .table("intervals", InferenceTable.intervals(inference)).table("posterior", InferenceTable.posterior(inference))
        .figure("inference", new InferenceFigure(inference, units, FigureStyle.journal()));
    ReportPage page = new ReportPage()
        .figure("Spacing against the input, and the input before and after", output.content("inference.svg"))
        .table("Inputs before and after", InferenceTable.posterior(inference))
        .table("Along the range, all other inputs at their middles",
            InferenceTable.relation(inference, units, armWidth));
    output.text("report.html", page.html(model, InferenceText.sentence(inference, units), text))
        .write(folder, overwrite);
  }
}
