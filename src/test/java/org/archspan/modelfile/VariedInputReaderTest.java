package org.archspan.modelfile;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import org.archspan.comparison.VariedInput;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Lists and ranges of values on the command line. */
class VariedInputReaderTest {
  /** text; values; unit. The values of a range are the exact ones, rounded to six digits. */
  @ParameterizedTest
  @CsvSource(delimiter = ';', value = {
      "field.strength=1uG,2uG,4uG; 1uG|2uG|4uG; uG; 1|2|4", "field.strength=1 uG, 2e-6 G; 1 uG|2e-6 G; uG; 1|2",
      "gas.dispersion=4km/s:10km/s:4; 4 km/s|6 km/s|8 km/s|10 km/s; km/s; 4|6|8|10",
      "gas.dispersion=4km/s:1e6cm/s:4; 4 km/s|6 km/s|8 km/s|10 km/s; km/s; 4|6|8|10",
      "field.strength=log:0.1uG:10uG:3; 0.1 uG|1 uG|10 uG; uG; 0.1|1|10",
      "field.pressure-ratio=1:2:11; 1|1.1|1.2|1.3|1.4|1.5|1.6|1.7|1.8|1.9|2; '';"
      + " 1|1.1|1.2|1.3|1.4|1.5|1.6|1.7|1.8|1.9|2", "gravity.strength=2e-9cm/s^2:1e-9cm/s^2:2; 2E-9 cm/s^2|1E-9"
      + " cm/s^2; cm/s^2; 2e-9|1e-9", "field.pressure-ratio=1:1.0000002:3; 1|1.0000001|1.0000002; '';"
      + " 1|1.0000001|1.0000002", "waves.parity=mirror,flexing; mirror|flexing; ''; ''"})
  void readsListsAndRanges(String text, String values, String unit, String numbers) {
    VariedInput input = VariedInputReader.read(text);
    assertThat(input.values()).containsExactly(values.split("\\|"));
    assertThat(input.unit()).isEqualTo(unit);
    List<Double> expected = numbers.isEmpty() ? List.of()
        : List.of(numbers.split("\\|")).stream().map(Double::valueOf).toList();
    // 1e-12: two values are converted from one unit to another, which costs a rounding
    assertThat(input.numbers()).hasSameSizeAs(expected);
    for (int i = 0; i < expected.size(); i++) {
      assertThat(input.numbers().get(i) / expected.get(i) - 1.0).isBetween(-1e-12, 1e-12);
    }
  }

  @Test
  void valuesOfDifferentKindsAreWords() {
    assertThat(VariedInputReader.read("domain.bottom=midplane,100pc").numeric()).isFalse();
  }

  @ParameterizedTest
  @CsvSource(delimiter = ';', value = {"field.strength; KEY=v1", "=3uG; KEY=v1", "field.strength=; KEY=v1",
      "field.strenght=1uG; did you mean field.strength", "field.strength=1uG,,2uG; empty value",
      "field.strength=1uG,1uG; twice", "field.strength=1uG:2uG; from:to:n", "field.strength=1uG:2uG:1; 2 to 10000",
      "field.strength=1uG:2uG:x; 2 to 10000", "field.strength=1uG:1uG:3; must differ",
      "field.strength=log:0uG:1uG:3; greater than 0", "field.strength=1uG:2pc:3; cannot be given in uG",
      "waves.parity=a:b:3; not a number"})
  void refusesWhatIsNeither(String text, String word) {
    assertThatThrownBy(() -> VariedInputReader.read(text)).isInstanceOf(IllegalArgumentException.class)
        .hasMessageContaining(word);
  }
}
