package org.archspan.modelfile;

import static org.archspan.modelfile.ModelTexts.PLAIN;
import static org.archspan.modelfile.ModelTexts.messages;
import static org.archspan.modelfile.ModelTexts.model;
import static org.archspan.modelfile.ModelTexts.read;
import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.util.Map;
import org.archspan.disk.Gas;
import org.archspan.disk.MagneticField;
import org.archspan.gravity.UniformGravity;
import org.archspan.uncertainty.Uncertainty;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class OverridesTest {
  @ParameterizedTest
  @CsvSource(delimiter = '|', quoteCharacter = '`', value = {
      "gas.dispersion=7km/s | 7e5", "gas.dispersion = 7 km/s | 7e5", "gas.dispersion=\"7 km/s\" | 7e5",
      "gas.dispersion={low=\"6 km/s\", high=\"8 km/s\"} | 7e5"})
  void setsADispersion(String setting, double dispersion) {
    assertThat(((Gas.Isothermal) model(PLAIN, setting).disk().gas()).dispersion()).isEqualTo(dispersion);
  }

  @Test
  void theLastSettingHoldsAndStandsInTheEcho() {
    Model model = model(PLAIN, "gas.dispersion=7km/s", "gas.dispersion=8km/s");
    assertThat(model.inputs()).containsEntry("gas.dispersion", "8km/s");
  }

  @Test
  void choosingOneAlternativeDropsTheOther() {
    Model model = model(PLAIN, "field.strength=3uG", "gas.surface-density=10 Msun/pc^2");
    assertThat(model.disk().field()).isEqualTo(new MagneticField.BottomStrength(3e-6));
    assertThat(((Gas.Isothermal) model.disk().gas()).bottomDensity()).isEmpty();
  }

  /** Uncertainties can be laid over plain values: the value becomes the middle, or gives way to a range. */
  @Test
  void addsAnUncertaintyToAPlainValue() {
    assertThat(model(PLAIN, "gas.dispersion.normal=1km/s").uncertainties().get("gas.dispersion"))
        .isEqualTo(new Uncertainty(Uncertainty.Shape.NORMAL, 6.4e5, 1e5, 0.0, 2.99792458e10));
    assertThat(model(PLAIN, "field.pressure-ratio.factor=2").uncertainties().get("field.pressure-ratio"))
        .isEqualTo(new Uncertainty(Uncertainty.Shape.FACTOR, 1.0, 2.0, 0.0, Double.POSITIVE_INFINITY));
    assertThat(model(PLAIN, "gas.dispersion.low=5km/s", "gas.dispersion.high=9km/s").uncertainties()
        .get("gas.dispersion")).isEqualTo(new Uncertainty(Uncertainty.Shape.RANGE, 7e5, 2e5, 0.0, 2.99792458e10));
    assertThat(model(PLAIN, "gas.dispersion.normal=1km/s", "gas.dispersion=7km/s").uncertainties()).isEmpty();
    assertThat(messages(read(PLAIN, "gas.dispersion.low=5km/s"))).contains("gas.dispersion: found an incomplete");
  }

  @Test
  void aPartOfAnUncertainAlternativeDropsTheOtherOne() {
    Model model = model(PLAIN, "field.strength.value=3uG", "field.strength.normal=1uG");
    assertThat(model.disk().field()).isEqualTo(new MagneticField.BottomStrength(3e-6));
    assertThat(model.inputs()).doesNotContainKey("field.pressure-ratio");
  }

  @Test
  void replacesAWholeTable() {
    assertThat(model(PLAIN, "gravity={law=\"uniform\", strength=\"1e-9 cm/s^2\"}").disk().gravity())
        .containsExactly(new UniformGravity(1e-9));
  }

  /** Every key that a shipped model gives can be set again, array elements included, without changing the model. */
  @Test
  void reachesEveryKeyOfEveryShippedModel() throws IOException {
    for (String name : ShippedModels.names()) {
      String text = ShippedModels.text(name);
      Model model = model(text);
      for (Map.Entry<String, String> input : model.inputs().entrySet()) {
        if (!input.getKey().equals("title")) {
          Model again = model(text, input.getKey() + "=" + input.getValue());
          assertThat(again.disk()).as("%s %s", name, input.getKey()).isEqualTo(model.disk());
          assertThat(again.options()).isEqualTo(model.options());
        }
      }
    }
  }

  @ParameterizedTest
  @CsvSource(delimiter = '|', quoteCharacter = '`', value = {
      "gas.dispersion=7 | --set: gas.dispersion: found 7; a unit is missing: write a string such as \"7 km/s\"",
      "gas.dispersion= | --set: gas.dispersion: \"\" is not a number with a unit",
      "gas.dispersion | --set: gas.dispersion: found no KEY=VALUE; write --set gas.dispersion=7km/s",
      "=7km/s | --set: found no KEY=VALUE",
      "gas.dispersoin=7km/s | --set: gas.dispersoin: unknown key; did you mean gas.dispersion?",
      "gas.component.4.dispersion=7km/s | gas.component.4",
      "gas.dispersion=[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[[ | --set: gas.dispersion: \"[[",
      "gas.dispersion=a]\\n[gas]\\nb=3 | --set: gas.dispersion: ",
      "gravity.2.strength=1e-9 cm/s^2 | --set: gravity.2.strength: ",
      "gravity.1.strength=1e-9 cm/s^2 | --set: gravity.1.strength: ",
      "gas=3 | --set: gas: "})
  void faultsPointToTheSetting(String setting, String message) {
    Reading reading = read(PLAIN, setting.replace("\\n", "\n"));
    assertThat(reading.model()).isEmpty();
    assertThat(messages(reading)).contains(message);
  }
}
