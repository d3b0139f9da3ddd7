package org.archspan.table;

import java.util.List;
import java.util.function.Function;
import java.util.stream.IntStream;
import org.archspan.inference.BinnedWeights;
import org.archspan.inference.Inference;
import org.archspan.inference.ReproducingInterval;
import org.archspan.uncertainty.UncertainInput;
import org.archspan.units.OutputUnits;

/** What an observed spacing says about the inputs, as tables. */
public final class InferenceTable {
  private InferenceTable() {
  }

  /** The answers along the range of the input, all others at their middles. */
  public static Table relation(Inference inference, OutputUnits units, boolean armWidth) {
    return new DrawTable("spacing against " + inference.input().key(), inference.inputs(), units, armWidth)
        .of(inference.scan());
  }

  /** The intervals that reproduce the observation. */
  public static Table intervals(Inference inference) {
    List<ReproducingInterval> intervals = inference.intervals();
    String unit = inference.input().unit();
    return new Table("values of " + inference.input().key() + " that reproduce the spacing within its error", List.of(
        Column.of("low", unit, "lower end", intervals.stream().mapToDouble(ReproducingInterval::low).toArray()),
        Column.of("high", unit, "upper end", intervals.stream().mapToDouble(ReproducingInterval::high).toArray()),
        words("open_below", "whether values below the range may do so too", intervals, one -> one.openBelow()),
        words("open_above", "whether values above it may", intervals, one -> one.openAbove())));
  }

  private static Column words(String name, String description, List<ReproducingInterval> intervals,
      Function<ReproducingInterval, Boolean> value) {
    return Column.of(name, description, intervals.stream().map(one -> value.apply(one) ? "yes" : "no").toList());
  }

  /** Median and 68 per cent of each input before and after, one row each. */
  public static Table posterior(Inference inference) {
    List<UncertainInput> inputs = inference.inputs();
    return new Table("inputs before and after the observation", List.of(
        Column.of("input", "key of the model file", inputs.stream().map(UncertainInput::key).toList()),
        Column.of("unit", "of the numbers in this row", inputs.stream().map(UncertainInput::unit).toList()),
        column("before_median", inference, j -> inference.posterior().before(j), 0.5),
        column("before_low_68", inference, j -> inference.posterior().before(j), 0.16),
        column("before_high_68", inference, j -> inference.posterior().before(j), 0.84),
        column("after_median", inference, j -> inference.posterior().after(j), 0.5),
        column("after_low_68", inference, j -> inference.posterior().after(j), 0.16),
        column("after_high_68", inference, j -> inference.posterior().after(j), 0.84),
        column("after_low_95", inference, j -> inference.posterior().after(j), 0.025),
        column("after_high_95", inference, j -> inference.posterior().after(j), 0.975)));
  }

  private static Column column(String name, Inference inference, Function<Integer, BinnedWeights> weights,
      double share) {
    return Column.of(name, "", "so that a share of " + share + " lies below",
        IntStream.range(0, inference.inputs().size())
        .mapToDouble(j -> weights.apply(j).quantile(share)).toArray());
  }
}
