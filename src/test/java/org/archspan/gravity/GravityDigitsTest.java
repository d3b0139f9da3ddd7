package org.archspan.gravity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Map;
import org.archspan.units.Constants;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

/** Accelerations and potentials at every height to rounding; digits by mpmath 1.3, script laws.py beside the table. */
class GravityDigitsTest {
  private static final double G = Constants.GRAVITATIONAL_CONSTANT;
  private static final Map<String, List<GravityLaw>> LAWS = Map.of(
      "tanh", List.of(new TanhGravity(1.0, 1.0),
          new IsothermalSheetGravity(1.0 / (2.0 * Math.PI * G), Math.sqrt(0.5))),
      "disk-and-halo", List.of(new DiskAndHaloGravity(1.0, 1.0, 0.125)),
      "point-mass", List.of(new PointMassGravity(1.0 / G, 1.0)),
      "saturating", List.of(new SaturatingGravity(1.0, 0.25, 1.0, 4.0)));

  @ParameterizedTest
  @CsvFileSource(resources = "laws.csv")
  void everyDigit(String name, double height, double acceleration, double potential) {
    for (GravityLaw law : LAWS.get(name)) {
      // 2e-15: a few roundings; the potential of the saturating law subtracts parts twice its size
      assertThat(law.acceleration(height)).isCloseTo(acceleration, within(2e-15 * acceleration));
      assertThat(law.potential(height)).isCloseTo(potential, within(2e-15 * potential));
    }
  }
}
