package org.archspan.inference;

import java.util.List;
import org.archspan.uncertainty.DrawRow;
import org.archspan.uncertainty.UncertainInput;

/**
 * What an observed spacing says about an input of the model.
 *
 * @param observed  what was measured
 * @param inputs    all uncertain inputs, the one that is asked for among them
 * @param target    its index
 * @param scan      answers along a range of it, all others at their middles, ascending
 * @param intervals values that reproduce the observation within its error
 * @param jumps     how often the relation jumps over the observation
 * @param posterior the same with all inputs uncertain at once
 */
public record Inference(ObservedSpacing observed, List<UncertainInput> inputs, int target, List<DrawRow> scan,
    List<ReproducingInterval> intervals, int jumps, Posterior posterior) {
  /** Fewer effective draws than this leave the ranges uncertain. */
  private static final double ENOUGH = 100.0;
  /** A nearest draw farther than this, in units of the error, does not reproduce the observation. */
  private static final double FARTHEST = 3.0;

  /** The input that is asked for. */
  public UncertainInput input() {
    return inputs.get(target);
  }

  /** Whether no draw and no value along the range comes near the observation. */
  public boolean impossible() {
    return posterior.nearest() > FARTHEST && intervals.isEmpty();
  }

  /** Whether the posterior rests on few draws. */
  public boolean thin() {
    return posterior.effectiveSize() < ENOUGH;
  }

  /** Answers that failed, along the range and among the draws. */
  public long failures() {
    return posterior.failed() + scan.stream().filter(row -> row.outcome() == DrawRow.Outcome.FAILED).count();
  }
}
