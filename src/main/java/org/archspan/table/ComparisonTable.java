package org.archspan.table;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import org.archspan.comparison.ComparedCase;
import org.archspan.comparison.Comparison;
import org.archspan.comparison.VariedInput;
import org.archspan.spacing.BranchPeak;
import org.archspan.spacing.CloudComplex;
import org.archspan.spacing.SpacingResult;
import org.archspan.units.OutputUnits;

/** The answers under several assumptions, one row for each combination of values. */
public final class ComparisonTable {
  private final Comparison comparison;
  private final OutputUnits units;

  private ComparisonTable(Comparison comparison, OutputUnits units) {
    this.comparison = comparison;
    this.units = units;
  }

  /** The table; a case without an answer has no numbers and says why. */
  public static Table of(Comparison comparison, OutputUnits units) {
    return new ComparisonTable(comparison, units).table();
  }

  private Table table() {
    List<Column> columns = new ArrayList<>();
    for (int i = 0; i < comparison.inputs().size(); i++) {
      columns.add(input(i));
    }
    columns.add(words("outcome", "unstable, stable, or failed", result -> result.stable() ? "stable" : "unstable",
        "failed"));
    columns.add(peak("wavelength", units.length(), "of the mode that sets the spacing",
        p -> units.length(p.wavelength())));
    columns.add(peak("wavelength_error", "", "estimated relative error", BranchPeak::wavelengthError));
    columns.add(peak("growth_time", units.time(), "one e-folding", p -> units.time(p.growthTime())));
    columns.add(peak("growth_error", "", "estimated relative error", BranchPeak::growthError));
    columns.add(mass());
    columns.add(ofPeak("held_by", "what confines the mode: disk, lid or halo", p -> word(p.heldBy())));
    columns.add(ofPeak("parity", "symmetry about the midplane", p -> word(p.parity())));
    columns.add(words("gathers", "whether the mode gathers the disk's own gas",
        result -> result.spacing().isPresent() ? "yes" : "no", ""));
    base(columns);
    columns.add(Column.of("warnings", "what limits the answer, in words", comparison.cases().stream()
        .map(one -> one.result().map(result -> String.join(" ", result.warnings())).orElse("")).toList()));
    columns.add(Column.of("reason", "why there is no answer",
        comparison.cases().stream().map(ComparedCase::reason).toList()));
    return new Table("the model under several assumptions", columns);
  }

  private Column input(int index) {
    VariedInput input = comparison.inputs().get(index);
    String name = input.key().replace('.', '_').replace('-', '_');
    List<String> values = comparison.cases().stream().map(one -> one.values().get(index)).toList();
    return input.numeric() ? Column.of(name, input.unit(), "varied", values.stream()
        .mapToDouble(value -> input.numbers().get(input.values().indexOf(value))).toArray())
        : Column.of(name, "varied", values);
  }

  private void base(List<Column> columns) {
    columns.add(number("surface_density", units.surfaceDensity(), "column of gas",
        result -> units.surfaceDensity(result.equilibrium().surfaceDensity())));
    columns.add(number("bottom_density", "g/cm^3", "at the midplane or on the floor",
        result -> result.equilibrium().at(result.equilibrium().bottom()).density()));
    columns.add(number("bottom_field", units.field(), "field strength there",
        result -> units.field(result.equilibrium().at(result.equilibrium().bottom()).fieldStrength())));
    columns.add(number("scale_height", units.length(), "of the base state",
        result -> units.length(result.equilibrium().scaleHeight())));
  }

  private Column mass() {
    boolean arm = comparison.cases().stream().flatMap(one -> one.result().stream())
        .anyMatch(result -> result.complex().filter(complex -> complex.mass().isPresent()).isPresent());
    return number(arm ? "mass" : "mass_per_width", units.mass() + (arm ? "" : "/" + units.length()),
        "gas that one wavelength holds", result -> result.complex().map(this::mass).orElse(Double.NaN));
  }

  private double mass(CloudComplex complex) {
    return complex.mass().isPresent() ? units.mass(complex.mass().getAsDouble())
        : units.mass(complex.massPerWidth()) * units.centimetresPerLength();
  }

  private Column number(String name, String unit, String description, ToDoubleFunction<SpacingResult> value) {
    return Column.of(name, unit, description, comparison.cases().stream()
        .mapToDouble(one -> one.result().map(value::applyAsDouble).orElse(Double.NaN)).toArray());
  }

  private Column peak(String name, String unit, String description, ToDoubleFunction<BranchPeak> value) {
    return number(name, unit, description,
        result -> result.spacingPeak().map(value::applyAsDouble).orElse(Double.NaN));
  }

  private Column words(String name, String description, Function<SpacingResult, String> value, String failed) {
    return Column.of(name, description,
        comparison.cases().stream().map(one -> one.result().map(value).orElse(failed)).toList());
  }

  private Column ofPeak(String name, String description, Function<BranchPeak, String> value) {
    return words(name, description, result -> {
      Optional<BranchPeak> peak = result.spacingPeak();
      return peak.map(value).orElse("");
    }, "");
  }

  private static String word(Enum<?> value) {
    return value.name().toLowerCase(Locale.ROOT);
  }
}
