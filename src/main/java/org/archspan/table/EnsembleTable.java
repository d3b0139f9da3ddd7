package org.archspan.table;

import java.util.List;
import java.util.function.ToDoubleFunction;
import java.util.stream.IntStream;
import org.archspan.uncertainty.EnsembleSummary;
import org.archspan.uncertainty.LogHistogram;
import org.archspan.uncertainty.SobolIndices;
import org.archspan.uncertainty.UncertainInput;
import org.archspan.units.OutputUnits;

/** What an ensemble says, as tables. */
public final class EnsembleTable {
  private EnsembleTable() {
  }

  /** Median and ranges of wavelength, growth time and mass, one row each. */
  public static Table ranges(EnsembleSummary summary, OutputUnits units, boolean width) {
    List<LogHistogram> rows = List.of(summary.wavelength(), summary.growthTime(), summary.mass());
    return new Table("ranges of the answers", List.of(
        Column.of("quantity", "of the mode that sets the spacing",
            List.of("wavelength", "growth_time", width ? "mass" : "mass_per_width")),
        Column.of("unit", "of the numbers in this row", List.of(units.length(), units.time(),
            units.mass() + (width ? "" : "/" + units.length()))),
        quantile("median", 0.5, rows), quantile("low_68", 0.16, rows), quantile("high_68", 0.84, rows),
        quantile("low_95", 0.025, rows), quantile("high_95", 0.975, rows)));
  }

  private static Column quantile(String name, double share, List<LogHistogram> rows) {
    return Column.of(name, "", "so that a share of " + share + " of the unstable draws lies below",
        rows.stream().mapToDouble(row -> row.quantile(share)).toArray());
  }

  /** Shares of the inputs in the variance of ln(wavelength) and of the growth rate, one row each. */
  public static Table sensitivities(EnsembleSummary summary) {
    List<UncertainInput> inputs = summary.design().inputs();
    SobolIndices spacing = summary.ofWavelength();
    SobolIndices rate = summary.ofGrowthRate();
    return new Table("Sobol' indices of ln(wavelength) and of the growth rate (0 where stable)", List.of(
        Column.of("input", "key of the model file", inputs.stream().map(UncertainInput::key).toList()),
        index("wavelength_first", "first-order index", inputs.size(), spacing::first),
        index("wavelength_first_error", "its standard error", inputs.size(), spacing::firstError),
        index("wavelength_total", "total index", inputs.size(), spacing::total),
        index("wavelength_total_error", "its standard error", inputs.size(), spacing::totalError),
        index("growth_rate_first", "first-order index", inputs.size(), rate::first),
        index("growth_rate_first_error", "its standard error", inputs.size(), rate::firstError),
        index("growth_rate_total", "total index", inputs.size(), rate::total),
        index("growth_rate_total_error", "its standard error", inputs.size(), rate::totalError)));
  }

  private static Column index(String name, String description, int inputs, ToDoubleFunction<Integer> value) {
    return Column.of(name, "", description, IntStream.range(0, inputs).mapToDouble(value::applyAsDouble).toArray());
  }
}
