package org.archspan.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.TreeMap;
import java.util.stream.Collectors;
import org.archspan.comparison.VariedInput;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.EquilibriumBuilder;
import org.archspan.inference.Inference;
import org.archspan.inference.IntervalSearch;
import org.archspan.inference.ObservedSpacing;
import org.archspan.inference.Posterior;
import org.archspan.inference.ReproducingInterval;
import org.archspan.modelfile.Diagnostic;
import org.archspan.modelfile.Model;
import org.archspan.modelfile.ModelReader;
import org.archspan.modelfile.Reading;
import org.archspan.report.InferenceFiles;
import org.archspan.report.InferenceJson;
import org.archspan.report.InferenceText;
import org.archspan.report.ObservationFile;
import org.archspan.table.ReadException;
import org.archspan.uncertainty.DrawDesign;
import org.archspan.uncertainty.DrawRow;
import org.archspan.uncertainty.EnsembleRun;
import org.archspan.uncertainty.UncertainInput;
import org.archspan.uncertainty.Uncertainty;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;

/** Which values of an input reproduce an observed spacing. */
@Command(name = "infer", mixinStandardHelpOptions = true,
    description = "Which values of one input reproduce an observed spacing: all intervals with the other inputs at"
        + " their middles, and the posterior with all uncertain inputs drawn at once. Exit status 4 says that some"
        + " cases have no answer.")
final class InferCommand extends ModelCommand {
  @Option(names = "--input", required = true, paramLabel = "KEY=FROM:TO:N", converter = CompareCommand.Converter.class,
      description = "input that is asked for and the range that is searched, such as field.strength=0.5uG:10uG:40;"
          + " with log: in front equally likely in equal ratios before")
  VariedInput input;

  @Option(names = "--spacing", paramLabel = "LENGTH", converter = CrossWavelength.Converter.class,
      description = "observed spacing, such as \"2 kpc\"")
  CrossWavelength spacing;

  @Option(names = "--error", paramLabel = "LENGTH", converter = CrossWavelength.Converter.class,
      description = "its standard deviation, such as \"300 pc\"")
  CrossWavelength error;

  @Option(names = "--observation", paramLabel = "FILE", description = "instead: the JSON document of `observe`")
  Path observation;

  @Option(names = "--draws", paramLabel = "N|FIRST:END", defaultValue = "4096", converter = DrawRange.Converter.class,
      description = "draws for the posterior (default ${DEFAULT-VALUE})")
  DrawRange draws;

  @Option(names = "--seed", paramLabel = "N", defaultValue = "1",
      description = "of the draws (default ${DEFAULT-VALUE})")
  long seed;

  private Inference inference;

  @Override
  void solve(Model given) throws IOException {
    Model ranged = withRange(range());
    boolean known = given.uncertainties().containsKey(input.key());
    Model model = known ? given : ranged;
    ObservedSpacing observed = observed(model);
    List<UncertainInput> inputs = new ArrayList<>(model.uncertain().inputs());
    int target = inputs.stream().map(UncertainInput::key).toList().indexOf(input.key());
    double[] scanned = scanned(ranged, inputs.get(target));
    if (input.logarithmic() && !known) {
      inputs.set(target, inRatios(inputs.get(target)));
    }
    inference = inferred(model, observed, List.copyOf(inputs), target, scanned);
    boolean width = model.arm().width().isPresent();
    Equilibrium equilibrium = EquilibriumBuilder.build(model.disk(), common.tolerance);
    if (common.out != null) {
      InferenceFiles.write(inference, model.units(), width, echo(model),
          InferenceJson.text(echo(model), inference, model.units(), width),
          InferenceText.text(model.title(), model.disk(), equilibrium, inference, model.units(), 88), common.out,
          common.overwrite);
    }
    print(() -> InferenceJson.text(echo(model), inference, model.units(), width),
        () -> InferenceText.text(model.title(), model.disk(), equilibrium, inference, model.units(), width()));
  }

  @Override
  int status() {
    return inference.failures() == 0 ? ExitStatus.SOLVED : ExitStatus.UNSOLVED;
  }

  /** The values to search, ascending, in the unit in which they were given. */
  private double[] range() {
    if (!input.numeric() || input.numbers().size() < 3) {
      throw new ParameterException(spec.commandLine(), "--input " + input.key() + ": a range such as "
          + "field.strength=0.5uG:10uG:40 is needed, with at least 3 values");
    }
    return input.numbers().stream().mapToDouble(Double::doubleValue).sorted().toArray();
  }

  /** The model with the range as what is known of the input, whatever else was known. */
  private Model withRange(double[] range) throws IOException {
    List<String> settings = new ArrayList<>(common.settings);
    settings.add(input.key() + "={ low = " + written(range[0]) + ", high = " + written(range[range.length - 1]) + " }");
    Reading reading = ModelReader.read(common.model, settings, common.tolerance);
    return reading.model().orElseThrow(() -> new ModelFault(
        reading.faults().stream().map(Diagnostic::toString).collect(Collectors.joining(System.lineSeparator()))));
  }

  private String written(double number) {
    return input.unit().isEmpty() ? Double.toString(number) : "\"" + number + " " + input.unit() + "\"";
  }

  private ObservedSpacing observed(Model model) throws ReadException {
    if (observation != null && spacing == null && error == null) {
      return ObservationFile.read(observation, model.units());
    }
    if (observation != null || spacing == null || error == null || Double.isInfinite(spacing.centimetres())
        || Double.isInfinite(error.centimetres())) {
      throw new ParameterException(spec.commandLine(), "give the observed --spacing and its --error, or"
          + " --observation FILE");
    }
    return new ObservedSpacing(model.units().length(spacing.centimetres()), model.units().length(error.centimetres()));
  }

  /**
   * The values to search in the unit of the list of keys: the ends went through the model file, which may convert
   * them.
   */
  private double[] scanned(Model ranged, UncertainInput target) {
    Uncertainty ends = ranged.uncertainties().get(input.key());
    double[] range = range();
    double low = range[0];
    double width = range[range.length - 1] - low;
    return Arrays.stream(range).map(number -> (ends.centre() + ends.spread() * (2.0 * (number - low) / width - 1.0))
        / target.unitSize()).toArray();
  }

  /** The same range, equally likely in equal ratios. */
  private static UncertainInput inRatios(UncertainInput target) {
    Uncertainty range = target.distribution();
    double low = range.centre() - range.spread();
    double high = range.centre() + range.spread();
    return new UncertainInput(target.key(), new Uncertainty(Uncertainty.Shape.RATIO_RANGE, Math.sqrt(low * high),
        Math.sqrt(high / low), range.lowest(), range.highest()), target.unit(), target.unitSize());
  }

  private Inference inferred(Model model, ObservedSpacing observed, List<UncertainInput> inputs, int target,
      double[] scanned) {
    ModelDraws solver = new ModelDraws(model, true);
    TreeMap<Double, DrawRow> scan = new TreeMap<>();
    for (double value : scanned) {
      scan.put(value, at(solver, inputs, target, value));
    }
    IntervalSearch search = new IntervalSearch(value -> at(solver, inputs, target, value), observed);
    List<ReproducingInterval> intervals = search.search(scan);
    Posterior posterior = new Posterior(observed, inputs);
    try (DrawProgress progress = new DrawProgress(draws.end() - draws.first(), common.quiet, err());
        EnsembleRun run = new EnsembleRun(new DrawDesign(inputs, seed, false), new ModelDraws(model, false),
            common.threads)) {
      run.solve(draws.first(), draws.end(), row -> {
        posterior.add(row);
        progress.step();
      });
    }
    return new Inference(observed, inputs, target, List.copyOf(scan.values()), intervals, search.jumps(), posterior);
  }

  /** The answer for one value (in the unit of the list of keys), all other inputs at their middles. */
  private static DrawRow at(ModelDraws solver, List<UncertainInput> inputs, int target, double value) {
    double[] values = inputs.stream().mapToDouble(one -> one.distribution().centre()).toArray();
    values[target] = value * inputs.get(target).unitSize();
    return solver.solve(-1, values);
  }
}
