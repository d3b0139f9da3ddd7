package org.archspan.cli;

import java.io.IOException;
import org.archspan.disk.Disk;
import org.archspan.modelfile.Model;
import org.archspan.report.SpacingJson;
import org.archspan.report.SpacingText;
import org.archspan.report.SpacingFiles;
import org.archspan.spacing.ElasticityStudy;
import org.archspan.spacing.SpacingResult;
import org.archspan.spacing.SpacingStudy;
import picocli.CommandLine.Command;

/** The main job. */
@Command(name = "spacing", mixinStandardHelpOptions = true,
    description = "The main job: equilibrium, growth rate against wavelength, fastest mode, its spacing, growth time and"
        + " mass per complex, with the proof that no faster mode was missed.")
final class SpacingCommand extends ModelCommand {
  @Override
  void solve(Model model) throws IOException {
    SpacingResult solved = solved(model.disk(), model);
    SpacingResult result =
        solved.with(new ElasticityStudy(model.disk(), model.options(), solved).of(model.numbers()));
    if (common.out != null) {
      String text = SpacingText.text(model.title(), model.disk(), result, model.units(), 88);
      new SpacingFiles(result, model.disk(), model.options(), model.units()).write(common.out,
          SpacingJson.text(echo(model), result, model.units()), text, echo(model), common.overwrite);
    }
    print(() -> SpacingJson.text(echo(model), result, model.units()),
        () -> SpacingText.text(model.title(), model.disk(), result, model.units(), width()));
  }

  /** The answer for a disk with the waves and the arm of a model. */
  static SpacingResult solved(Disk disk, Model model) {
    return new SpacingStudy(disk, model.options(), model.arm()).solve();
  }
}
