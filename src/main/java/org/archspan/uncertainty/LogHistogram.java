package org.archspan.uncertainty;

import java.util.Map;
import java.util.TreeMap;

/**
 * Weights of positive numbers in bins of equal ratio, for quantiles of any number of values in little memory:
 * quantiles are right to 0.03 per cent.
 */
public final class LogHistogram {
  /** Bins in an e-folding. */
  private static final double BINS = 4000.0;
  private final TreeMap<Integer, Double> bins = new TreeMap<>();
  private double total;

  /** Adds a positive finite number (any unit) with a weight (dimensionless). */
  public void add(double value, double weight) {
    bins.merge((int) Math.floor(BINS * Math.log(value)), weight, Double::sum);
    total += weight;
  }

  /** Sum of all weights, dimensionless. */
  public double total() {
    return total;
  }

  /**
   * The number that a share of the weight stays below, in the unit of the numbers; NaN where there is none.
   *
   * @param share between 0 and 1, dimensionless
   */
  public double quantile(double share) {
    double wanted = share * total;
    double sum = 0.0;
    for (Map.Entry<Integer, Double> bin : bins.entrySet()) {
      if (sum + bin.getValue() >= wanted && bin.getValue() > 0.0) {
        return Math.exp((bin.getKey() + (wanted - sum) / bin.getValue()) / BINS);
      }
      sum += bin.getValue();
    }
    return bins.isEmpty() ? Double.NaN : Math.exp((bins.lastKey() + 1) / BINS);
  }

  /** Share of the weight between two positive numbers of the same unit, dimensionless. */
  public double share(double low, double high) {
    int from = (int) Math.floor(BINS * Math.log(low));
    int to = (int) Math.floor(BINS * Math.log(high));
    return from >= to ? 0.0 : bins.subMap(from, to).values().stream().mapToDouble(Double::doubleValue).sum() / total;
  }
}
