package org.archspan.cli;

import java.io.IOException;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import org.archspan.comparison.Comparison;
import org.archspan.comparison.GasAmount;
import org.archspan.comparison.HeldAmount;
import org.archspan.comparison.VariedInput;
import org.archspan.disk.RefusedModelException;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.EquilibriumBuilder;
import org.archspan.modelfile.Diagnostic;
import org.archspan.modelfile.Model;
import org.archspan.modelfile.ModelReader;
import org.archspan.modelfile.Reading;
import org.archspan.modelfile.UnreadableFileException;
import org.archspan.modelfile.VariedInputReader;
import org.archspan.report.ComparisonFiles;
import org.archspan.report.ComparisonJson;
import org.archspan.report.ComparisonText;
import org.archspan.spacing.SpacingResult;
import picocli.CommandLine.Command;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.TypeConversionException;

/** The same model under several assumptions. */
@Command(name = "compare", mixinStandardHelpOptions = true,
    description = "The same model under several assumptions: wavelength, growth time, mass per complex and what"
        + " holds the mode, for all combinations of the given values. Exit status 4 says that some cases have no"
        + " answer.")
final class CompareCommand extends ModelCommand {
  private static final long MOST_CASES = 100_000;
  private static final Set<String> AMOUNTS = Set.of("gas.midplane-density", "gas.surface-density");

  @Option(names = "--vary", required = true, paramLabel = "KEY=VALUES", converter = Converter.class,
      description = "values of an input: v1,v2,... or from:to:n or log:from:to:n, such as"
          + " field.strength=log:0.1uG:10uG:20; repeatable, all combinations are solved")
  List<VariedInput> varied = new ArrayList<>();

  @Option(names = "--hold", paramLabel = "AMOUNT", defaultValue = "surface-density",
      description = "amount of gas that stays the same: surface-density or midplane-density (default ${DEFAULT-VALUE})")
  String hold;

  private Comparison comparison;

  @Override
  void solve(Model model) throws IOException {
    GasAmount amount = GasAmount.of(model.disk(), held(), common.tolerance);
    Equilibrium equilibrium = EquilibriumBuilder.build(model.disk(), common.tolerance);
    try (Progress progress = new Progress("compare", cases(), common.quiet || common.json)) {
      comparison = Comparison.solve(varied, values -> solved(values, amount), common.threads, progress::step);
    }
    if (common.out != null) {
      ComparisonFiles.write(comparison, model.units(), echo(model),
          ComparisonJson.text(echo(model), comparison, amount, model.units()),
          ComparisonText.text(model.title(), model.disk(), equilibrium, comparison, amount, model.units(), 88),
          common.out, common.overwrite);
    }
    print(() -> ComparisonJson.text(echo(model), comparison, amount, model.units()),
        () -> ComparisonText.text(model.title(), model.disk(), equilibrium, comparison, amount, model.units(),
            width()));
  }

  @Override
  int status() {
    return comparison.failures() == 0 ? ExitStatus.SOLVED : ExitStatus.UNSOLVED;
  }

  private HeldAmount held() {
    if (!Set.of("surface-density", "midplane-density").contains(hold)) {
      throw new ParameterException(spec.commandLine(), "--hold " + hold + ": allowed is surface-density or"
          + " midplane-density");
    }
    Set<String> keys = new HashSet<>();
    for (VariedInput input : varied) {
      if (!keys.add(input.key())) {
        throw new ParameterException(spec.commandLine(), "--vary " + input.key() + " is given twice; give all its"
            + " values at once");
      }
    }
    boolean amountVaried = keys.stream().anyMatch(key -> AMOUNTS.contains(key) || key.endsWith(".midplane-density"));
    return amountVaried ? HeldAmount.NEITHER : hold.equals("surface-density") ? HeldAmount.SURFACE_DENSITY
        : HeldAmount.MIDPLANE_DENSITY;
  }

  private long cases() {
    long cases = 1;
    for (VariedInput input : varied) {
      cases *= input.values().size();
      if (cases > MOST_CASES) {
        throw new ParameterException(spec.commandLine(), "--vary asks for more than " + MOST_CASES
            + " combinations; use `ensemble` for many inputs at once");
      }
    }
    return cases;
  }

  private SpacingResult solved(List<String> values, GasAmount amount) {
    List<String> settings = new ArrayList<>(common.settings);
    for (int i = 0; i < values.size(); i++) {
      settings.add(varied.get(i).key() + "=" + values.get(i));
    }
    try {
      Reading reading = ModelReader.read(common.model, settings, common.tolerance);
      Model model = reading.model().orElseThrow(() -> new RefusedModelException(
          reading.faults().stream().map(Diagnostic::toString).collect(Collectors.joining("; "))));
      return SpacingCommand.solved(amount.in(model.disk()), model);
    } catch (UnreadableFileException fault) {
      throw new RefusedModelException(fault.getMessage());
    }
  }

  /** Reads an input and its values. */
  static final class Converter implements ITypeConverter<VariedInput> {
    @Override
    public VariedInput convert(String text) {
      try {
        return VariedInputReader.read(text);
      } catch (IllegalArgumentException fault) {
        throw new TypeConversionException(fault.getMessage());
      }
    }
  }
}
