package org.archspan.modelfile;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;

class CoolingKeyTest {
  private static final Path MODEL = Path.of("models/stellar-sheet.toml");

  @Test
  void aCoolingTimeReachesTheClosure() throws Exception {
    Reading reading = ModelReader.read(MODEL, List.of("gas.cooling-time=2Myr", "gas.adiabatic-index=1.5"), 1e-8);
    double coolingTime = reading.model().orElseThrow().disk().gasClosure().coolingTime();
    // 1e-12: two million Julian years, to rounding
    assertThat(coolingTime).isCloseTo(2e6 * 365.25 * 86400.0, within(1e-12 * coolingTime));
  }

  @Test
  void aSoftGasCannotCool() throws Exception {
    Reading reading = ModelReader.read(MODEL, List.of("gas.cooling-time=2Myr", "gas.adiabatic-index=0.9"), 1e-8);
    assertThat(reading.faults()).hasSize(1);
    assertThat(reading.faults().get(0).toString()).contains("gas.cooling-time", "at least 1");
    assertThat(ModelReader.read(MODEL, List.of("gas.cooling-time=0s"), 1e-8).faults()).hasSize(1);
  }
}
