package org.archspan.table;

import java.util.List;
import java.util.function.ToDoubleFunction;
import org.archspan.spacing.Elasticities;
import org.archspan.stability.PeakElasticity;

/** How growth rate and wavelength of the spacing answer each input. */
public final class ElasticityTable {
  private ElasticityTable() {
  }

  /** One row for each input; not-a-number where it cannot be changed to both sides. */
  public static Table of(Elasticities answers) {
    return new Table("elasticities: relative change for each relative change of an input", List.of(
        Column.of("input", "key of the model", answers.inputs().stream().map(Elasticities.Elasticity::key).toList()),
        column(answers, "growth_rate", "d ln(growth rate)/d ln(input)", PeakElasticity::growthRate),
        column(answers, "growth_rate_error", "estimated absolute error", PeakElasticity::growthRateError),
        column(answers, "wavelength", "d ln(wavelength)/d ln(input)", PeakElasticity::wavelength),
        column(answers, "wavelength_error", "estimated absolute error", PeakElasticity::wavelengthError)));
  }

  private static Column column(Elasticities answers, String name, String description,
      ToDoubleFunction<PeakElasticity> value) {
    return Column.of(name, "", description, answers.inputs().stream()
        .mapToDouble(input -> input.value().map(value::applyAsDouble).orElse(Double.NaN)).toArray());
  }
}
