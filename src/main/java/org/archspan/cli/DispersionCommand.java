package org.archspan.cli;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.EquilibriumBuilder;
import org.archspan.modelfile.Model;
import org.archspan.report.CurvesText;
import org.archspan.report.FigureFiles;
import org.archspan.report.ResultJson;
import org.archspan.spacing.DispersionStudy;
import org.archspan.stability.GrowthCurve;
import org.archspan.table.GrowthTable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;

/** Growth rate against wavelength. */
@Command(name = "dispersion", mixinStandardHelpOptions = true,
    description = "Growth rate against wavelength for one or several cross-field wavelengths, mode orders and parities.")
final class DispersionCommand extends ModelCommand {
  @Option(names = "--across", paramLabel = "LENGTH", converter = CrossWavelength.Converter.class,
      description = "wavelength across the field, or infinite; repeatable (default: the model's)")
  List<CrossWavelength> across = new ArrayList<>();

  @Option(names = "--orders", paramLabel = "N", defaultValue = "1",
      description = "mode orders for each parity, 1 to 30 (default ${DEFAULT-VALUE})")
  int orders;

  @Option(names = "--points", paramLabel = "N", defaultValue = "120",
      description = "wavelengths on each curve, 2 to 100000 (default ${DEFAULT-VALUE})")
  int points;

  @Override
  void solve(Model model) throws IOException {
    if (orders < 1 || orders > 30 || points < 2 || points > 100000) {
      throw new ParameterException(spec.commandLine(), "allowed is --orders 1 to 30 and --points 2 to 100000");
    }
    Equilibrium equilibrium = EquilibriumBuilder.build(model.disk(), common.tolerance);
    DispersionStudy study = new DispersionStudy(model.disk(), equilibrium, model.options());
    double[] wavenumbers = across.stream().mapToDouble(CrossWavelength::wavenumber).toArray();
    List<GrowthCurve> curves = study.solve(wavenumbers, orders, points);
    if (common.out != null) {
      new FigureFiles(common.out, common.overwrite).dispersion(curves, GrowthTable.of(curves, model.units()),
          model.units());
    }
    print(() -> ResultJson.dispersion(echo(model), curves, model.units()),
        () -> CurvesText.text(model.title(), model.disk(), equilibrium, curves, model.units(), width()));
  }
}
