package org.archspan.report;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.archspan.disk.Disk;
import org.archspan.figure.EquilibriumFigure;
import org.archspan.figure.FigureStyle;
import org.archspan.figure.GrowthFigure;
import org.archspan.figure.ModeFigure;
import org.archspan.spacing.Arm;
import org.archspan.spacing.BranchPeak;
import org.archspan.spacing.GrowthCurves;
import org.archspan.spacing.ModeStudy;
import org.archspan.spacing.SearchOptions;
import org.archspan.spacing.SpacingResult;
import org.archspan.stability.EigenMode;
import org.archspan.stability.GrowthCurve;
import org.archspan.stability.GrowthPoint;
import org.archspan.table.BranchTable;
import org.archspan.table.EquilibriumTable;
import org.archspan.table.GrowthTable;
import org.archspan.table.ModeTable;
import org.archspan.table.WriteException;
import org.archspan.units.OutputUnits;

/** Everything that the main job writes. */
public final class SpacingFiles {
  private static final int ROWS = 401;

  private final SpacingResult result;
  private final Disk disk;
  private final SearchOptions options;
  private final OutputUnits units;

  /** Files of a result. */
  public SpacingFiles(SpacingResult result, Disk disk, SearchOptions options, OutputUnits units) {
    this.result = result;
    this.disk = disk;
    this.options = options;
    this.units = units;
  }

  /** Makes and writes tables, figures, summary and report. */
  public void write(Path folder, String json, String summary, ModelEcho model, boolean overwrite)
      throws WriteException {
    FigureStyle style = FigureStyle.journal();
    OutputFolder output = new OutputFolder().text("summary.json", json).text("summary.txt", summary)
        .table("equilibrium", EquilibriumTable.of(result.equilibrium(), ROWS, units))
        .figure("equilibrium", new EquilibriumFigure(result.equilibrium(), units, style));
    List<GrowthCurve> curves = GrowthCurves.of(result, disk, options);
    if (!curves.isEmpty()) {
      output.table("growth", GrowthTable.of(curves, units));
      output.table("branches", BranchTable.of(result.branches(), units));
    }
    if (!result.stable()) {
      output.figure("growth", growthFigure(curves, style));
    }
    Optional<EigenMode> mode = new ModeStudy(disk, result.equilibrium(), options, Arm.unknown()).spacingMode(result);
    mode.ifPresent(shape -> output.table("mode", ModeTable.of(shape, units))
        .figure("mode", new ModeFigure(shape, units, style)));
    output.text("report.html", ReportPage.html(model, summary, SpacingText.sentence(result, units),
        output.content("equilibrium.svg"), result.stable() ? "" : output.content("growth.svg"),
        mode.isPresent() ? output.content("mode.svg") : ""));
    output.write(folder, overwrite);
  }

  private GrowthFigure growthFigure(List<GrowthCurve> curves, FigureStyle style) {
    Optional<GrowthPoint> marked = result.spacingPeak().filter(peak -> peak.wavenumber() > 0.0)
        .map(SpacingFiles::point);
    return new GrowthFigure(curves, marked, OptionalDouble.of(result.acrossLimit().growthRate()),
        result.longestStableWavelength(), units, style);
  }

  private static GrowthPoint point(BranchPeak peak) {
    return new GrowthPoint(peak.wavenumber(), peak.growthRate(), peak.growthError(), peak.unstableModes());
  }
}
