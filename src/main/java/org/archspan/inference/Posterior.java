package org.archspan.inference;

import java.util.ArrayList;
import java.util.List;
import org.archspan.uncertainty.DrawRow;
import org.archspan.uncertainty.UncertainInput;

/**
 * What an observed spacing says about the inputs: draws from what was known before, weighted with the likelihood of
 * the observation (importance sampling with the prior as proposal). A draw without a spacing has none.
 */
public final class Posterior {
  /** Share of a prior that the range of its bins leaves out at either end. */
  private static final double LEFT_OUT = 1e-5;
  private final ObservedSpacing observed;
  private final List<BinnedWeights> before = new ArrayList<>();
  private final List<BinnedWeights> after = new ArrayList<>();
  private long draws;
  private long failed;
  private double sum;
  private double squares;
  private double nearest = Double.POSITIVE_INFINITY;

  /**
   * A posterior without draws.
   *
   * @param inputs all that are uncertain
   */
  public Posterior(ObservedSpacing observed, List<UncertainInput> inputs) {
    this.observed = observed;
    for (UncertainInput input : inputs) {
      double low = input.distribution().quantile(LEFT_OUT) / input.unitSize();
      double high = input.distribution().quantile(1.0 - LEFT_OUT) / input.unitSize();
      before.add(new BinnedWeights(low, high, input.distribution().byFactors()));
      after.add(new BinnedWeights(low, high, input.distribution().byFactors()));
    }
  }

  /** Adds a draw. */
  public void add(DrawRow row) {
    draws++;
    failed += row.outcome() == DrawRow.Outcome.FAILED ? 1 : 0;
    double distance = observed.distance(row);
    nearest = Math.min(nearest, distance);
    double weight = Math.exp(-0.5 * distance * distance);
    sum += weight;
    squares += weight * weight;
    for (int j = 0; j < after.size(); j++) {
      before.get(j).add(row.values().get(j), 1.0);
      after.get(j).add(row.values().get(j), weight);
    }
  }

  /** How many draws there were. */
  public long draws() {
    return draws;
  }

  /** How many had no answer. */
  public long failed() {
    return failed;
  }

  /** What was known of an input before. */
  public BinnedWeights before(int input) {
    return before.get(input);
  }

  /** What is known of it after. */
  public BinnedWeights after(int input) {
    return after.get(input);
  }

  /**
   * Effective number of draws (Kish 1965): square of the sum of the weights over the sum of their squares;
   * dimensionless.
   */
  public double effectiveSize() {
    return squares > 0.0 ? sum * sum / squares : 0.0;
  }

  /** Mean likelihood over its greatest possible value, dimensionless: how well the prior foresaw the observation. */
  public double foreseen() {
    return draws > 0 ? sum / draws : 0.0;
  }

  /** Distance of the nearest draw from the observation, in units of its error. */
  public double nearest() {
    return nearest;
  }
}
