package org.archspan.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.google.gson.JsonArray;
import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The command that compares assumptions, end to end. */
class CompareCommandTest {
  private static final String MODEL = "models/stellar-sheet.toml";

  @TempDir
  Path folder;

  @Test
  void golden() throws IOException {
    CommandRun run = CommandRun.of("compare", "models/solar-neighbourhood.toml", "--vary",
        "field.strength=2uG,4uG,8uG");
    assertThat(run.status()).as(run.err()).isZero();
    Path golden = Path.of("src/test/resources/golden/compare-solar-neighbourhood.txt");
    if (System.getenv("ARCHSPAN_RENEW_GOLDEN") != null) {
      Files.writeString(golden, run.out());
    }
    assertThat(run.out()).isEqualTo(Files.readString(golden));
  }

  /** Each case is the answer of the main job for the same inputs. */
  @Test
  void aCaseIsTheAnswerOfSpacing() {
    CommandRun run = CommandRun.of("compare", MODEL, "--vary", "field.strength=2uG,3uG", "--hold", "midplane-density",
        "--json");
    JsonArray cases = JsonParser.parseString(run.out()).getAsJsonObject().getAsJsonArray("cases");
    double density = cases.get(1).getAsJsonObject().getAsJsonObject("bottom-density").get("value").getAsDouble();
    JsonObject alone = JsonParser.parseString(CommandRun.of("spacing", MODEL, "--json", "--set",
        "gas.midplane-density=" + density + "g/cm^3", "--set", "field.strength=3uG").out()).getAsJsonObject();
    double compared = cases.get(1).getAsJsonObject().getAsJsonObject("wavelength").get("value").getAsDouble();
    double expected = alone.getAsJsonObject("spacing").getAsJsonObject("wavelength").get("value").getAsDouble();
    // the density passes through text and back, and the wavelength is settled to 1e-8
    assertThat(compared).isCloseTo(expected, within(1e-7 * expected));
  }

  @Test
  void aRowThatFailsSaysWhyAndTheStatusTells() {
    CommandRun run = CommandRun.of("compare", MODEL, "--vary", "field.strength=3uG,40uG", "--json");
    assertThat(run.status()).isEqualTo(4);
    JsonObject json = JsonParser.parseString(run.out()).getAsJsonObject();
    assertThat(json.get("failures").getAsInt()).isEqualTo(1);
    JsonObject failed = json.getAsJsonArray("cases").get(1).getAsJsonObject();
    assertThat(failed.get("outcome").getAsString()).isEqualTo("failed");
    assertThat(failed.get("reason").getAsString()).contains("surface density");
    assertThat(failed.getAsJsonObject("wavelength").get("value").isJsonNull()).isTrue();
  }

  @Test
  void writesTableAndFigureForOneAndTwoInputsTheSameWithAnyThreads() throws IOException {
    Path one = folder.resolve("one");
    Path two = folder.resolve("two");
    List<String> vary = List.of("compare", MODEL, "--vary", "field.strength=2uG,3uG,40uG", "--vary",
        "waves.parity=mirror,flexing", "--quiet", "--out");
    CommandRun.of(Stream.concat(vary.stream(), Stream.of(one.toString(), "--threads", "1")).toArray(String[]::new));
    CommandRun.of(Stream.concat(vary.stream(), Stream.of(two.toString(), "--threads", "4")).toArray(String[]::new));
    for (String name : List.of("compare.ecsv", "compare.svg", "compare.png", "summary.json", "summary.txt",
        "report.html")) {
      assertThat(Files.readAllBytes(two.resolve(name))).isEqualTo(Files.readAllBytes(one.resolve(name)));
    }
    assertThat(Files.readString(one.resolve("compare.svg"))).contains("field.strength", "cross: no answer");
    assertThat(Files.readString(one.resolve("compare.ecsv")))
        .contains("field_strength,waves_parity,outcome,wavelength");
  }

  @ParameterizedTest
  @CsvSource(delimiter = '|', value = {"--json | 2 | --vary",
      "--vary field.strenth=1uG | 2 | did you mean field.strength",
      "--vary field.strength=1uG:2uG | 2 | from:to:n",
      "--vary field.strength=1uG --hold mass | 2 | surface-density or midplane-density",
      "--vary field.strength=1uG --vary field.strength=2uG | 2 | twice",
      "--vary field.strength=1uG:2uG:9999 --vary gas.dispersion=5km/s:6km/s:9999 | 2 | 100000",
      "--vary field.strength=1uG --set gas.dispersion=7 | 3 | unit is missing"})
  void faultsHaveOneMessageAndTheirStatus(String line, int status, String word) {
    CommandRun run = CommandRun.of(("compare " + MODEL + " " + line).split(" "));
    assertThat(run.status()).as(run.err()).isEqualTo(status);
    assertThat(run.err()).contains(word).doesNotContain("Exception");
    assertThat(run.out()).isEmpty();
  }
}
