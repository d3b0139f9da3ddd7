package org.archspan.cli;

import java.io.IOException;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.EquilibriumBuilder;
import org.archspan.equilibrium.ForceBalance;
import org.archspan.modelfile.Model;
import org.archspan.report.EquilibriumText;
import org.archspan.report.FigureFiles;
import org.archspan.report.ResultJson;
import org.archspan.table.EquilibriumTable;
import org.archspan.table.Table;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;

/** The base state alone. */
@Command(name = "equilibrium", mixinStandardHelpOptions = true,
    description = "The base state alone, with its force-balance residual.")
final class EquilibriumCommand extends ModelCommand {
  @Option(names = "--rows", paramLabel = "N", defaultValue = "201",
      description = "heights in the table, 2 to 100000 (default ${DEFAULT-VALUE})")
  int rows;

  @Override
  void solve(Model model) throws IOException {
    if (rows < 2 || rows > 100000) {
      throw new ParameterException(spec.commandLine(), "--rows " + rows + ": allowed is 2 to 100000");
    }
    Equilibrium equilibrium = EquilibriumBuilder.build(model.disk(), common.tolerance);
    ForceBalance.required(equilibrium);
    Table table = EquilibriumTable.of(equilibrium, rows, model.units());
    if (common.out != null) {
      new FigureFiles(common.out, common.overwrite).equilibrium(equilibrium, table, model.units());
    }
    print(() -> ResultJson.equilibrium(echo(model), equilibrium, table, model.units()),
        () -> EquilibriumText.text(model.title(), model.disk(), equilibrium, model.units(), width()));
  }
}
