package org.archspan.cli;

import java.io.IOException;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.EquilibriumBuilder;
import org.archspan.modelfile.Model;
import org.archspan.report.FigureFiles;
import org.archspan.report.PlaneText;
import org.archspan.report.ResultJson;
import org.archspan.spacing.PlaneResult;
import org.archspan.spacing.PlaneStudy;
import org.archspan.table.PlaneTable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;

/** Growth over the plane of wavenumbers. */
@Command(name = "plane", mixinStandardHelpOptions = true,
    description = "Growth rate over the plane of wavenumbers along and across the field, with the limit of infinitely"
        + " short waves across.")
final class PlaneCommand extends ModelCommand {
  @Option(names = "--points", paramLabel = "N", defaultValue = "64",
      description = "wavenumbers along each axis, 2 to 1000 (default ${DEFAULT-VALUE})")
  int points;

  @Override
  void solve(Model model) throws IOException {
    if (points < 2 || points > 1000) {
      throw new ParameterException(spec.commandLine(), "--points " + points + ": allowed is 2 to 1000");
    }
    Equilibrium equilibrium = EquilibriumBuilder.build(model.disk(), common.tolerance);
    PlaneResult plane;
    try (Progress progress = new Progress("plane", points, common.quiet || common.json)) {
      plane = new PlaneStudy(model.disk(), equilibrium, model.options()).solve(points, common.threads, progress::step);
    }
    if (common.out != null) {
      new FigureFiles(common.out, common.overwrite).plane(plane, PlaneTable.of(plane, model.units()), model.units());
    }
    print(() -> ResultJson.plane(echo(model), plane, model.units()),
        () -> PlaneText.text(model.title(), model.disk(), equilibrium, plane, model.units(), width()));
  }
}
