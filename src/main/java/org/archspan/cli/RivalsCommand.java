package org.archspan.cli;

import java.io.IOException;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.EquilibriumBuilder;
import org.archspan.modelfile.Model;
import org.archspan.report.RivalFiles;
import org.archspan.report.RivalJson;
import org.archspan.report.RivalText;
import org.archspan.rivals.RivalResult;
import org.archspan.rivals.RivalStudy;
import picocli.CommandLine.Command;

/** The other instabilities that could set the scale. */
@Command(name = "rivals", mixinStandardHelpOptions = true,
    description = "The same gas judged by the other instabilities that could set the scale: gravity in the plane of the"
        + " disk with rotation, stars and field, swing amplification, Jeans, a lagging rotation, interfaces. A row"
        + " whose input the model does not give says so; the exit status is 4 only when a row with all its inputs failed.")
final class RivalsCommand extends ModelCommand {
  private boolean failed;

  @Override
  void solve(Model model) throws IOException {
    Equilibrium equilibrium = EquilibriumBuilder.build(model.disk(), common.tolerance);
    RivalResult result = new RivalStudy(model.disk(), equilibrium, model.rivals())
        .solve(() -> SpacingCommand.solved(model.disk(), model));
    failed = result.failed();
    if (common.out != null) {
      String json = RivalJson.text(echo(model), result, model.rivals(), model.units());
      String text = RivalText.text(model.title(), model.disk(), equilibrium, model.rivals(), result, model.units(), 88);
      RivalFiles.write(result, model.units(), echo(model), json, text, common.out, common.overwrite);
    }
    print(() -> RivalJson.text(echo(model), result, model.rivals(), model.units()),
        () -> RivalText.text(model.title(), model.disk(), equilibrium, model.rivals(), result, model.units(), width()));
  }

  @Override
  int status() {
    return failed ? ExitStatus.UNSOLVED : ExitStatus.SOLVED;
  }
}
