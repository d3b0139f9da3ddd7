package org.archspan.modelfile;

import static org.archspan.modelfile.ModelTexts.PLAIN;
import static org.archspan.modelfile.ModelTexts.messages;
import static org.archspan.modelfile.ModelTexts.model;
import static org.archspan.modelfile.ModelTexts.read;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.archspan.disk.Gas;
import org.archspan.disk.GasStratum;
import org.archspan.disk.Height;
import org.archspan.disk.MagneticField;
import org.archspan.gravity.LinearGravity;
import org.archspan.gravity.UniformGravity;
import org.archspan.uncertainty.Uncertainty;
import org.archspan.units.Constants;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Several components, prescribed strata, several gravity laws, and uncertainties. */
class GasAndGravityTest {
  private static final String GRAVITY = """
      [[gravity]]
      law = "uniform"
      strength = "1e-9 cm/s^2"
      [[gravity]]
      law = "linear"
      gradient = "1.7e-9 cm/s^2/kpc"
      """;
  private static final String COMPONENTS = """
      [[gas.component]]
      name = "cold"
      dispersion = "4 km/s"
      midplane-density = "0.6 cm^-3"
      [[gas.component]]
      name = "warm"
      dispersion = "9 km/s"
      midplane-density = "0.3 cm^-3"
      """ + GRAVITY;
  private static final String STRATA = """
      [[gas.stratum]]
      shape = "gaussian"
      midplane-density = "0.6 cm^-3"
      height = "70 pc"
      [[gas.stratum]]
      shape = "sech2"
      midplane-density = "0.1 cm^-3"
      height = "400 pc"
      [field]
      shape = "balance"
      strength = "5 uG"
      """ + GRAVITY;

  @Test
  void componentsAndSeveralLaws() {
    Model model = model(COMPONENTS);
    Gas.Components gas = (Gas.Components) model.disk().gas();
    assertThat(gas.components()).extracting("name").containsExactly("cold", "warm");
    assertThat(gas.components()).extracting("dispersion").containsExactly(4e5, 9e5);
    assertThat(model.disk().gravity().get(0)).isEqualTo(new UniformGravity(1e-9));
    assertThat(model.disk().gravity().get(1)).isInstanceOf(LinearGravity.class);
    assertThat(model.disk().field()).isEqualTo(new MagneticField.ConstantRatio(0.0));
  }

  @Test
  void strataWhoseFieldIsLeftOverByTheBalance() {
    Gas.Stratified gas = (Gas.Stratified) model(STRATA).disk().gas();
    assertThat(gas.strata()).extracting("shape")
        .containsExactly(GasStratum.Shape.GAUSSIAN, GasStratum.Shape.SECH2);
    assertThat(gas.dispersion()).isEmpty();
  }

  /** A setting that takes the other of two alternatives drops the first one: dispersion and strength of strata. */
  @Test
  void aDispersionOfStrataReplacesTheStrengthOfTheField() {
    Model model = model(STRATA, "gas.dispersion=8.4km/s");
    assertThat(((Gas.Stratified) model.disk().gas()).dispersion()).hasValue(8.4e5);
    assertThat(((MagneticField.Balance) model.disk().field()).bottomStrength()).isEmpty();
    Model back = model(STRATA.replace("strength = \"5 uG\"", "") + "[gas]\ndispersion = \"8.4 km/s\"\n",
        "field.strength=4uG");
    assertThat(((Gas.Stratified) back.disk().gas()).dispersion()).isEmpty();
  }

  @ParameterizedTest
  @CsvSource(delimiter = '|', quoteCharacter = '`', value = {
      "name = \"cold\"\\ndispersion = \"4 km/s\" | name = \"cold\" | gas.component.1.dispersion: missing",
      "[[gas.component]]\\nname = \"cold\" | [gas]\\ndispersion = \"4 km/s\"\\n[[gas.component]]\\nname = \"cold\" | gas.dispersion: given beside gas.component",
      "dispersion = \"9 km/s\" | dispersion = 9 | model.toml:7: gas.component.2.dispersion: found 9; a unit is missing",
      "law = \"linear\" | law = \"tanh\" | gravity.2.gradient: not an input of the law \"tanh\"",
      "law = \"linear\" | lwa = \"linear\" | gravity.2.lwa: unknown key; did you mean gravity.law?",
      "[[gravity]]\\nlaw = \"uniform\"\\nstrength = \"1e-9 cm/s^2\" | [gravity.3]\\nlaw = \"linear\" | gravity"})
  void faultsInArrays(String from, String to, String message) {
    Reading reading = read(COMPONENTS.replace(from.replace("\\n", "\n"), to.replace("\\n", "\n")));
    assertThat(reading.model()).isEmpty();
    assertThat(messages(reading)).contains(message);
  }

  @ParameterizedTest
  @CsvSource(delimiter = '|', quoteCharacter = '`', value = {
      "shape = \"sech2\" | shape = \"sech\" | gas.stratum.2.shape: found \"sech\"; allowed are \"gaussian\", \"exponential\"",
      "shape = \"balance\" | shape = { value = \"balance\" } | field.shape: found a table",
      "shape = \"balance\" | | field.shape: missing; with gas.stratum the field follows from the balance",
      "strength = \"5 uG\" | | field.strength: missing; with gas.stratum give exactly one of gas.dispersion and",
      "strength = \"5 uG\" | pressure-ratio = 1.0 | field.pressure-ratio: given beside gas.stratum",
      "height = \"70 pc\" | | gas.stratum.1.height: missing; each stratum needs one",
      "[field] | [gas]\\ndispersion = \"8 km/s\"\\n[field] | field.strength: given beside gas.dispersion",
      "[field] | [gas]\\nsurface-density = \"8 Msun/pc^2\"\\n[field] | gas.surface-density: given beside gas.stratum",
      "[field] | [[gas.component]]\\ndispersion = \"8 km/s\"\\nmidplane-density = \"1 cm^-3\"\\n[field] | gas.stratum.1: given beside gas.component"})
  void faultsOfStrata(String from, String to, String message) {
    Reading reading = read(STRATA.replaceFirst(java.util.regex.Pattern.quote(from),
        to == null ? "" : java.util.regex.Matcher.quoteReplacement(to.replace("\\n", "\n"))));
    assertThat(reading.model()).isEmpty();
    assertThat(messages(reading)).contains(message);
  }

  @Test
  void uncertainInputsUseTheirMiddle() {
    Model model = model(PLAIN.replace("\"6.4 km/s\"", "{ low = \"5 km/s\", high = \"9 km/s\" }")
        .replace("pressure-ratio = 1.0", "strength = { value = \"3 uG\", normal = \"1 uG\" }")
        .replace("\"1.0 cm^-3\"", "{ value = \"1 cm^-3\", factor = 2.0 }"));
    assertThat(((Gas.Isothermal) model.disk().gas()).dispersion()).isEqualTo(7e5);
    assertThat(model.uncertainties().get("gas.dispersion"))
        .isEqualTo(new Uncertainty(Uncertainty.Shape.RANGE, 7e5, 2e5, 0.0, 2.99792458e10));
    assertThat(model.uncertainties().get("field.strength"))
        .isEqualTo(new Uncertainty(Uncertainty.Shape.NORMAL, 3e-6, 1e-6, 0.0,
            Double.POSITIVE_INFINITY));
    Uncertainty density = model.uncertainties().get("gas.midplane-density");
    assertThat(density.centre()).isCloseTo(1.4 * Constants.HYDROGEN_MASS, within(1e-38));
    assertThat(density.spread()).isEqualTo(2.0);
  }

  /** A table that stands as a value, or alone where an array is meant, is told how to be written. */
  @ParameterizedTest
  @CsvSource(delimiter = '|', quoteCharacter = '`', value = {
      "gas = 3 | model.toml:1: gas: found 3; it is a table of keys: write [gas]",
      "gravity = [] | model.toml:1: gravity: found an empty array; it is a table of keys: write [gravity]",
      "gravity = \"tanh\" | model.toml:1: gravity: found \"tanh\"; it is a table of keys: write [gravity]",
      "gas.component = 1 | model.toml:1: gas.component: found 1; it is a table of keys: write [[gas.component]]",
      "gas.component.dispersion = \"6 km/s\" | model.toml:1: gas.component.dispersion: gas.component stands as a single"
          + " table; write [[gas.component]] once for each",
      "[gas.stratum]\\nheight = 7 | model.toml:2: gas.stratum.height: gas.stratum stands as a single table"})
  void tablesInTheWrongForm(String text, String message) {
    assertThat(messages(read(text.replace("\\n", "\n") + "\n")).lines()).anyMatch(line -> line.startsWith(message));
  }

  /** An uncertain mass for each nucleus counts with its middle wherever it stands, never with the standard instead. */
  @ParameterizedTest
  @CsvSource(delimiter = '|', value = {"{ low = 1.2, high = 1.3 }|1.25", "{ value = 1.3, normal = 0.1 }|1.3",
      "{ value = 2, factor = 1.5 }|2"})
  void anUncertainMassOfNuclei(String mass, double hydrogenMasses) {
    Model model = model(PLAIN.replace("[field]", "mass-per-hydrogen = " + mass + "\n[field]"));
    assertThat(((Gas.Isothermal) model.disk().gas()).bottomDensity().getAsDouble() / Constants.HYDROGEN_MASS)
        .isCloseTo(hydrogenMasses, within(1e-14)); // rounding
    assertThat(model.uncertainties()).containsOnlyKeys("gas.mass-per-hydrogen");
  }

  /** The lid matters, so the top may be uncertain like every dimensional value; in units of length only. */
  @Test
  void anUncertainTop() {
    String top = PLAIN + "[domain]\nbottom = \"2 kpc\"\ntop = ";
    Model model = model(top + "{ low = \"3 kpc\", high = \"5 kpc\" }\n");
    assertThat(model.disk().domain().top()).contains(Height.centimetres(4e3 * Constants.PARSEC));
    Uncertainty uncertainty = model.uncertainties().get("domain.top");
    assertThat(uncertainty.shape()).isEqualTo(Uncertainty.Shape.RANGE);
    // 4e6 cm: the last binary digit of 5 kpc is worth 2e6 cm
    assertThat(uncertainty.spread()).isCloseTo(1e3 * Constants.PARSEC, within(4e6));
    assertThat(messages(read(top + "{ low = \"1 kpc\", high = \"2 kpc\" }\n")))
        .contains("domain.top: found a table; it must exceed domain.bottom, \"2 kpc\"").doesNotContain("\n");
    assertThat(messages(read(top + "{ value = \"12 scale-heights\", factor = 2 }\n")))
        .contains("domain.top.value: ").doesNotContain("\n");
  }

  @ParameterizedTest
  @CsvSource(delimiter = '|', quoteCharacter = '`', value = {
      "{ value = \"6 km/s\" } | gas.dispersion: found an incomplete uncertainty; allowed are { value, normal }",
      "{ low = \"6 km/s\" } | gas.dispersion: found an incomplete uncertainty",
      "{ value = \"6 km/s\", normal = \"1 km/s\", factor = 2 } | gas.dispersion: found an incomplete uncertainty",
      "{ low = \"6 km/s\", high = \"5 km/s\" } | gas.dispersion.high: the upper end does not exceed the lower one",
      "{ low = \"6 km/s\", high = 7 } | gas.dispersion.high: found 7; a unit is missing",
      "{ value = \"6 km/s\", normal = \"1 pc\" } | gas.dispersion.normal: found \"1 pc\", whose dimension is cm",
      "{ value = \"6 km/s\", normal = \"0 km/s\" } | gas.dispersion.normal: found \"0 km/s\"",
      "{ value = \"6 km/s\", factor = 0.5 } | gas.dispersion.factor: found 0.5; a factor greater than 1 is needed",
      "{ value = \"6 km/s\", sigma = \"1 km/s\" } | gas.dispersion.sigma: unknown key",
      "{} | gas.dispersion: "})
  void faultsOfUncertainties(String value, String message) {
    Reading reading = read(PLAIN.replace("\"6.4 km/s\"", value));
    assertThat(reading.model()).isEmpty();
    assertThat(messages(reading)).contains(message);
  }
}
