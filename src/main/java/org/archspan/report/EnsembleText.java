package org.archspan.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.archspan.disk.Disk;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.uncertainty.EnsembleSummary;
import org.archspan.uncertainty.LogHistogram;
import org.archspan.uncertainty.SobolIndices;
import org.archspan.uncertainty.UncertainInput;
import org.archspan.uncertainty.Uncertainty;
import org.archspan.units.OutputUnits;

/** What an ensemble says, in words. */
public final class EnsembleText {
  private final EnsembleSummary summary;
  private final OutputUnits units;
  private final boolean width;

  private EnsembleText(EnsembleSummary summary, OutputUnits units, boolean width) {
    this.summary = summary;
    this.units = units;
    this.width = width;
  }

  /**
   * The summary, wrapped to a width in characters.
   *
   * @param disk        the model with the middles of its uncertain inputs
   * @param equilibrium its base state
   * @param armWidth    whether the arm has one, so that masses are whole
   */
  public static String text(String title, Disk disk, Equilibrium equilibrium, EnsembleSummary summary,
      OutputUnits units, boolean armWidth, int columns) {
    return new EnsembleText(summary, units, armWidth)
        .fill(Assumptions.stillBlock(title + " (assumptions at the middles)", disk, equilibrium, units, columns),
        disk).text();
  }

  private TextBlock fill(TextBlock block, Disk disk) {
    for (UncertainInput input : summary.design().inputs()) {
      block.labelled("uncertain", input.key() + ": " + words(input));
    }
    block.labelled("held", Limits.held(disk));
    block.labelled("draws", summary.draws() + " (" + summary.firstDraw() + " to " + summary.lastDraw() + "), seed "
        + summary.design().seed() + "; inputs independent of each other");
    block.heading("Found");
    if (summary.wavelength().total() > 0.0) {
      block.table(ranges()).gap();
    }
    block.sentence(sentence(summary, units)).sentence(shares());
    sensitivities(block);
    summary.reasons().forEach((reason, count) -> block.bullet("No answer for " + count
        + (count == 1 ? " draw: " : " draws, such as: ") + reason));
    block.heading("What limits it");
    block.bullet("Ranges and indices are those of the draws that have a spacing; stable draws have none.");
    if (summary.gathering() < summary.unstable()) {
      block.bullet(percent(summary.unstable() - summary.gathering(), summary.unstable()) + " of the unstable draws"
          + " have no mode that gathers the disk's own gas: their wavelength is that of the fastest growth anywhere.");
    }
    Limits.add(block, disk);
    return block;
  }

  /** A distribution in words, in the unit of the input. */
  static String words(UncertainInput input) {
    Uncertainty of = input.distribution();
    String unit = input.unit().isEmpty() ? "" : " " + input.unit();
    String centre = Numbers.given(of.centre() / input.unitSize());
    String spread = Numbers.given(of.spread() / (of.byFactors() ? 1.0 : input.unitSize()));
    return switch (of.shape()) {
      case NORMAL -> "normal, " + centre + " with standard deviation " + spread + unit;
      case FACTOR -> "log-normal, " + centre + unit + " within a factor of " + spread;
      case RATIO_RANGE -> "uniform in the logarithm from "
          + Numbers.given(of.centre() / of.spread() / input.unitSize()) + " to "
          + Numbers.given(of.centre() * of.spread() / input.unitSize()) + unit;
      case RANGE -> "uniform from " + Numbers.given((of.centre() - of.spread()) / input.unitSize()) + " to "
          + Numbers.given((of.centre() + of.spread()) / input.unitSize()) + unit;
    };
  }

  private List<List<String>> ranges() {
    List<List<String>> rows = new ArrayList<>();
    rows.add(List.of("", "median", "68 per cent", "", "95 per cent", ""));
    rows.add(row("wavelength (" + units.length() + ")", summary.wavelength()));
    rows.add(row("growth time (" + units.time() + ")", summary.growthTime()));
    rows.add(row((width ? "mass (" + units.mass() : "mass per width (" + units.mass() + "/" + units.length()) + ")",
        summary.mass()));
    return rows;
  }

  private static List<String> row(String name, LogHistogram values) {
    List<String> row = new ArrayList<>(List.of(name));
    for (double share : new double[] {0.5, 0.16, 0.84, 0.025, 0.975}) {
      row.add(Numbers.plain(values.quantile(share)));
    }
    return row;
  }

  /** One sentence that can be quoted. */
  public static String sentence(EnsembleSummary summary, OutputUnits units) {
    if (summary.wavelength().total() == 0.0) {
      return "None of " + summary.draws() + " draws has a spacing.";
    }
    LogHistogram wavelength = summary.wavelength();
    LogHistogram time = summary.growthTime();
    double length = units.centimetresPerLength();
    double second = units.secondsPerTime();
    return "The spacing is " + Numbers.length(length * wavelength.quantile(0.5), units) + ", within 68 per cent from "
        + Numbers.length(length * wavelength.quantile(0.16), units) + " to "
        + Numbers.length(length * wavelength.quantile(0.84), units) + "; the growth time "
        + Numbers.time(second * time.quantile(0.5), units) + ", from "
        + Numbers.time(second * time.quantile(0.16), units)
        + " to " + Numbers.time(second * time.quantile(0.84), units) + ".";
  }

  private String shares() {
    return percent(summary.stable(), summary.draws()) + " of the draws are stable, "
        + percent(summary.heldBy("lid"), summary.draws()) + " are held by the lid, "
        + percent(summary.heldBy("halo"), summary.draws()) + " by the atmosphere above, "
        + percent(summary.heldBy("disk"), summary.draws()) + " by the disk; "
        + percent(summary.failed(), summary.draws()) + " have no answer.";
  }

  static String percent(long part, long whole) {
    return String.format(Locale.ROOT, "%.1f per cent", whole == 0 ? 0.0 : 100.0 * part / whole);
  }

  private void sensitivities(TextBlock block) {
    SobolIndices spacing = summary.ofWavelength();
    if (!summary.design().sensitivities() || spacing.groups() < 2) {
      return;
    }
    List<List<String>> rows = new ArrayList<>();
    rows.add(List.of("input", "first", "+-", "total", "+-"));
    List<UncertainInput> inputs = summary.design().inputs();
    int best = 0;
    for (int j = 0; j < inputs.size(); j++) {
      best = spacing.first(j) > spacing.first(best) ? j : best;
      rows.add(List.of(inputs.get(j).key(), digits(spacing.first(j)), digits(spacing.firstError(j)),
          digits(spacing.total(j)), digits(spacing.totalError(j))));
    }
    block.heading("Which input drives the spacing").table(rows).gap();
    block.sentence("Sobol' indices of the logarithm of the wavelength, from " + spacing.groups() + " groups of draws"
        + (spacing.leftOut() == 0 ? "" : " (" + spacing.leftOut() + " left out: a draw without a spacing)")
        + "; first: share of the variance that goes when this input is known; total: share that remains when all"
        + " others are.");
    if (!(spacing.first(best) > 0.0)) {
      block.sentence("None of the uncertain inputs moves the spacing by itself.");
      return;
    }
    block.sentence("A measurement of " + inputs.get(best).key() + " would sharpen the spacing most: "
        + digits(100.0 * Math.max(0.0, spacing.first(best))) + " per cent of the variance.");
  }

  private static String digits(double value) {
    return Double.isNaN(value) ? "-" : String.format(Locale.ROOT, Math.abs(value) > 2.0 ? "%.0f" : "%.3f", value);
  }
}
