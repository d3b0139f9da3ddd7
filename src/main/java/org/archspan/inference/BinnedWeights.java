package org.archspan.inference;

/**
 * Weights of numbers in bins of a range, for quantiles and curves of a distribution; numbers beyond the range count in
 * its last bins.
 */
public final class BinnedWeights {
  private static final int BINS = 2000;
  private final double low;
  private final double high;
  private final boolean logarithmic;
  private final double[] bins = new double[BINS];
  private double total;

  /**
   * Empty bins.
   *
   * @param low  lower end of the range, in units of the numbers
   * @param high upper end, in units of the numbers, greater
   * @param logarithmic whether bins have equal ratios; the lower end is then positive
   */
  public BinnedWeights(double low, double high, boolean logarithmic) {
    this.low = low;
    this.high = high;
    this.logarithmic = logarithmic;
  }

  /** Adds a number (in units of the range) with a weight (dimensionless). */
  public void add(double number, double weight) {
    double share = logarithmic ? Math.log(number / low) / Math.log(high / low) : (number - low) / (high - low);
    int bin = (int) Math.floor(BINS * share);
    bins[Math.max(0, Math.min(BINS - 1, bin))] += weight;
    total += weight;
  }

  /** Sum of all weights, dimensionless. */
  public double total() {
    return total;
  }

  /**
   * The number (in units of the range) that a share (dimensionless) of the weight stays below; NaN where there is
   * none.
   */
  public double quantile(double share) {
    double sum = 0.0;
    for (int i = 0; i < BINS && total > 0.0; i++) {
      if (bins[i] > 0.0 && sum + bins[i] >= share * total) {
        return at((i + (share * total - sum) / bins[i]) / BINS);
      }
      sum += bins[i];
    }
    return Double.NaN;
  }

  /** The number (in units of the range) at a share (dimensionless) of the range. */
  public double at(double share) {
    return logarithmic ? low * Math.pow(high / low, share) : low + (high - low) * share;
  }

  /** Whether bins have equal ratios. */
  public boolean logarithmic() {
    return logarithmic;
  }

  /** Share of the weight (dimensionless) in each of so many equal parts of the range. */
  public double[] shares(int parts) {
    double[] shares = new double[parts];
    for (int i = 0; i < BINS; i++) {
      shares[i * parts / BINS] += total > 0.0 ? bins[i] / total : 0.0;
    }
    return shares;
  }

  /** Lower end of the range, in units of the numbers. */
  public double low() {
    return low;
  }

  /** Upper end of the range, in units of the numbers. */
  public double high() {
    return high;
  }
}
