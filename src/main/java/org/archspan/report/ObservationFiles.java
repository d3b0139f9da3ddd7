package org.archspan.report;

import java.nio.file.Path;
import org.archspan.figure.FigureStyle;
import org.archspan.figure.ObservationFigure;
import org.archspan.observe.ObservedArm;
import org.archspan.table.ComplexTable;
import org.archspan.table.WriteException;
import org.archspan.units.OutputUnits;

/** Everything that an observation writes. */
public final class ObservationFiles {
  private ObservationFiles() {
  }

  /** Writes tables, figure, summary and report. */
  public static void write(ObservationSource source, ObservedArm arm, OutputUnits units, Path folder, boolean overwrite)
      throws WriteException {
    String summary = ObservationText.text(source, arm, units, 88);
    OutputFolder output = new OutputFolder().text("summary.json", ObservationJson.text(source, arm, units))
        .text("summary.txt", summary).table("complexes", ComplexTable.complexes(arm, source.names(), units))
        .table("periodogram", ComplexTable.periodogram(arm.peak(), units))
        .figure("observe", new ObservationFigure(arm, units, FigureStyle.journal()));
    ReportPage page = new ReportPage().figure("Complexes and their spacing", output.content("observe.svg"))
        .table("Complexes along the arm", ComplexTable.complexes(arm, source.names(), units));
    output.text("report.html", page.html(source.echo(), ObservationText.sentence(arm, units), summary))
        .write(folder, overwrite);
  }
}
