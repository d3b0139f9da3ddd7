package org.archspan.modelfile;

import static org.archspan.modelfile.ModelTexts.PLAIN;
import static org.archspan.modelfile.ModelTexts.messages;
import static org.archspan.modelfile.ModelTexts.model;
import static org.archspan.modelfile.ModelTexts.read;
import static org.archspan.modelfile.ModelTexts.with;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Optional;
import org.archspan.boundary.TopBoundary;
import org.archspan.disk.CosmicRays;
import org.archspan.disk.Gas;
import org.archspan.disk.Height;
import org.archspan.disk.MagneticField;
import org.archspan.gravity.TanhGravity;
import org.archspan.units.Constants;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ModelReaderTest {
  private static final double PC = Constants.PARSEC;

  @Test
  void readsAPlainModelWithItsDefaults() {
    Model model = model(PLAIN);
    Gas.Isothermal gas = (Gas.Isothermal) model.disk().gas();
    assertThat(gas.dispersion()).isEqualTo(6.4e5);
    // 1.4 hydrogen masses for each nucleus: common practice at solar helium abundance
    assertThat(gas.bottomDensity().getAsDouble()).isCloseTo(1.4 * Constants.HYDROGEN_MASS, within(1e-38));
    assertThat(model.disk().gasClosure().adiabaticIndex()).isEqualTo(1.0);
    assertThat(model.disk().field()).isEqualTo(new MagneticField.ConstantRatio(1.0));
    assertThat(model.disk().cosmicRays()).isEqualTo(CosmicRays.none());
    assertThat(model.disk().gravity()).containsExactly(new TanhGravity(2e-9, 160.0 * PC));
    assertThat(model.disk().domain().aboutMidplane()).isTrue();
    assertThat(model.title()).isEqualTo("Plain");
    assertThat(model.inputs()).containsEntry("gas.dispersion", "6.4 km/s").hasSize(7);
    assertThat(model.disk().rotation()).isEmpty();
  }

  /** One fault in an otherwise correct model: one message that names line, key, what was found and what to do. */
  @ParameterizedTest
  @CsvSource(delimiter = '|', quoteCharacter = '`', value = {
      "gas | dispersion = 6.4 | model.toml:3: gas.dispersion: found 6.4; a unit is missing: write a string such as \"6.4 km/s\"",
      "gas | dispersion = \"6.4\" | model.toml:3: gas.dispersion: found \"6.4\", whose dimension is a pure number; a unit such as km/s",
      "gas | dispersion = \"6.4 km\" | model.toml:3: gas.dispersion: found \"6.4 km\", whose dimension is cm; a unit such as km/s",
      "gas | dispersion = \"6.4 kms\" | model.toml:3: gas.dispersion: \"kms\" is not a known unit; did you mean km?",
      "gas | dispersion = \"0 km/s\" | model.toml:3: gas.dispersion: found \"0 km/s\"; allowed is a value greater than 0 and below the speed of light",
      "gas | dispersion = \"-1 km/s\" | model.toml:3: gas.dispersion: found \"-1 km/s\"; allowed is a value greater than 0 and below the speed of light",
      "gas | dispersion = \"nan km/s\" | model.toml:3: gas.dispersion: \"nan km/s\" is not a number with a unit",
      "gas | dispersion = \"1e400 km/s\" | model.toml:3: gas.dispersion: \"1e400 km/s\" is larger than any number",
      "gas | dispersion = \"\" | model.toml:3: gas.dispersion: \"\" is not a number with a unit",
      "gas | dispersion = true | model.toml:3: gas.dispersion: found true; a unit is missing: write a string such as \"1 km/s\"",
      "gas | dispersion = [1, 2] | model.toml:3: gas.dispersion: found an array; a unit is missing: write a string such as \"1 km/s\"",
      "gas | adiabatic-index = [] | model.toml:3: gas.adiabatic-index: found an empty array; a number without unit is needed",
      "domain | top = [[1]] | model.toml:12: domain.top: found an array; a unit is missing: write a string such as \"1 pc\"",
      "gas | dispersion = 2026-12-01 | model.toml:3: gas.dispersion: found 2026-12-01",
      "gas | adiabatic-index = nan | gas.adiabatic-index: found NaN; allowed is a finite number between 0.001 and 1000",
      "gas | adiabatic-index = inf | gas.adiabatic-index: found Infinity; allowed is a finite number between 0.001 and 1000",
      "gas | adiabatic-index = 1e400 | model.toml:3: Float is too large; the file must be TOML 1.0",
      "gas | adiabatic-index = \"5/3\" | gas.adiabatic-index: found \"5/3\"; a number without unit is needed",
      "gas | adiabatic-index = 0 | gas.adiabatic-index: found 0; allowed is a finite number between 0.001 and 1000",
      "gas | dispersion = \"4e5 km/s\" | gas.dispersion: found \"4e5 km/s\"; allowed is a value greater than 0 and below",
      "gas | dispersion = \"1e-70 km/s\" | and below the speed of light, of a size between 1e-60 and 1e60 in CGS",
      "field | pressure-ratio = 1e70 | found 1.0E70; allowed is a finite number 0 or greater, of a size between 1e-60",
      "domain | top = \"1e70 pc\" | domain.top: found \"1e70 pc\"; a length greater than 0, of a size between 1e-60 and",
      "gas | dispersoin = \"1 km/s\" | gas.dispersoin: unknown key; did you mean gas.dispersion?",
      "gas | Dispersion = \"1 km/s\" | gas.Dispersion: unknown key; did you mean gas.dispersion?",
      "gas | midplane-density = \"1 pc\" | model.toml:4: gas.midplane-density: found \"1 pc\"",
      "gas | surface-density = \"10 Msun/pc^2\" | gas.surface-density: given beside gas.midplane-density; give one of",
      "gas | temperature = \"8000 K\" | gas.temperature: given beside gas.dispersion; give one of",
      "gas | mean-molecular-weight = 0.6 | gas.mean-molecular-weight: given without gas.temperature",
      "gas | cooling-time = \"2 pc\" | gas.cooling-time: found \"2 pc\", whose dimension is cm",
      "gas | self-gravity = \"ful\" | gas.self-gravity: found \"ful\"; allowed are \"off\", \"equilibrium\", \"full\"; did you mean \"full\"?",
      "field | pressure-ratio = -0.1 | model.toml:6: field.pressure-ratio: found -0.1; allowed is a finite number 0 or greater",
      "field | pressure-ratio = \"1\" | model.toml:6: field.pressure-ratio: found \"1\"; a number without unit is needed",
      "field | strength = \"3 uG\" | field.strength: given beside field.pressure-ratio; give one of",
      "field | shape = \"balance\" | field.shape: \"balance\" without gas.stratum",
      "field | bottom = \"1 Mm\" | field.bottom: given without field.shape = \"sheet\"",
      "gravity | law = \"tan\" | model.toml:8: gravity.law: found \"tan\"; allowed are \"uniform\"",
      "gravity | gradient = \"1 cm/s^2/kpc\" | gravity.gradient: not an input of the law \"tanh\"; its inputs are strength, height",
      "gravity | height = \"160 km/s\" | model.toml:10: gravity.height: found \"160 km/s\"",
      "cosmic-rays | pressure-ratio = -1.0 | cosmic-rays.pressure-ratio: found -1.0",
      "cosmic-rays | diffusivity = \"infinity\" | cosmic-rays.diffusivity: \"infinity\" is not a number with a unit",
      "cosmic-rays | diffusivity = \"3e28 cm/s\" | cosmic-rays.diffusivity: found \"3e28 cm/s\", whose dimension is cm s^-1",
      "cosmic-ray | pressure-ratio = 1.0 | cosmic-ray.pressure-ratio: unknown key; did you mean cosmic-rays.pressure-ratio?",
      "domain | top = 5 | domain.top: found 5; a unit is missing: write a string such as \"5 pc\" or \"5 scale-heights\"",
      "domain | top = \"-5 pc\" | domain.top: found \"-5 pc\"; a length greater than 0",
      "domain | top = \"midplane\" | domain.top: \"midplane\" is not a number with a unit",
      "domain | top = \"5 pc scale-heights\" | domain.top: found \"5 pc scale-heights\"; a number of scale heights",
      "domain | top = \"x scale-heights\" | domain.top: found \"x scale-heights\"; a number of scale heights",
      "domain | bottom = \"2 scale-heights\" | domain.bottom: found \"2 scale-heights\"",
      "domain | top-boundary = \"closed\" | domain.top-boundary: found \"closed\"; allowed are \"open\", \"lid\", \"free\"",
      "waves | parity = \"odd\" | waves.parity: found \"odd\"; allowed are \"mirror\", \"flexing\", \"both\"",
      "waves | branches = 2.5 | waves.branches: found 2.5; allowed is a whole number between 1 and 30",
      "waves | cross-wavelength = \"arm-width\" | arm.width: missing; waves.cross-wavelength = \"arm-width\" needs it",
      "output | length = \"furlong\" | output.length: \"furlong\" is not a known unit",
      "output | time = \"pc\" | output.time: \"pc\" is not a unit of time",
      "rotation | angular-speed = \"26 km/s\" | rotation.angular-speed: found \"26 km/s\", whose dimension is cm s^-1",
  })
  void saysOneThingWrong(String table, String line, String message) {
    Reading reading = read(with(table, line));
    assertThat(reading.model()).isEmpty();
    assertThat(reading.faults()).as(messages(reading)).hasSize(1);
    assertThat(messages(reading)).contains(message).doesNotContain("\n");
  }

  @Test
  void saysEverythingThatIsWrongAtOnce() {
    String text = PLAIN.replace("6.4 km/s", "6.4").replace("law = \"tanh\"", "law = \"uniform\"")
        .replace("pressure-ratio = 1.0", "presure-ratio = 1.0") + "[domain]\ntop = 3\n";
    assertThat(messages(read(text)).lines().map(line -> line.split(": ")[0] + " " + line.split(": ")[1]))
        .containsExactly("model.toml:3 gas.dispersion", "model.toml:6 field.presure-ratio",
            "model.toml:10 gravity.height", "model.toml:12 domain.top");
  }

  @ParameterizedTest
  @CsvSource(delimiter = '|', quoteCharacter = '`', value = {
      "dispersion = \"6.4 km/s\" | gas.dispersion: missing; give one of gas.dispersion, gas.temperature",
      "midplane-density = \"1.0 cm^-3\" | gas.midplane-density: missing; give one of",
      "law = \"tanh\" | gravity.law: missing; allowed are uniform",
      "height = \"160 pc\" | gravity.height: missing; the law \"tanh\" (g = strength tanh(z/height)) needs it"})
  void saysWhatIsMissing(String line, String message) {
    assertThat(messages(read(PLAIN.replace(line + "\n", "")))).contains(message).doesNotContain("\n");
  }

  @Test
  void emptyTables() {
    assertThat(read(PLAIN + "[domain]\n[waves]\n[arm]\n").model()).isPresent();
    assertThat(messages(read(PLAIN + "[domian]\n"))).contains("model.toml:11: domian: unknown key").doesNotContain("\n");
    assertThat(messages(read(PLAIN.replace("\"6.4 km/s\"", "{}"))))
        .isEqualTo("model.toml:3: gas.dispersion: found an empty table; give it a value");
    assertThat(messages(read(PLAIN.replaceAll("(?m)^(law|strength|height).*\n", ""))))
        .startsWith("model.toml: gravity.law: missing").doesNotContain("\n");
  }

  @Test
  void temperatureWithMolecularWeightIsADispersion() {
    Model model = model(PLAIN.replace("dispersion = \"6.4 km/s\"",
        "temperature = \"8000 K\"\nmean-molecular-weight = 0.6"));
    // c^2 = k T/(mu m_u), by hand: 1.380649e-16 * 8000/(0.6 * 1.66053906892e-24); 0.01: nine digits of the root
    assertThat(((Gas.Isothermal) model.disk().gas()).dispersion()).isCloseTo(1052898.39, within(0.01));
    assertThat(messages(read(PLAIN.replace("dispersion = \"6.4 km/s\"", "temperature = \"8000 K\""))))
        .contains("gas.mean-molecular-weight: missing");
  }

  /** Densities of nuclei take the mass for each nucleus, wherever it stands in the file; mass densities do not. */
  @ParameterizedTest
  @CsvSource({"1 cm^-3, 1.27", "1/cm^3, 1.27", "1e6 m^-3, 1.27", "2e-24 g/cm^3, 1.1951"})
  void densitiesOfNucleiOrOfMass(String density, double hydrogenMasses) {
    Model model = model(with("gas", "midplane-density = \"" + density.replace("1/", "1 1/") + "\""),
        "gas.mass-per-hydrogen=1.27");
    double found = ((Gas.Isothermal) model.disk().gas()).bottomDensity().getAsDouble() / Constants.HYDROGEN_MASS;
    // 1e-4: digits of the last row, 2e-24 g over 1.6735328e-24 g
    assertThat(found).isCloseTo(hydrogenMasses, within(1e-4));
  }

  @Test
  void heightsInScaleHeights() {
    Model model = model(PLAIN + "[domain]\ntop = \"12 scale-heights\"\ntop-boundary = \"lid\"\n[waves]\n"
        + "gathering-height = \"1 scale-height\"\nshortest = \"100 pc\"\nlongest = \"5 kpc\"\n");
    assertThat(model.disk().domain().top()).contains(Height.scaleHeights(12.0));
    assertThat(model.disk().domain().topBoundary()).contains(TopBoundary.LID);
    assertThat(model.options().gatheringHeight()).isEqualTo(Height.scaleHeights(1.0));
    assertThat(model.options().shortest()).contains(Height.centimetres(100.0 * PC));
  }

  @Test
  void crossWavelengthOfTheArmIsTwiceItsWidth() {
    Model model = model(PLAIN + "[waves]\ncross-wavelength = \"arm-width\"\n[arm]\nwidth = \"600 pc\"\n");
    assertThat(model.options().crossWavelength()).contains(Height.centimetres(2.0 * (600.0 * PC)));
    assertThat(model(with("waves", "cross-wavelength = \"infinite\"")).options().crossWavelength())
        .isEqualTo(Optional.empty());
  }

  @ParameterizedTest
  @CsvSource(delimiter = '|', quoteCharacter = '`', value = {
      "shortest = \"2 kpc\"\\nlongest = \"1 kpc\" | waves.longest: ",
      "shortest = \"3 scale-heights\"\\nlongest = \"2 scale-heights\" | waves.longest: "})
  void theLongestWaveExceedsTheShortest(String waves, String message) {
    assertThat(messages(read(PLAIN + "[waves]\n" + waves.replace("\\n", "\n") + "\n"))).contains(message)
        .doesNotContain("\n");
  }

  @Test
  void theTopLiesAboveTheBottom() {
    assertThat(messages(read(PLAIN + "[domain]\nbottom = \"2 kpc\"\ntop = \"1 kpc\"\n"))).contains("domain.top: ")
        .doesNotContain("\n");
  }
}
