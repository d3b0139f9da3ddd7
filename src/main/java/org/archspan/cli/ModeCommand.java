package org.archspan.cli;

import java.io.IOException;
import java.util.Locale;
import org.archspan.boundary.Parity;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.EquilibriumBuilder;
import org.archspan.modelfile.Model;
import org.archspan.report.FigureFiles;
import org.archspan.report.ModeText;
import org.archspan.report.ResultJson;
import org.archspan.spacing.ModeStudy;
import org.archspan.stability.EigenMode;
import org.archspan.table.ModeTable;
import org.archspan.table.Table;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;

/** The shape of one mode. */
@Command(name = "mode", mixinStandardHelpOptions = true,
    description = "The eigenfunctions at one wavelength (default: the one that sets the spacing), bent field lines and"
        + " density.")
final class ModeCommand extends ModelCommand {
  @Option(names = "--wavelength", paramLabel = "LENGTH", converter = CrossWavelength.Converter.class,
      description = "along the field")
  CrossWavelength wavelength;

  @Option(names = "--order", paramLabel = "N", description = "mode order, 0 for the fastest at its wavelength")
  Integer order;

  @Option(names = "--parity", paramLabel = "PARITY", description = "mirror or flexing")
  String parity;

  @Override
  void solve(Model model) throws IOException {
    if (wavelength != null && Double.isInfinite(wavelength.centimetres()) || order != null && (order < 0 || order > 99)) {
      throw new ParameterException(spec.commandLine(), "--wavelength must be finite, and --order between 0 and 99");
    }
    Equilibrium equilibrium = EquilibriumBuilder.build(model.disk(), common.tolerance);
    ModeStudy study = new ModeStudy(model.disk(), equilibrium, model.options(), model.arm());
    EigenMode mode = (wavelength == null && order == null && parity == null ? study.spacingMode()
        : study.mode(parity(equilibrium), order == null ? 0 : order,
            wavelength == null ? Double.NaN : wavelength.wavenumber())).orElse(null);
    if (mode == null) {
      print(() -> "null\n", () -> "No such mode grows.\n");
      return;
    }
    Table table = ModeTable.of(mode, model.units());
    if (common.out != null) {
      new FigureFiles(common.out, common.overwrite).mode(mode, equilibrium, table, model.units());
    }
    print(() -> ResultJson.mode(echo(model), mode, table, model.units()),
        () -> ModeText.text(model.title(), model.disk(), mode, equilibrium, model.units(), width()));
  }

  private Parity parity(Equilibrium equilibrium) {
    if (!equilibrium.aboutMidplane()) {
      return Parity.FLOOR;
    }
    String word = parity == null ? "mirror" : parity.toLowerCase(Locale.ROOT);
    if (!word.equals("mirror") && !word.equals("flexing")) {
      throw new ParameterException(spec.commandLine(), "--parity " + parity + ": allowed are mirror and flexing");
    }
    return Parity.valueOf(word.toUpperCase(Locale.ROOT));
  }
}
