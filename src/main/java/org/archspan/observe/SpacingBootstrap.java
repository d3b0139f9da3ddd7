package org.archspan.observe;

import java.util.Arrays;
import java.util.List;
import java.util.SplittableRandom;
import org.apache.commons.math3.stat.StatUtils;

/**
 * Errors by drawing complexes, or separations, anew from those that were observed, with replacement. Each sample
 * draws the fitted arm from its errors as well: an arm that lies farther out is longer by the same factor.
 *
 * <p>Source: Efron (1979), Ann. Statist. 7, 1.
 */
final class SpacingBootstrap {
  /** Number of samples. */
  static final int SAMPLES = 2000;

  private final SeededDraws draws;
  private final FittedArm arm;
  private final ArmChain chain;

  SpacingBootstrap(SeededDraws draws, FittedArm arm, ArmChain chain) {
    this.draws = draws;
    this.arm = arm;
    this.chain = chain;
  }

  /** The median of lengths along the arm (cm), with the standard deviation of the medians of the samples. */
  MeasuredLength median(double[] lengths) {
    double[] medians = draws.outcomes(SAMPLES, random -> {
      double scale = Math.exp(outward(random));
      double[] sample = new double[lengths.length];
      for (int i = 0; i < sample.length; i++) {
        sample[i] = scale * lengths[random.nextInt(lengths.length)];
      }
      return new double[] {ArmChain.median(sample)};
    }).stream().mapToDouble(outcome -> outcome[0]).toArray();
    return new MeasuredLength(ArmChain.median(lengths), Math.sqrt(StatUtils.variance(medians)));
  }

  /**
   * The peak of the periodogram of the arc positions. Its error is the scatter of those samples whose highest peak
   * lies within the resolution, 1/length, of the observed one; how many do is a result of its own.
   */
  PeriodogramPeak peak(RayleighPeriodogram grid, List<PlanePosition> positions) {
    double[] observed = chain.arcPositions();
    double[] ones = new double[observed.length];
    Arrays.fill(ones, 1.0);
    double frequency = grid.peakFrequency(observed, ones);
    List<double[]> outcomes = draws.outcomes(SAMPLES, random -> new double[] {
        grid.peakFrequency(redrawn(positions, random), multiplicities(observed.length, random))});
    double[] wavelengths = outcomes.stream().mapToDouble(outcome -> outcome[0])
        .filter(each -> Math.abs(each - frequency) <= 1.0 / chain.length()).map(each -> 1.0 / each).toArray();
    MeasuredLength wavelength = new MeasuredLength(1.0 / frequency, Math.sqrt(StatUtils.variance(wavelengths)));
    return new PeriodogramPeak(grid, grid.powers(observed, ones), wavelength,
        RayleighPeriodogram.power(observed, ones, frequency), (double) wavelengths.length / SAMPLES);
  }

  /** Error of ln r of the arm in the middle of its complexes, drawn. */
  private double outward(SplittableRandom random) {
    return arm.width() / Math.sqrt(chain.complexes().size()) / Math.cos(arm.spiral().pitchAngle())
        * random.nextGaussian();
  }

  /** Arc positions (cm) of the complexes on an arm that is turned about their middle and shifted. */
  private double[] redrawn(List<PlanePosition> positions, SplittableRandom random) {
    double middle = chain.complexes().stream().mapToDouble(ComplexOnArm::azimuth).average().orElseThrow();
    double drawn = Math.abs(arm.spiral().pitchAngle()) + arm.pitchError() * random.nextGaussian();
    double pitch = Math.copySign(Math.max(0.5 * ArmSearch.TIGHTEST, drawn), arm.spiral().pitchAngle());
    LogarithmicSpiral spiral = arm.spiral().redrawn(pitch, middle, outward(random));
    return chain.complexes().stream().mapToDouble(each -> {
      double logRadius = Math.log(positions.get(each.index()).radius() / spiral.referenceRadius());
      return spiral.footRadius(logRadius, each.azimuth()) / Math.abs(Math.sin(pitch));
    }).toArray();
  }

  private static double[] multiplicities(int size, SplittableRandom random) {
    double[] times = new double[size];
    for (int i = 0; i < size; i++) {
      times[random.nextInt(size)]++;
    }
    return times;
  }
}
