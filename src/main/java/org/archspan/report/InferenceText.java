package org.archspan.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import org.archspan.disk.Disk;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.inference.BinnedWeights;
import org.archspan.inference.Inference;
import org.archspan.inference.ReproducingInterval;
import org.archspan.uncertainty.DrawRow;
import org.archspan.uncertainty.UncertainInput;
import org.archspan.units.OutputUnits;

/** What an observed spacing says about an input, in words. */
public final class InferenceText {
  private final Inference inference;
  private final OutputUnits units;

  private InferenceText(Inference inference, OutputUnits units) {
    this.inference = inference;
    this.units = units;
  }

  /**
   * The summary, wrapped to a width in characters.
   *
   * @param disk        the model with the middles of its uncertain inputs
   * @param equilibrium its base state
   */
  public static String text(String title, Disk disk, Equilibrium equilibrium, Inference inference, OutputUnits units,
      int width) {
    return new InferenceText(inference, units)
        .fill(Assumptions.stillBlock(title + " (assumptions at the middles)", disk, equilibrium, units, width), disk).text();
  }

  private TextBlock fill(TextBlock block, Disk disk) {
    double unit = units.centimetresPerLength();
    block.labelled("observed", "spacing " + Numbers.length(unit * inference.observed().wavelength(), units) + " +- "
        + Numbers.length(unit * inference.observed().error(), units));
    for (UncertainInput input : inference.inputs()) {
      block.labelled(input == inference.input() ? "asked for" : "uncertain", input.key() + ", before: "
          + EnsembleText.words(input));
    }
    block.labelled("held", Limits.held(disk)).heading("With all other inputs at their middles").sentence(along());
    block.heading("With all inputs uncertain at once").table(posterior()).gap();
    block.sentence(sentence(inference, units));
    block.sentence(inference.posterior().draws() + " draws from what was known before, weighted with the likelihood"
        + " of the observation, count as " + String.format(Locale.ROOT, "%.0f", inference.posterior().effectiveSize())
        + " (effective number). " + inference.posterior().failed() + " have no answer.");
    block.heading("What limits it");
    warnings(inference).forEach(block::bullet);
    block.bullet("The observed spacing is taken as that of the mode that sets the spacing of the model.");
    Limits.add(block, disk);
    return block;
  }

  private String along() {
    List<DrawRow> scan = inference.scan();
    String range = "from " + value(scan.get(0).values().get(inference.target())) + " to "
        + value(scan.get(scan.size() - 1).values().get(inference.target()));
    long stable = scan.stream().filter(row -> row.outcome() == DrawRow.Outcome.STABLE).count();
    String searched = " (searched at " + scan.size() + " values " + range + "; at " + stable
        + " of them the gas is stable)";
    if (inference.intervals().isEmpty()) {
      return "No value of " + inference.input().key() + " reproduces the spacing within its error" + searched + ".";
    }
    return inference.input().key() + " reproduces the spacing within its error "
        + inference.intervals().stream().map(this::words).collect(Collectors.joining(", and ")) + searched + ".";
  }

  private String words(ReproducingInterval interval) {
    return "from " + (interval.openBelow() ? "the lower end of the range, " : "") + value(interval.low()) + " to "
        + (interval.openAbove() ? "its upper end, " : "") + value(interval.high());
  }

  private String value(double number) {
    String unit = inference.input().unit();
    return Numbers.plain(number) + (unit.isEmpty() ? "" : " " + unit);
  }

  private List<List<String>> posterior() {
    List<List<String>> rows = new ArrayList<>();
    rows.add(List.of("input", "unit", "before: median", "68 per cent", "", "after: median", "68 per cent", ""));
    for (int j = 0; j < inference.inputs().size(); j++) {
      List<String> row = new ArrayList<>(List.of(inference.inputs().get(j).key(), inference.inputs().get(j).unit()));
      for (BinnedWeights weights : List.of(inference.posterior().before(j), inference.posterior().after(j))) {
        for (double share : new double[] {0.5, 0.16, 0.84}) {
          row.add(Numbers.plain(weights.quantile(share)));
        }
      }
      rows.add(row);
    }
    return rows;
  }

  /** One sentence that can be quoted. */
  public static String sentence(Inference inference, OutputUnits units) {
    String spacing = Numbers.length(units.centimetresPerLength() * inference.observed().wavelength(), units);
    if (inference.impossible()) {
      return "The observed spacing of " + spacing + " cannot be reproduced: no draw comes nearer than "
          + (Double.isInfinite(inference.posterior().nearest()) ? "any error, for none has a spacing."
              : Numbers.plain(inference.posterior().nearest()) + " times its error.");
    }
    BinnedWeights after = inference.posterior().after(inference.target());
    InferenceText words = new InferenceText(inference, units);
    if (after.total() == 0.0) {
      return "None of the draws meets the observed spacing of " + spacing + "; with all other inputs at their"
          + " middles it asks for "
          + inference.input().key() + " " + inference.intervals().stream().map(words::words)
              .collect(Collectors.joining(", and ")) + ".";
    }
    return "A spacing of " + spacing + " asks for " + inference.input().key() + " = " + words.value(after.quantile(0.5))
        + ", within 68 per cent from " + words.value(after.quantile(0.16)) + " to " + words.value(after.quantile(0.84))
        + ", within 95 from " + words.value(after.quantile(0.025)) + " to " + words.value(after.quantile(0.975)) + ".";
  }

  /** What a reader of the result must know, one sentence each. */
  static List<String> warnings(Inference inference) {
    List<String> warnings = new ArrayList<>();
    if (inference.impossible()) {
      warnings.add("THE OBSERVATION CANNOT BE REPRODUCED with these inputs: the numbers under `after` mean nothing."
          + " Another instability, another distance, or a wider range of inputs may be needed.");
    } else if (inference.thin()) {
      warnings.add("Few draws lie near the observation: ranges are rough; ask for more --draws.");
    }
    if (inference.intervals().size() > 1) {
      warnings.add("Several intervals reproduce the observation: a median between them describes neither.");
    }
    if (inference.intervals().stream().anyMatch(one -> one.openBelow() || one.openAbove())) {
      warnings.add("An interval reaches the end of the range that was searched: values beyond it may do as well.");
    }
    if (inference.jumps() > 0) {
      warnings.add("The spacing jumps over the observation where another mode takes over, " + inference.jumps()
          + (inference.jumps() == 1 ? " time." : " times."));
    }
    return List.copyOf(warnings);
  }
}
