package org.archspan.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.google.gson.JsonArray;
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

/** From an observed spacing to an input, end to end. */
class InferCommandTest {
  private static final String MODEL = "models/uncertain-disk.toml";

  @TempDir
  Path folder;

  @Test
  void golden() throws IOException {
    CommandRun run = CommandRun.of("infer", MODEL, "--input", "field.strength=0.5uG:8uG:31", "--spacing", "1.2 kpc",
        "--error", "150 pc", "--draws", "1000");
    assertThat(run.status()).as(run.err()).isZero();
    Path golden = Path.of("src/test/resources/golden/infer-uncertain-disk.txt");
    if (System.getenv("ARCHSPAN_RENEW_GOLDEN") != null) {
      Files.writeString(golden, run.out());
    }
    assertThat(run.out()).isEqualTo(Files.readString(golden));
  }

  private static JsonObject json(CommandRun run) {
    assertThat(run.err()).isEmpty();
    return JsonParser.parseString(run.out()).getAsJsonObject();
  }

  private static double spacing(String setting) {
    return json(CommandRun.of("spacing", MODEL, "--json", "--set", setting)).getAsJsonObject("spacing")
        .getAsJsonObject("wavelength").get("value").getAsDouble();
  }

  private static double end(JsonObject interval, String name) {
    return interval.getAsJsonObject(name).get("value").getAsDouble();
  }

  /** The ends of the interval are where `spacing` gives the observation plus and minus its error. */
  @ParameterizedTest
  @CsvSource(delimiter = '|', value = {"field.strength | uG | field.strength=0.5uG:8uG:12", "gas.dispersion | km/s |"
      + " gas.dispersion=4km/s:9km/s:6", "cosmic-rays.pressure-ratio | '' | cosmic-rays.pressure-ratio=log:0.3:3:5"})
  void theEndsOfAnIntervalAreAnErrorAway(String key, String unit, String range) {
    JsonObject json = json(CommandRun.of("infer", MODEL, "--input", range, "--spacing", "0.95 kpc", "--error", "20 pc",
        "--draws", "64", "--json", "--quiet"));
    JsonArray intervals = json.getAsJsonArray("intervals");
    assertThat(intervals).isNotEmpty();
    JsonObject first = intervals.get(0).getAsJsonObject();
    for (String name : new String[] {"low", "high"}) {
      double end = unit.isEmpty() ? first.get(name).getAsDouble() : end(first, name);
      double off = Math.abs(spacing(key + "=" + end + unit) - 950.0);
      // the end is halved to 1e-9 of the input
      assertThat(off).isCloseTo(20.0, within(1e-3));
    }
  }

  /** A weak field is stabilised by a stiff gas, a strong one by its tension: the spacing is shortest between them. */
  @Test
  void twoIntervalsWhereTheRelationTurns() {
    JsonObject json = json(CommandRun.of("infer", "models/stable-disk.toml", "--set", "gas.adiabatic-index=1.6",
        "--set", "rotation.angular-speed=0 km/s/kpc",
        "--input", "field.strength=1uG:9uG:17", "--spacing", "5 kpc", "--error", "500 pc", "--draws", "64", "--quiet",
        "--json"));
    JsonArray intervals = json.getAsJsonArray("intervals");
    assertThat(intervals).hasSize(2);
    assertThat(end(intervals.get(0).getAsJsonObject(), "high")).isLessThan(4.0);
    assertThat(end(intervals.get(1).getAsJsonObject(), "low")).isGreaterThan(4.0);
    assertThat(json.getAsJsonArray("warnings").toString()).contains("Several intervals");
  }

  @Test
  void saysPlainlyWhatCannotBeReproduced() {
    CommandRun run = CommandRun.of("infer", MODEL, "--input", "field.strength=0.5uG:4uG:5", "--spacing", "90 kpc",
        "--error", "1 kpc", "--draws", "64", "--quiet", "--json");
    JsonObject json = json(run);
    assertThat(run.status()).isZero();
    assertThat(json.get("reproducible").getAsBoolean()).isFalse();
    assertThat(json.getAsJsonArray("intervals")).isEmpty();
    assertThat(json.getAsJsonArray("warnings").get(0).getAsString()).contains("CANNOT BE REPRODUCED");
    assertThat(json.get("summary").getAsString()).contains("cannot be reproduced");
  }

  @Test
  void readsAnObservationAndWritesItsFiles() throws IOException {
    Path observation = folder.resolve("observed.json");
    Files.writeString(observation, "{ \"spacing\": { \"value\": 1.2, \"unit\": \"kpc\", \"error\": 0.15 } }");
    Path out = folder.resolve("out");
    CommandRun read = CommandRun.of("infer", MODEL, "--input", "field.strength=1uG:6uG:5", "--observation",
        observation.toString(), "--draws", "64", "--json", "--quiet", "--out", out.toString());
    CommandRun given = CommandRun.of("infer", MODEL, "--input", "field.strength=1uG:6uG:5", "--spacing", "1.2 kpc",
        "--error", "150 pc", "--draws", "64", "--json", "--quiet", "--threads", "3");
    // 1e-12: 0.15 kpc and 150 pc differ in the last digit
    assertThat(end(json(read).getAsJsonArray("intervals").get(0).getAsJsonObject(), "low"))
        .isCloseTo(end(json(given).getAsJsonArray("intervals").get(0).getAsJsonObject(), "low"), within(1e-8));
    try (Stream<Path> files = Files.list(out)) {
      assertThat(files.map(file -> file.getFileName().toString())).containsExactlyInAnyOrder("summary.json",
          "summary.txt", "relation.ecsv", "intervals.ecsv", "posterior.ecsv", "inference.svg", "inference.png",
          "report.html");
    }
  }

  @ParameterizedTest
  @CsvSource(delimiter = '|', value = {"--input field.strength=1uG:2uG:5 | 2 | --spacing",
      "--input field.strength=1uG:2uG:5 --spacing 1kpc | 2 | --error", "--spacing 1kpc --error 1pc | 2 | --input",
      "--input field.strength=1uG,2uG --spacing 1kpc --error 1pc | 2 | at least 3",
      "--input waves.parity=mirror,flexing,both --spacing 1kpc --error 1pc | 2 | a range such as",
      "--input field.strength=1uG:2uG:5 --spacing 3uG --error 1pc | 2 | not a positive length",
      "--input field.strength=-2uG:2uG:5 --spacing 1kpc --error 1pc | 3 | field.strength",
      "--input field.strength=1uG:2uG:5 --observation missing.json | 5 | missing.json",
      "--input field.strength=1uG:2uG:5 --observation pom.xml | 5 | not the document"})
  void faultsHaveOneMessageAndTheirStatus(String line, int status, String word) {
    CommandRun run = CommandRun.of(("infer " + MODEL + " " + line).split(" "));
    assertThat(run.status()).as(run.err()).isEqualTo(status);
    assertThat(run.err()).contains(word).doesNotContain("Exception");
    assertThat(run.out()).isEmpty();
  }
}
