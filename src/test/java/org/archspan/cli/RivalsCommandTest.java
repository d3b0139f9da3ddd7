package org.archspan.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Rival instabilities end to end. */
class RivalsCommandTest {
  private static final String MODEL = "models/gas-and-stars-with-shell.toml";

  @TempDir
  Path folder;

  @Test
  void golden() throws IOException {
    CommandRun run = CommandRun.of("rivals", MODEL);
    assertThat(run.status()).as(run.err()).isZero();
    Path golden = Path.of("src/test/resources/golden/rivals-gas-and-stars-with-shell.txt");
    if (System.getenv("ARCHSPAN_RENEW_GOLDEN") != null) {
      Files.writeString(golden, run.out());
    }
    assertThat(run.out()).isEqualTo(Files.readString(golden));
  }

  private static JsonObject row(JsonObject json, String name) {
    for (JsonElement row : json.getAsJsonArray("instabilities")) {
      if (row.getAsJsonObject().get("instability").getAsString().equals(name)) {
        return row.getAsJsonObject();
      }
    }
    throw new AssertionError("no row " + name + " in " + json);
  }

  private static double value(JsonObject row, String key) {
    return row.getAsJsonObject(key).get("value").getAsDouble();
  }

  /** The buoyancy row is the answer of spacing for the same model, digit by digit. */
  @Test
  void buoyancyIsWhatSpacingSays() {
    JsonObject rivals = JsonParser.parseString(CommandRun.of("rivals", MODEL, "--json").out()).getAsJsonObject();
    JsonObject spacing = JsonParser.parseString(CommandRun.of("spacing", MODEL, "--json").out()).getAsJsonObject()
        .getAsJsonObject("spacing");
    assertThat(value(row(rivals, "magnetic buoyancy"), "wavelength")).isEqualTo(value(spacing, "wavelength"));
    assertThat(value(row(rivals, "magnetic buoyancy"), "growth-time")).isEqualTo(value(spacing, "growth-time"));
    // Toomre's Q = kappa c/(pi G Sigma) with 37 km/s/kpc, 7 km/s, 40 Msun/pc^2, G = 4.30092e-3 pc (km/s)^2/Msun:
    // five digits of that G
    assertThat(row(rivals, "gravity in the plane: gas, thin").get("value").getAsDouble())
        .isCloseTo(0.037 * 7.0 / (Math.PI * 4.30092e-3 * 40.0), within(1e-5));
  }

  /** model; row; what it needs. */
  @ParameterizedTest
  @CsvSource(delimiter = ';', value = {
      "models/uncertain-disk.toml; gravity in the plane: gas; needs [rotation]",
      "models/solar-flux-sheet.toml; gravity in the plane: gas; needs a disk about its midplane",
      "models/solar-neighbourhood.toml; gravity in the plane: gas and stars; needs [stars] or the gravity law"
          + " isothermal-sheet",
      "models/solar-neighbourhood.toml; shear of a lagging rotation; needs rotation.lag",
      "models/solar-neighbourhood.toml; overturning of an interface; needs [[interface]]"})
  void aMissingInputIsNamedInItsRowAndStopsNothing(String model, String name, String reason) {
    CommandRun run = CommandRun.of("rivals", model, "--json");
    assertThat(run.status()).isZero();
    JsonObject row = row(JsonParser.parseString(run.out()).getAsJsonObject(), name);
    assertThat(row.get("outcome").getAsString()).isEqualTo("not judged");
    assertThat(row.get("remark").getAsString()).isEqualTo(reason);
  }

  /** Buoyancy over an empty range of waves cannot be solved; the others are, and the status says so. */
  @Test
  void aRowThatFailsSaysWhyAndSetsTheStatus() {
    CommandRun run = CommandRun.of("rivals", MODEL, "--json", "--set", "waves.shortest=5 scale-heights", "--set",
        "waves.longest=1 pc");
    assertThat(run.status()).isEqualTo(4);
    JsonObject json = JsonParser.parseString(run.out()).getAsJsonObject();
    assertThat(row(json, "magnetic buoyancy").get("outcome").getAsString()).isEqualTo("failed");
    assertThat(row(json, "magnetic buoyancy").get("remark").getAsString()).isNotBlank();
    assertThat(row(json, "gravity in the plane: gas and stars").get("outcome").getAsString()).isEqualTo("grows");
  }

  /** setting; a word of the message. */
  @ParameterizedTest
  @CsvSource(delimiter = ';', value = {"rotation.lag=15; unit is missing", "rotation.lag=-1 km/s/kpc; greater than 0",
      "stars.dispersion=3 pc; stars.dispersion", "interface.1.density-below=0 cm^-3; greater than 0",
      "interface.4.gravity=1 cm/s^2; interface", "interface.1.depht-above=1 pc; depth-above",
      "interface.1.shear=-1 km/s; 0 or greater"})
  void badInputIsNamed(String setting, String word) {
    CommandRun run = CommandRun.of("rivals", MODEL, "--set", setting);
    assertThat(run.status()).as(run.err()).isEqualTo(3);
    assertThat(run.err()).contains(word).doesNotContain("Exception");
  }

  @Test
  void anInterfaceNeedsItsDensities() throws IOException {
    Path model = folder.resolve("model.toml");
    Files.writeString(model, Files.readString(Path.of("models/stellar-sheet.toml"))
        + "\n[[interface]]\ndensity-below = \"1 cm^-3\"\n");
    CommandRun run = CommandRun.of("rivals", model.toString());
    assertThat(run.status()).isEqualTo(3);
    assertThat(run.err()).contains("interface.1.density-above").contains("interface.1.gravity");
  }

  @Test
  void writesItsFiles() throws IOException {
    Path out = folder.resolve("out");
    assertThat(CommandRun.of("rivals", MODEL, "--out", out.toString(), "--quiet").status()).isZero();
    try (Stream<Path> files = Files.list(out)) {
      assertThat(files.map(file -> file.getFileName().toString())).containsExactlyInAnyOrder("summary.json",
          "summary.txt", "rivals.ecsv", "rivals.svg", "rivals.png", "interfaces.ecsv", "interface-growth.ecsv",
          "report.html");
    }
  }
}
