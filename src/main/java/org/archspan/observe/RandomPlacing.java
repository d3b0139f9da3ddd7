package org.archspan.observe;

import java.util.Arrays;
import java.util.List;
import java.util.SplittableRandom;
import org.apache.commons.math3.stat.StatUtils;

/**
 * What complexes placed at random along the same arm would show. The first and the last stay where they are, for they
 * define the length, and the others are uniform between: given its extremes, that is how a uniform sample is
 * distributed. Each trial is searched over the same wavelengths as the observation, so the probability counts all
 * places where a peak might have been.
 *
 * @param peak    probability that the highest peak of chance reaches the observed one
 * @param regular probability that the median distance to the nearest neighbour reaches the observed one
 * @param highest the highest powers of the trials, dimensionless
 */
public record RandomPlacing(ChanceProbability peak, ChanceProbability regular, double[] highest) {
  /**
   * Tries so often with as many complexes (positions ascending from 0, cm) on the same arm. O(trials x grid x
   * complexes).
   */
  static RandomPlacing of(RayleighPeriodogram grid, double[] positions, int trials, SeededDraws draws) {
    double[] ones = new double[positions.length];
    Arrays.fill(ones, 1.0);
    double observedPower = StatUtils.max(grid.powers(positions, ones));
    double observedNearest = ArmChain.median(ArmChain.nearestDistances(positions));
    List<double[]> outcomes = draws.outcomes(trials, random -> {
      double[] placed = placed(positions.length, positions[positions.length - 1], random);
      return new double[] {StatUtils.max(grid.powers(placed, ones)),
          ArmChain.median(ArmChain.nearestDistances(placed))};
    });
    return new RandomPlacing(
        new ChanceProbability((int) outcomes.stream().filter(each -> each[0] >= observedPower).count(), trials),
        new ChanceProbability((int) outcomes.stream().filter(each -> each[1] >= observedNearest).count(), trials),
        outcomes.stream().mapToDouble(each -> each[0]).toArray());
  }

  private static double[] placed(int size, double length, SplittableRandom random) {
    double[] placed = new double[size];
    for (int i = 1; i < size - 1; i++) {
      placed[i] = length * random.nextDouble();
    }
    placed[size - 1] = length;
    Arrays.sort(placed);
    return placed;
  }

  /**
   * The power that chance exceeds somewhere in the searched range with a probability (dimensionless), dimensionless.
   */
  public double level(double probability) {
    return StatUtils.percentile(highest, 100.0 * (1.0 - probability));
  }
}
