package org.archspan.report;

import java.nio.file.Path;
import org.archspan.figure.AmplificationFigure;
import org.archspan.figure.FigureStyle;
import org.archspan.shear.Amplification;
import org.archspan.table.AmplificationTable;
import org.archspan.table.WriteException;
import org.archspan.units.OutputUnits;

/** Everything that is written of a wave in a shearing disk. */
public final class AmplificationFiles {
  private AmplificationFiles() {
  }

  /** Writes tables, figure and summary. */
  public static void write(Amplification wave, OutputUnits units, String json, String text, Path folder,
      boolean overwrite) throws WriteException {
    new OutputFolder().text("summary.json", json).text("summary.txt", text)
        .table("amplify", AmplificationTable.of(wave, units)).table("starts", AmplificationTable.starts(wave))
        .figure("amplify", new AmplificationFigure(wave, units, FigureStyle.journal())).write(folder, overwrite);
  }
}
