package org.archspan.observe;

import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;

/**
 * Rayleigh power of points on a line, {@code P(f) = |sum w exp(2 pi i f s)|^2 / sum w}, over equidistant spatial
 * frequencies. At one frequency and for random points of unit weight it exceeds P by chance with probability {@code
 * exp(-P)}, nearly; n points at exact multiples of 1/f give n.
 *
 * <p>Source: Rayleigh (1880), Phil. Mag. 10, 73; Mardia &amp; Jupp (2000), Directional Statistics, section 6.3.
 *
 * @param lowest frequency, positive, cm^-1
 * @param step   between frequencies, cm^-1
 * @param size   number of frequencies
 */
public record RayleighPeriodogram(double lowest, double step, int size) {
  private static final int PER_RESOLUTION = 10;

  /**
   * A grid over a range of wavelengths, ten frequencies to the resolution 1/length.
   *
   * @param shortest wavelength, cm
   * @param longest  wavelength, above the shortest, cm
   * @param length   of the arm, cm
   */
  static RayleighPeriodogram over(double shortest, double longest, double length) {
    double step = 1.0 / (PER_RESOLUTION * length);
    return new RayleighPeriodogram(1.0 / longest, step, 1 + (int) Math.ceil((1.0 / shortest - 1.0 / longest) / step));
  }

  /** Frequency of a grid point, cm^-1. */
  public double frequency(int index) {
    return lowest + index * step;
  }

  /** Power at a frequency (cm^-1) of positions (cm) with weights, dimensionless. */
  static double power(double[] positions, double[] weights, double frequency) {
    double cosine = 0.0;
    double sine = 0.0;
    double sum = 0.0;
    for (int j = 0; j < positions.length; j++) {
      double phase = 2.0 * Math.PI * frequency * positions[j];
      cosine += weights[j] * Math.cos(phase);
      sine += weights[j] * Math.sin(phase);
      sum += weights[j];
    }
    return (cosine * cosine + sine * sine) / sum;
  }

  /**
   * Power at all frequencies, dimensionless, of positions (cm) with weights. Phases advance by rotation: O(size x
   * points).
   */
  public double[] powers(double[] positions, double[] weights) {
    double[] cosine = new double[size];
    double[] sine = new double[size];
    double sum = 0.0;
    for (int j = 0; j < positions.length; j++) {
      double start = 2.0 * Math.PI * lowest * positions[j];
      double turn = 2.0 * Math.PI * step * positions[j];
      double c = weights[j] * Math.cos(start);
      double s = weights[j] * Math.sin(start);
      double turnCosine = Math.cos(turn);
      double turnSine = Math.sin(turn);
      for (int k = 0; k < size; k++) {
        cosine[k] += c;
        sine[k] += s;
        double next = c * turnCosine - s * turnSine;
        s = c * turnSine + s * turnCosine;
        c = next;
      }
      sum += weights[j];
    }
    for (int k = 0; k < size; k++) {
      cosine[k] = (cosine[k] * cosine[k] + sine[k] * sine[k]) / sum;
    }
    return cosine;
  }

  /** The frequency of greatest power near the greatest of the grid (cm^-1), for positions (cm) with weights. */
  double peakFrequency(double[] positions, double[] weights) {
    double[] powers = powers(positions, weights);
    double middle = frequency(greatest(powers));
    double from = Math.max(lowest, middle - step);
    double to = Math.min(frequency(size - 1), middle + step);
    return new BrentOptimizer(1e-10, 1e-14 * middle).optimize(new MaxEval(200), GoalType.MAXIMIZE,
        new UnivariateObjectiveFunction(frequency -> power(positions, weights, frequency)),
        new SearchInterval(from, to, middle)).getPoint();
  }

  /** Index of the greatest. */
  static int greatest(double[] powers) {
    int best = 0;
    for (int k = 1; k < powers.length; k++) {
      best = powers[k] > powers[best] ? k : best;
    }
    return best;
  }
}
