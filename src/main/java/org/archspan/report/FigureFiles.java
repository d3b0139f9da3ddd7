package org.archspan.report;

import java.nio.file.Path;
import java.util.List;
import java.util.OptionalDouble;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.figure.EquilibriumFigure;
import org.archspan.figure.FigureStyle;
import org.archspan.figure.GrowthFigure;
import org.archspan.figure.ModeFigure;
import org.archspan.figure.PlaneFigure;
import org.archspan.spacing.PlaneResult;
import org.archspan.stability.EigenMode;
import org.archspan.stability.GrowthCurve;
import org.archspan.table.Table;
import org.archspan.table.WriteException;
import org.archspan.units.OutputUnits;

/** Table and figure of one of the smaller commands. */
public final class FigureFiles {
  private final Path folder;
  private final boolean overwrite;

  /** Files for a folder. */
  public FigureFiles(Path folder, boolean overwrite) {
    this.folder = folder;
    this.overwrite = overwrite;
  }

  /** The base state. */
  public void equilibrium(Equilibrium equilibrium, Table table, OutputUnits units) throws WriteException {
    new OutputFolder().table("equilibrium", table)
        .figure("equilibrium", new EquilibriumFigure(equilibrium, units, FigureStyle.journal()))
        .write(folder, overwrite);
  }

  /** Growth curves. */
  public void dispersion(List<GrowthCurve> curves, Table table, OutputUnits units) throws WriteException {
    new OutputFolder().table("growth", table)
        .figure("growth", new GrowthFigure(curves, List.of(), OptionalDouble.empty(), OptionalDouble.empty(),
            units, FigureStyle.journal()))
        .write(folder, overwrite);
  }

  /** One mode. */
  public void mode(EigenMode mode, Equilibrium equilibrium, Table table, OutputUnits units) throws WriteException {
    new OutputFolder().table("mode", table).figure("mode", new ModeFigure(mode, units, FigureStyle.journal()))
        .figure("drivers", Drivers.figure(mode.work(), FigureStyle.journal()))
        .write(folder, overwrite);
  }

  /** The plane of wavenumbers. */
  public void plane(PlaneResult plane, Table table, OutputUnits units) throws WriteException {
    new OutputFolder().table("plane", table).figure("plane", new PlaneFigure(plane, units, FigureStyle.journal()))
        .write(folder, overwrite);
  }
}
