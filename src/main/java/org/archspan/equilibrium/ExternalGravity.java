package org.archspan.equilibrium;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.DoubleStream;
import org.archspan.gravity.GravityLaw;

/** The sum of several gravity laws. */
final class ExternalGravity {
  private final GravityLaw[] laws;

  ExternalGravity(List<GravityLaw> laws) {
    this.laws = laws.toArray(GravityLaw[]::new);
  }

  /** The same laws and one more. */
  ExternalGravity with(GravityLaw law) {
    List<GravityLaw> more = new ArrayList<>(List.of(laws));
    more.add(law);
    return new ExternalGravity(more);
  }

  /** Downward acceleration, cm s^-2. */
  double acceleration(double height) {
    double sum = 0.0;
    for (GravityLaw law : laws) {
      sum += law.acceleration(height);
    }
    return sum;
  }

  /** Potential, cm^2 s^-2, zero at the midplane. */
  double potential(double height) {
    double sum = 0.0;
    for (GravityLaw law : laws) {
      sum += law.potential(height);
    }
    return sum;
  }

  double[] landmarks() {
    return sorted(Arrays.stream(laws).flatMapToDouble(law -> Arrays.stream(law.landmarks())));
  }

  double[] kinks() {
    return sorted(Arrays.stream(laws).flatMapToDouble(law -> Arrays.stream(law.kinks())));
  }

  /** Greatest height for which all laws are defined, cm. */
  double greatestHeight() {
    return Arrays.stream(laws).mapToDouble(GravityLaw::greatestHeight).min().orElse(Double.POSITIVE_INFINITY);
  }

  private static double[] sorted(DoubleStream heights) {
    return heights.sorted().distinct().toArray();
  }
}
