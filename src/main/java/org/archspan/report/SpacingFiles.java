package org.archspan.report;

import java.nio.file.Path;
import java.util.ArrayList;
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
import org.archspan.spacing.Elasticities;
import org.archspan.spacing.GrowthCurves;
import org.archspan.spacing.ModeStudy;
import org.archspan.spacing.SearchOptions;
import org.archspan.spacing.SpacingResult;
import org.archspan.stability.EigenMode;
import org.archspan.stability.GrowthCurve;
import org.archspan.stability.GrowthPoint;
import org.archspan.table.BranchTable;
import org.archspan.table.ElasticityTable;
import org.archspan.table.EquilibriumTable;
import org.archspan.table.GrowthTable;
import org.archspan.table.ModeTable;
import org.archspan.table.Table;
import org.archspan.table.WriteException;
import org.archspan.units.OutputUnits;

/** Everything that the main job writes. */
public final class SpacingFiles {
  private static final int ROWS = 401;
  private static final int PRINTED_ROWS = 11;

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

  /** Makes and writes tables (without rows where nothing grows), figures, summary and report. */
  public void write(Path folder, String json, String summary, ModelEcho model, boolean overwrite)
      throws WriteException {
    FigureStyle style = FigureStyle.journal();
    OutputFolder output = new OutputFolder().text("summary.json", json).text("summary.txt", summary)
        .table("equilibrium", EquilibriumTable.of(result.equilibrium(), ROWS, units))
        .figure("equilibrium", new EquilibriumFigure(result.equilibrium(), units, style));
    ReportPage page = new ReportPage().figure("Base state against height", output.content("equilibrium.svg"));
    growth(output, page, style);
    new ModeStudy(disk, result.equilibrium(), options, Arm.unknown()).spacingMode(result)
        .ifPresent(mode -> mode(mode, output, page, style));
    page.table("Base state", EquilibriumTable.of(result.equilibrium(), PRINTED_ROWS, units));
    result.elasticities().ifPresent(answers -> elasticities(answers, output, page));
    output.text("report.html", page.html(model, SpacingText.sentence(result, units), summary));
    output.write(folder, overwrite);
  }

  private static void elasticities(Elasticities answers, OutputFolder output, ReportPage page) {
    Table table = ElasticityTable.of(answers);
    output.table("elasticities", table);
    if (table.rows() > 0) {
      page.table("Per cent of change for each per cent of an input", table);
    }
  }

  private void growth(OutputFolder output, ReportPage page, FigureStyle style) {
    List<GrowthCurve> curves = GrowthCurves.of(result, disk, options);
    output.table("growth", GrowthTable.of(curves, units));
    output.table("branches", BranchTable.of(result.branches(), units));
    if (!result.branches().isEmpty()) {
      page.table("Unstable branches", BranchTable.of(result.branches(), units));
    }
    if (!result.stable()) {
      output.figure("growth", growthFigure(curves, style));
      page.figure("Growth rate against wavelength" + still(), output.content("growth.svg"));
    }
  }

  private void mode(EigenMode mode, OutputFolder output, ReportPage page, FigureStyle style) {
    output.table("mode", ModeTable.of(mode, units)).figure("mode", new ModeFigure(mode, units, style));
    page.figure("Mode that sets the spacing" + still(), output.content("mode.svg"));
    output.figure("drivers", Drivers.figure(mode.work(), style));
    page.figure("What drives it, and what resists it" + still(), output.content("drivers.svg"));
  }

  /** What a caption adds where the answer is with rotation and the drawing is not. */
  private String still() {
    return result.rotation().isPresent() ? ", without rotation" : "";
  }

  private GrowthFigure growthFigure(List<GrowthCurve> curves, FigureStyle style) {
    return new GrowthFigure(curves, marks(), OptionalDouble.of(result.acrossLimit().growthRate()),
        result.longestStableWavelength(), units, style);
  }

  /**
   * The mode that sets the spacing, and the fastest where that is another; with rotation the mode that sets the spacing, and
   * the one on the curves, which are without.
   */
  private List<GrowthFigure.Mark> marks() {
    List<GrowthFigure.Mark> marks = new ArrayList<>();
    if (result.rotation().isPresent()) {
      result.spacingPeak().ifPresent(peak -> marks.add(mark("with rotation", peak)));
      result.withoutRotation().spacingPeak().ifPresent(peak -> marks.add(mark("without, as the curves", peak)));
      return marks;
    }
    result.spacing().map(result.branches()::get).ifPresent(peak -> marks.add(mark("sets the spacing", peak)));
    result.fastest().filter(peak -> !result.spacingPeak().equals(Optional.of(peak)) || marks.isEmpty())
        .ifPresent(peak -> marks.add(mark(peak.continuum() ? "continuum edge" : "fastest", peak)));
    return marks;
  }

  private static GrowthFigure.Mark mark(String name, BranchPeak peak) {
    return new GrowthFigure.Mark(name, point(peak));
  }

  private static GrowthPoint point(BranchPeak peak) {
    return new GrowthPoint(peak.wavenumber(), peak.growthRate(), peak.growthError(), peak.unstableModes());
  }
}
