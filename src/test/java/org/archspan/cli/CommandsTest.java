package org.archspan.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The commands end to end. */
class CommandsTest {
  private static final String THICK = "models/thick-disk-near-the-sun.toml";
  private static final String UNIFORM = "models/uniform-gravity-atmosphere.toml";

  @TempDir
  Path folder;

  /** Output that is compared to the letter: numbers in it are rounded to four digits, so only a real change moves them. */
  @ParameterizedTest
  @ValueSource(strings = {"spacing uniform-gravity-atmosphere", "spacing thick-disk-near-the-sun", "spacing stable-disk",
      "spacing tanh-halo", "equilibrium uniform-gravity-atmosphere", "mode stellar-sheet",
      "dispersion uniform-gravity-atmosphere", "plane stellar-sheet", "models", "check --keys"})
  void golden(String line) throws IOException {
    String[] words = line.split(" ");
    List<String> arguments = new java.util.ArrayList<>(List.of(words));
    if (words.length == 2 && !words[1].startsWith("--")) {
      arguments.set(1, "models/" + words[1] + ".toml");
    }
    if (words[0].equals("plane")) {
      arguments.addAll(List.of("--points", "12"));
    }
    CommandRun run = CommandRun.of(arguments.toArray(String[]::new));
    assertThat(run.status()).isZero();
    Path golden = Path.of("src/test/resources/golden", line.replace(' ', '-').replace("---", "-") + ".txt");
    if (System.getenv("ARCHSPAN_RENEW_GOLDEN") != null) {
      Files.writeString(golden, run.out());
    }
    assertThat(run.out()).isEqualTo(Files.readString(golden));
  }

  @Test
  void jsonHasEveryPromisedKey() {
    CommandRun run = CommandRun.of("spacing", THICK, "--json");
    JsonObject json = JsonParser.parseString(run.out()).getAsJsonObject();
    assertThat(json.keySet()).contains("model", "stable", "fastest", "branches", "spacing", "limit-across",
        "longest-stable-wavelength", "complex", "equilibrium", "warnings");
    JsonObject fastest = json.getAsJsonObject("fastest");
    assertThat(fastest.keySet()).contains("wavelength", "growth-rate", "growth-time", "wavenumber-times-scale-height",
        "growth-rate-times-crossing-time", "parity", "relative-error", "unstable-modes", "centroid-height", "held-by");
    assertThat(json.getAsJsonArray("branches").get(0).getAsJsonObject().keySet()).contains("column-contrast");
    assertThat(json.getAsJsonObject("equilibrium").keySet()).contains("scale-height", "surface-density",
        "midplane-field", "force-balance-residual");
    assertThat(json.getAsJsonObject("complex").keySet()).contains("mass", "e-foldings-in-arm");
    assertThat(json.getAsJsonObject("spacing").keySet()).contains("wavelength", "growth-time", "branch");
    double wavelength = fastest.getAsJsonObject("wavelength").get("value").getAsDouble();
    double surfaceDensity = json.getAsJsonObject("equilibrium").getAsJsonObject("surface-density").get("value")
        .getAsDouble();
    double mass = json.getAsJsonObject("complex").getAsJsonObject("mass").get("value").getAsDouble();
    // mass = surface density x wavelength x arm width (600 pc), to rounding
    assertThat(mass).isCloseTo(surfaceDensity * wavelength * 600.0, within(1e-10 * mass));
    assertThat(fastest.getAsJsonObject("wavelength").get("unit").getAsString()).isEqualTo("pc");
  }

  @Test
  void stableIsAnAnswer() {
    CommandRun run = CommandRun.of("spacing", "models/stable-disk.toml", "--json");
    assertThat(run.status()).isZero();
    JsonObject json = JsonParser.parseString(run.out()).getAsJsonObject();
    assertThat(json.get("stable").getAsBoolean()).isTrue();
    assertThat(json.get("fastest").isJsonNull()).isTrue();
    assertThat(json.getAsJsonArray("branches")).isEmpty();
  }

  @Test
  void writesEverythingOnceAndReplacesNothingUnasked() throws IOException {
    Path out = folder.resolve("out");
    CommandRun run = CommandRun.of("spacing", UNIFORM, "--out", out.toString(), "--quiet");
    assertThat(run.status()).as(run.err()).isZero();
    assertThat(run.out()).isEmpty();
    try (Stream<Path> files = Files.list(out)) {
      assertThat(files.map(file -> file.getFileName().toString())).containsExactlyInAnyOrder("summary.json",
          "summary.txt", "equilibrium.ecsv", "equilibrium.svg", "equilibrium.png", "growth.ecsv", "growth.svg",
          "growth.png", "branches.ecsv", "elasticities.ecsv", "mode.ecsv", "mode.svg", "mode.png",
          "drivers.svg", "drivers.png", "report.html");
    }
    byte[] before = Files.readAllBytes(out.resolve("summary.json"));
    CommandRun again = CommandRun.of("spacing", UNIFORM, "--out", out.toString(), "--set", "gas.dispersion=8km/s");
    assertThat(again.status()).isEqualTo(5);
    assertThat(again.err()).contains("exists; nothing was changed");
    assertThat(Files.readAllBytes(out.resolve("summary.json"))).isEqualTo(before);
    CommandRun replaced = CommandRun.of("spacing", UNIFORM, "--out", out.toString(), "--overwrite", "--quiet");
    assertThat(replaced.status()).isZero();
    assertThat(Files.readAllBytes(out.resolve("summary.json"))).isEqualTo(before);
  }

  @Test
  void reportEscapesWhatComesFromTheModel() throws IOException {
    Path model = folder.resolve("evil.toml");
    Files.writeString(model, Files.readString(Path.of(UNIFORM)).replaceFirst("title = \".*\"",
        "title = \"<script>alert(1)</script> & co\""));
    Path out = folder.resolve("out");
    assertThat(CommandRun.of("spacing", model.toString(), "--out", out.toString(), "--quiet").status()).isZero();
    String page = Files.readString(out.resolve("report.html"));
    assertThat(page).doesNotContain("<script").contains("&lt;script&gt;alert(1)&lt;/script&gt; &amp; co");
    assertThat(page).doesNotContain("src=\"http").contains("<svg");
  }

  /** arguments; status; a word of the message. */
  @ParameterizedTest
  @CsvSource(delimiter = ';', value = {"spacing; 2; MODEL.toml", "spacing missing.toml; 5; does not exist",
      "spacing models; 5; directory", "spacing thick-disk-near-the-sun; 5; archspan models",
      "fly models/stellar-sheet.toml; 2; fly", "spacing models/stellar-sheet.toml --tolerance 1; 2; 1e-12 to 1e-2",
      "spacing models/stellar-sheet.toml --threads 0; 2; 1 to 1024",
      "spacing models/stellar-sheet.toml --set gas.dispersion=7; 3; unit is missing",
      "spacing models/stellar-sheet.toml --set gas.dispertion=7km/s; 3; gas.dispersion",
      "spacing models/stellar-sheet.toml --set domain.top=-1pc; 3; domain.top",
      "spacing models/galactic-centre-ring.toml --set domain.top-boundary=open; 3; uniform",
      "spacing models/thick-disk-near-the-sun.toml --set field.strength=50uG; 3; support runs out",
      "spacing models/stellar-sheet.toml --set field.strength=40uG; 3; surface density",
      "check models/stellar-sheet.toml --set arm.width=3; 3; unit is missing", "models nonsense; 2; no model",
      "mode models/stellar-sheet.toml --parity up; 2; mirror and flexing",
      "mode models/stellar-sheet.toml --wavelength 3; 2; length",
      "plane models/stellar-sheet.toml --points 1; 2; 2 to 1000",
      "dispersion models/stellar-sheet.toml --orders 0; 2; 1 to 30",
      "equilibrium models/stellar-sheet.toml --rows 1; 2; 2 to 100000"})
  void faultsHaveOneMessageAndTheirStatus(String line, int status, String word) {
    CommandRun run = CommandRun.of(line.split(" "));
    assertThat(run.status()).as(run.err()).isEqualTo(status);
    assertThat(run.err()).contains(word).doesNotContain("Exception").doesNotContain("\tat ");
    assertThat(run.out()).isEmpty();
  }

  @Test
  void smallerCommandsWriteTheirFiles() throws IOException {
    for (String command : List.of("equilibrium", "dispersion", "mode", "plane")) {
      Path out = folder.resolve(command);
      String[] arguments = command.equals("plane")
          ? new String[] {command, UNIFORM, "--out", out.toString(), "--quiet", "--points", "8"}
          : new String[] {command, UNIFORM, "--out", out.toString(), "--quiet"};
      CommandRun run = CommandRun.of(arguments);
      assertThat(run.status()).as(run.err()).isZero();
      String name = command.equals("dispersion") ? "growth" : command;
      assertThat(out.resolve(name + ".ecsv")).isNotEmptyFile();
      assertThat(out.resolve(name + ".svg")).isNotEmptyFile();
      assertThat(out.resolve(name + ".png")).isNotEmptyFile();
      CommandRun json = CommandRun.of(command, UNIFORM, "--json", command.equals("plane") ? "--points=8" : "--quiet");
      assertThat(JsonParser.parseString(json.out()).getAsJsonObject().keySet()).contains("model");
    }
  }

  @Test
  void threadsDoNotChangeADigit() {
    CommandRun one = CommandRun.of("plane", UNIFORM, "--json", "--points", "10", "--threads", "1");
    CommandRun four = CommandRun.of("plane", UNIFORM, "--json", "--points", "10", "--threads", "4");
    assertThat(four.out()).isEqualTo(one.out());
  }

  @Test
  void copiesAModelAndSolvesTheCopy() throws IOException {
    Path copy = folder.resolve("mine.toml");
    assertThat(CommandRun.of("models", "outer-disk", "--copy", copy.toString()).status()).isZero();
    assertThat(Files.readString(copy, StandardCharsets.UTF_8)).isEqualTo(
        Files.readString(Path.of("models/outer-disk.toml")));
    assertThat(CommandRun.of("models", "outer-disk", "--copy", copy.toString()).status()).isEqualTo(5);
    assertThat(CommandRun.of("check", copy.toString()).out()).contains("nothing wrong found");
  }

  @Test
  void solarUnitsOnRequest() {
    CommandRun run = CommandRun.of("spacing", UNIFORM, "--json", "--set", "output.length=Mm", "--set", "output.time=s");
    JsonObject wavelength = JsonParser.parseString(run.out()).getAsJsonObject().getAsJsonObject("fastest")
        .getAsJsonObject("wavelength");
    assertThat(wavelength.get("unit").getAsString()).isEqualTo("Mm");
  }

  /** Every command has a page for man(1) with its options, and the shell script completes every command. */
  @Test
  void theManualAndTheCompletionKnowEveryCommand() {
    String completion = CommandRun.of("completion").out();
    String program = CommandRun.of("manual").out();
    for (String name : Main.commandLine().getSubcommands().keySet()) {
      String page = CommandRun.of("manual", name).out();
      assertThat(page).startsWith(".TH ARCHSPAN-" + name.toUpperCase(java.util.Locale.ROOT))
          .contains(".SH OPTIONS").contains("\\-\\-help").contains(".SH EXIT STATUS");
      assertThat(program).contains(".B " + name.replace("-", "\\-") + "\n");
      assertThat(completion).contains(name);
    }
    assertThat(CommandRun.of("manual", "spaceing").err()).contains("did you mean spacing?");
  }
}
