package org.archspan.modelfile;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import java.util.List;
import org.archspan.disk.Rotation;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class RotationKeyTest {
  private static final Path MODEL = Path.of("models/stellar-sheet.toml");

  @Test
  void rotationReachesTheDiskInCgs() throws Exception {
    Reading reading = ModelReader.read(MODEL, List.of("rotation.angular-speed=10km/s/kpc"), 1e-8);
    Rotation rotation = reading.model().orElseThrow().disk().rotation().orElseThrow();
    // 10 km/s over 3.0856775814913673e21 cm (IAU 2015 Resolution B2); 1e-12: rounding
    double expected = 1e6 / 3.0856775814913673e21;
    assertThat(rotation.angularSpeed()).isCloseTo(expected, within(1e-12 * expected));
    assertThat(rotation.kappa()).isCloseTo(3.7 * expected, within(1e-11 * expected));
  }

  /** Orbits whose epicyclic frequency is not real leave the disk: one message names key and what is allowed. */
  @ParameterizedTest
  @CsvSource({"rotation.epicyclic-frequency=-37km/s/kpc, greater than 0",
      "rotation.epicyclic-frequency=0km/s/kpc, greater than 0", "rotation.angular-speed=-27km/s/kpc, 0 or greater"})
  void rotationThatCannotBeIsRefused(String setting, String allowed) throws Exception {
    Reading reading = ModelReader.read(MODEL, List.of(setting), 1e-8);
    assertThat(reading.faults()).hasSize(1);
    assertThat(reading.faults().get(0).toString()).contains(setting.substring(0, setting.indexOf('=')), allowed);
  }
}
