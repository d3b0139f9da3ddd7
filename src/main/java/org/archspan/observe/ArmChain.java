package org.archspan.observe;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import org.apache.commons.math3.stat.StatUtils;

/**
 * The complexes of an arm in their order along it.
 *
 * @param complexes from the inner end outward
 */
public record ArmChain(List<ComplexOnArm> complexes) {
  private static final double MEMBER = 0.5;

  /** The members of an arm among complexes: those that belong to it more probably than not. */
  static ArmChain of(FittedArm arm, List<PlanePosition> positions) {
    LogarithmicSpiral spiral = arm.spiral();
    List<Integer> members = new ArrayList<>();
    double[] foot = new double[positions.size()];
    double[] azimuth = new double[positions.size()];
    double[] across = new double[positions.size()];
    for (int i = 0; i < positions.size(); i++) {
      PlanePosition position = positions.get(i);
      double logRadius = Math.log(position.radius() / spiral.referenceRadius());
      azimuth[i] = spiral.unwrapped(logRadius, position.azimuth());
      foot[i] = spiral.footRadius(logRadius, azimuth[i]);
      across[i] = spiral.across(logRadius, azimuth[i]) * position.radius();
      if (arm.membership()[i] >= MEMBER) {
        members.add(i);
      }
    }
    members.sort(Comparator.comparingDouble(i -> foot[i]));
    return new ArmChain(members.stream().map(i -> new ComplexOnArm(i, azimuth[i],
        spiral.arcLength(foot[members.get(0)], foot[i]), across[i])).toList());
  }

  /** Positions along the arm, ascending from 0, cm. */
  public double[] arcPositions() {
    return complexes.stream().mapToDouble(ComplexOnArm::arcPosition).toArray();
  }

  /** Distance from the first complex to the last, cm. */
  public double length() {
    return complexes.get(complexes.size() - 1).arcPosition();
  }

  /** Distances of neighbours along the arm, one fewer than there are complexes, cm. */
  public double[] separations() {
    return separations(arcPositions());
  }

  /** Distance of each complex from the nearest other one along the arm, cm. */
  public double[] nearestDistances() {
    return nearestDistances(arcPositions());
  }

  /** Distances of neighbours among ascending positions, in units of the positions. */
  static double[] separations(double[] ascending) {
    double[] separations = new double[ascending.length - 1];
    Arrays.setAll(separations, i -> ascending[i + 1] - ascending[i]);
    return separations;
  }

  /** Distance of each ascending position from the nearest other, in units of the positions. */
  static double[] nearestDistances(double[] ascending) {
    double[] gaps = separations(ascending);
    double[] nearest = new double[ascending.length];
    Arrays.setAll(nearest, i -> i == 0 ? gaps[0] : i == gaps.length ? gaps[i - 1] : Math.min(gaps[i - 1], gaps[i]));
    return nearest;
  }

  /** Median, in units of the values. */
  static double median(double[] values) {
    return StatUtils.percentile(values, 50.0);
  }
}
