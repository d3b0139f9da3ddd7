package org.archspan.modelfile;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.archspan.boundary.TopBoundary;
import org.archspan.disk.RefusedModelException;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.EquilibriumBuilder;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.api.Test;

/** Atmospheres of layers and flux sheets as a file gives them. */
class LayersTest {
  private static Reading read(String... settings) throws IOException {
    return ModelReader.read(ShippedModels.text("solar-flux-sheet"), "model.toml", Path.of("."), List.of(settings), 1e-8);
  }

  private static Equilibrium build(String... settings) throws IOException {
    return EquilibriumBuilder.build(read(settings).model().orElseThrow().disk(), 1e-8);
  }

  /** c^2 = k T/(mu m_u) deep in each layer (k and m_u: CODATA 2022). */
  @ParameterizedTest
  @CsvSource({"0.1, 5800", "1.6, 8000", "4, 1e6"})
  void eachLayerHasItsTemperature(double megametres, double kelvin) throws IOException {
    double expected = 1.380649e-16 * kelvin / (1.3 * 1.66053906892e-24);
    // tanh is 1 to 1e-4 at 5 to 8 half-widths from a blend, and the corona is 170 times as hot
    assertThat(build().at(megametres * 1e8).gasPerMass()).isCloseTo(expected, within(2e-3 * expected));
  }

  @ParameterizedTest
  @CsvSource(delimiter = '|', value = {
      "gas.layer.2.from=2.5Mm | gas.layer.3.from: found \"2.2 Mm\"; layers are listed from below",
      "gas.layer.1.blend=1Mm | gas.layer.1.blend: given for the lowest layer",
      "gas.layer.2.blend=0Mm | gas.layer.2.blend: found",
      "gas.layer.2.dispersion=8km/s | gas.layer.2.dispersion: given beside gas.layer.2.temperature",
      "gas.temperature=5000K | gas.temperature: given beside gas.layer",
      "field.top=0.35Mm | field.top: found \"0.35Mm\"; a flux sheet must be at least two edges",
      "field.plasma-beta=0 | field.plasma-beta: found 0"})
  void saysWhatIsWrong(String setting, String message) throws IOException {
    assertThat(read(setting).faults()).hasSize(1).allSatisfy(
        fault -> assertThat(fault.toString()).contains(message));
  }

  /** Like any of several ways to give one thing, a strength that is laid over the model replaces its plasma beta. */
  @Test
  void aStrengthReplacesThePlasmaBeta() throws IOException {
    assertThat(read("field.strength=100G").faults()).isEmpty();
  }

  @ParameterizedTest
  @CsvSource(delimiter = '|', value = {
      "field.top=7Mm | does not lie in the domain",
      "field.bottom=-0.2Mm | does not lie in the domain",
      "gas.layer.3.from=6Mm | outside the domain",
      "gas.cooling-time=3s | gas.cooling-time needs an isothermal base state",
      "gas.self-gravity=full | = \"off\"",
      "domain.top-boundary=open | an open top needs a uniform atmosphere"})
  void saysWhatCannotBe(String setting, String message) throws IOException {
    String[] settings = setting.contains("open") ? new String[] {setting, "domain.top=2.15Mm"} : new String[] {setting};
    try {
      build(settings);
      throw new AssertionError("accepted " + setting);
    } catch (RefusedModelException refused) {
      assertThat(refused).hasMessageContaining(message);
    }
  }

  /** A corona of one temperature without field is uniform: the top may be open there, and is by default. */
  @Test
  void anOpenTopStandsInAUniformCorona() throws IOException {
    assertThat(build("domain.top-boundary=open").topBoundary()).isEqualTo(TopBoundary.OPEN);
  }

  /** A field that the weight above cannot contain. */
  @Test
  void aFieldThatLeavesNoGasIsRefused() throws IOException {
    String text = ShippedModels.text("solar-flux-sheet").replace("plasma-beta = 1.0", "strength = \"3000 G\"");
    Reading reading = ModelReader.read(text, "model.toml", Path.of("."), List.of(), 1e-8);
    try {
      EquilibriumBuilder.build(reading.model().orElseThrow().disk(), 1e-8);
      throw new AssertionError("accepted 3000 G");
    } catch (RefusedModelException refused) {
      assertThat(refused).hasMessageContaining("leaves no gas pressure").hasMessageContaining("field.strength");
    }
  }
}
