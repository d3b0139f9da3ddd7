package org.archspan.cli;

import java.io.IOException;
import java.util.OptionalDouble;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.EquilibriumBuilder;
import org.archspan.modelfile.Model;
import org.archspan.report.AmplificationFiles;
import org.archspan.report.AmplificationJson;
import org.archspan.report.AmplificationText;
import org.archspan.shear.Amplification;
import org.archspan.shear.AmplifyOptions;
import org.archspan.shear.AmplifyStudy;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;

/** How far differential rotation lets a wave grow. */
@Command(name = "amplify", mixinStandardHelpOptions = true,
    description = "How far a wave grows while differential rotation winds it up: amplification against time from the best"
        + " start, beside the growth of rigid rotation. The model needs [rotation].")
final class AmplifyCommand extends ModelCommand {
  private static final double MOST_WOUND = 1000.0;

  @Option(names = "--wavelength", paramLabel = "LENGTH", converter = CrossWavelength.Converter.class,
      description = "along the field (default: the one that sets the spacing without rotation)")
  CrossWavelength wavelength;

  @Option(names = "--start", paramLabel = "RATIO", description = "radial over azimuthal wavenumber at the first moment,"
      + " -1000 to 1000, negative for a leading wave (default: the best)")
  Double start;

  @Option(names = "--duration", paramLabel = "TIME", converter = TimeSpan.Converter.class,
      description = "how long the wave is followed (default: one turn of the disk)")
  TimeSpan duration;

  @Option(names = "--amplification-error", paramLabel = "ERROR", defaultValue = "1e-4",
      description = "relative error asked of the amplification, 1e-8 to 1e-1 (default ${DEFAULT-VALUE})")
  double error;

  @Override
  void solve(Model model) throws IOException {
    requireSense();
    Equilibrium equilibrium = EquilibriumBuilder.build(model.disk(), common.tolerance);
    Amplification wave = new AmplifyStudy(model.disk(), model.options(), options()).solve(equilibrium);
    String json = AmplificationJson.text(echo(model), wave, model.units());
    String text = AmplificationText.text(model.title(), model.disk(), equilibrium, wave, model.units(), width());
    if (common.out != null) {
      AmplificationFiles.write(wave, model.units(), json, text, common.out, common.overwrite);
    }
    print(() -> json, () -> text);
  }

  private void requireSense() {
    if (wavelength != null && Double.isInfinite(wavelength.centimetres())) {
      throw new ParameterException(spec.commandLine(), "--wavelength must be finite");
    }
    if (start != null && !(Math.abs(start) <= MOST_WOUND)) {
      throw new ParameterException(spec.commandLine(), "--start " + start + ": allowed is -1000 to 1000");
    }
    if (!(error >= 1e-8 && error <= 0.1)) {
      throw new ParameterException(spec.commandLine(), "--amplification-error " + error + ": allowed is 1e-8 to 1e-1");
    }
  }

  private AmplifyOptions options() {
    return new AmplifyOptions(wavelength == null ? OptionalDouble.empty() : OptionalDouble.of(wavelength.centimetres()),
        start == null ? OptionalDouble.empty() : OptionalDouble.of(start),
        duration == null ? OptionalDouble.empty() : OptionalDouble.of(duration.seconds()), error);
  }
}
