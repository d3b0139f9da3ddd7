package org.archspan.report;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.StringJoiner;
import org.archspan.comparison.ComparedCase;
import org.archspan.comparison.Comparison;
import org.archspan.comparison.GasAmount;
import org.archspan.comparison.VariedInput;
import org.archspan.disk.Disk;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.spacing.BranchPeak;
import org.archspan.spacing.CloudComplex;
import org.archspan.spacing.HeldBy;
import org.archspan.spacing.SpacingResult;
import org.archspan.units.OutputUnits;

/** The model under several assumptions, in words. */
public final class ComparisonText {
  private static final int MOST_ROWS = 60;

  private final Comparison comparison;
  private final GasAmount amount;
  private final OutputUnits units;

  private ComparisonText(Comparison comparison, GasAmount amount, OutputUnits units) {
    this.comparison = comparison;
    this.amount = amount;
    this.units = units;
  }

  /**
   * The summary, wrapped to a width in characters.
   *
   * @param disk        the model as it stands in its file
   * @param equilibrium its base state
   */
  public static String text(String title, Disk disk, Equilibrium equilibrium, Comparison comparison, GasAmount amount,
      OutputUnits units, int width) {
    return new ComparisonText(comparison, amount, units)
        .fill(Assumptions.block(title, disk, equilibrium, units, width), disk).text();
  }

  private TextBlock fill(TextBlock block, Disk disk) {
    for (VariedInput input : comparison.inputs()) {
      block.labelled("varied", input.key() + ": " + values(input));
    }
    block.labelled("held", held(amount, units)).heading("Compared").table(rows());
    long hidden = comparison.cases().size() - (long) MOST_ROWS;
    if (hidden > 0) {
      block.sentence("... and " + hidden + " more rows: --out or --json gives them all.");
    }
    block.gap().sentence(sentence(comparison, units));
    comparison.cases().stream().filter(ComparedCase::failed).limit(MOST_ROWS)
        .forEach(one -> block.bullet("No answer for " + named(one) + ": " + one.reason()));
    block.heading("What limits it");
    boolean elsewhere = comparison.cases().stream().flatMap(one -> one.result().stream())
        .anyMatch(result -> !result.stable() && result.spacing().isEmpty());
    if (elsewhere) {
      block.bullet("Where the last column says no, no mode gathers the disk's own gas: the wavelength is that of the"
          + " fastest growth anywhere.");
    }
    long warned = comparison.cases().stream().flatMap(one -> one.result().stream())
        .filter(result -> !result.warnings().isEmpty()).count();
    if (warned > 0) {
      block.bullet(warned + " of the cases carry warnings of their own: see the column warnings, or `spacing` with"
          + " --set.");
    }
    Limits.add(block, disk);
    return block;
  }

  private static String values(VariedInput input) {
    int count = input.values().size();
    return count <= 6 ? String.join(", ", input.values())
        : count + " values from " + input.values().get(0) + " to " + input.values().get(count - 1);
  }

  /** What is held while the inputs vary. */
  public static String held(GasAmount amount, OutputUnits units) {
    String column = "surface density " + Numbers.plain(units.surfaceDensity(amount.surfaceDensity())) + " "
        + units.surfaceDensity();
    String bottom = "density at the lower end " + Numbers.plain(amount.bottomDensity()) + " g/cm^3";
    return switch (amount.held()) {
      case SURFACE_DENSITY -> column + "; the density at the lower end follows";
      case MIDPLANE_DENSITY -> bottom + "; the surface density follows";
      case BOTH -> "the prescribed stratification, and with it the " + column;
      case NEITHER -> "nothing: the amount of gas is itself varied";
    };
  }

  private List<List<String>> rows() {
    List<List<String>> rows = new ArrayList<>();
    List<String> heading = new ArrayList<>(comparison.inputs().stream().map(VariedInput::key).toList());
    heading.addAll(List.of("wavelength", "growth time", massHeading(), "held by", "gathers"));
    rows.add(heading);
    comparison.cases().stream().limit(MOST_ROWS).forEach(one -> rows.add(row(one)));
    return rows;
  }

  private String massHeading() {
    boolean arm = comparison.cases().stream().flatMap(one -> one.result().stream())
        .flatMap(result -> result.complex().stream()).anyMatch(complex -> complex.mass().isPresent());
    return arm ? "mass" : "mass/width";
  }

  private List<String> row(ComparedCase one) {
    List<String> row = new ArrayList<>(one.values());
    if (one.failed()) {
      row.addAll(List.of("-", "-", "-", "failed", "-"));
    } else if (one.result().get().stable()) {
      row.addAll(List.of("-", "-", "-", "stable", "-"));
    } else {
      SpacingResult result = one.result().get();
      BranchPeak peak = result.spacingPeak().orElseThrow();
      row.addAll(List.of(Numbers.length(peak.wavelength(), peak.wavelengthError(), units),
          Numbers.time(peak.growthTime(), peak.growthError(), units),
          result.complex().map(this::mass).orElse("-"), peak.heldBy().name().toLowerCase(Locale.ROOT),
          result.spacing().isPresent() ? "yes" : "no"));
    }
    return row;
  }

  private String mass(CloudComplex complex) {
    return complex.mass().isPresent() ? Numbers.mass(complex.mass().getAsDouble(), units)
        : Numbers.mass(complex.massPerWidth() * units.centimetresPerLength(), units) + "/" + units.length();
  }

  private static String named(ComparedCase one) {
    return String.join(", ", one.values());
  }

  /** One sentence that can be quoted. */
  public static String sentence(Comparison comparison, OutputUnits units) {
    List<ComparedCase> waves = comparison.cases().stream().filter(one -> one.result()
        .flatMap(SpacingResult::spacingPeak).filter(peak -> peak.wavenumber() > 0.0).isPresent()).toList();
    StringJoiner words = new StringJoiner("; ", "", ".");
    words.add("Of " + comparison.cases().size() + " cases " + waves.size() + " are unstable"
        + count(comparison, SpacingResult::stable, " are stable")
        + count(comparison, result -> result.spacingPeak().filter(p -> p.heldBy() == HeldBy.LID).isPresent(),
            " are held by the lid") + (comparison.failures() > 0 ? ", " + comparison.failures() + " failed" : ""));
    if (!waves.isEmpty()) {
      Comparator<ComparedCase> byWavelength = Comparator.comparingDouble(one -> peak(one).wavelength());
      Comparator<ComparedCase> byTime = Comparator.comparingDouble(one -> peak(one).growthTime());
      ComparedCase shortest = waves.stream().min(byWavelength).orElseThrow();
      ComparedCase longest = waves.stream().max(byWavelength).orElseThrow();
      words.add("the wavelength runs from " + Numbers.length(peak(shortest).wavelength(), units) + " ("
          + named(shortest)
          + ") to " + Numbers.length(peak(longest).wavelength(), units) + " (" + named(longest) + ")");
      words.add("the growth time from " + Numbers.time(peak(waves.stream().min(byTime).orElseThrow()).growthTime(),
          units)
          + " to " + Numbers.time(peak(waves.stream().max(byTime).orElseThrow()).growthTime(), units));
    }
    return words.toString();
  }

  private static BranchPeak peak(ComparedCase one) {
    return one.result().orElseThrow().spacingPeak().orElseThrow();
  }

  private static String count(Comparison comparison, java.util.function.Predicate<SpacingResult> test, String words) {
    long count = comparison.cases().stream().flatMap(one -> one.result().stream()).filter(test).count();
    return count == 0 ? "" : ", " + count + words;
  }
}
