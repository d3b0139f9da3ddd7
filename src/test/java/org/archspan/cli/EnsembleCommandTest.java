package org.archspan.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.TreeMap;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Ensembles end to end, killed ones too. */
class EnsembleCommandTest {
  private static final String MODEL = "models/uncertain-disk.toml";

  @TempDir
  Path folder;

  private static CommandRun ensemble(String... more) {
    List<String> arguments = new ArrayList<>(List.of("ensemble", MODEL, "--set", "waves.branches=1"));
    arguments.addAll(List.of(more));
    return CommandRun.of(arguments.toArray(String[]::new));
  }

  @Test
  void golden() throws IOException {
    CommandRun run = CommandRun.of("ensemble", MODEL, "--draws", "1200");
    assertThat(run.status()).as(run.err()).isZero();
    Path golden = Path.of("src/test/resources/golden/ensemble-uncertain-disk.txt");
    if (System.getenv("ARCHSPAN_RENEW_GOLDEN") != null) {
      Files.writeString(golden, run.out());
    }
    assertThat(run.out()).isEqualTo(Files.readString(golden));
  }

  /** A draw is the answer of the main job for its values, as the table gives them. */
  @Test
  void aDrawIsTheAnswerOfSpacing() throws IOException {
    Path out = folder.resolve("out");
    CommandRun run = CommandRun.of("ensemble", MODEL, "--draws", "41:42", "--out", out.toString(), "--quiet");
    assertThat(run.status()).isZero();
    List<String> lines = Files.readAllLines(out.resolve("draws/draws-000000000041-000000000041.ecsv"));
    List<String> names = List.of(lines.get(lines.size() - 2).split(","));
    List<String> cells = List.of(lines.get(lines.size() - 1).split(","));
    assertThat(cells.get(names.indexOf("draw"))).isEqualTo("41");
    JsonObject alone = JsonParser.parseString(CommandRun.of("spacing", MODEL, "--json",
        "--set", "gas.dispersion=" + cells.get(names.indexOf("gas_dispersion")) + "km/s",
        "--set", "field.strength=" + cells.get(names.indexOf("field_strength")) + "uG",
        "--set", "gravity.height=" + cells.get(names.indexOf("gravity_height")) + "pc").out()).getAsJsonObject();
    double expected = alone.getAsJsonObject("spacing").getAsJsonObject("wavelength").get("value").getAsDouble();
    // values pass through text and units, and the wavelength is settled to 1e-8
    assertThat(Double.parseDouble(cells.get(names.indexOf("wavelength")))).isCloseTo(expected, within(1e-7 * expected));
  }

  private static TreeMap<String, String> bytes(Path folder) throws IOException {
    TreeMap<String, String> all = new TreeMap<>();
    try (Stream<Path> files = Files.walk(folder)) {
      for (Path file : files.filter(Files::isRegularFile).toList()) {
        all.put(folder.relativize(file).toString(), java.util.HexFormat.of().formatHex(Files.readAllBytes(file)));
      }
    }
    return all;
  }

  /** Parts made apart, by other numbers of threads, merge into what one run gives. */
  @Test
  void partsMergeIntoTheWhole() throws IOException {
    Path whole = folder.resolve("whole");
    Path merged = folder.resolve("merged");
    ensemble("--draws", "400", "--out", whole.toString(), "--quiet", "--threads", "1");
    for (int part = 3; part >= 1; part--) {
      String own = folder.resolve("parts/" + part).toString();
      CommandRun run = ensemble("--draws", "400", "--part", part + "/3", "--out", own, "--quiet", "--threads",
          Integer.toString(part));
      assertThat(run.status()).as(run.err()).isZero();
    }
    CommandRun merge = ensemble("--merge", folder.resolve("parts").toString(), "--out", merged.toString(), "--quiet");
    assertThat(merge.status()).as(merge.err()).isZero();
    TreeMap<String, String> expected = bytes(whole);
    expected.keySet().removeIf(name -> name.startsWith("draws"));
    assertThat(bytes(merged)).isEqualTo(expected);
    try (Stream<Path> blocks = Files.walk(folder.resolve("parts/2"))) {
      Files.delete(blocks.filter(Files::isRegularFile).findFirst().orElseThrow());
    }
    CommandRun gap = ensemble("--merge", folder.resolve("parts").toString());
    assertThat(gap.status()).isEqualTo(5);
    assertThat(gap.err()).contains("lacks the draws");
  }

  /** Killed at random moments (SIGKILL) and resumed, a run leaves the bytes of one that was not. */
  @Test
  void aKilledRunResumesToTheSameBytes() throws IOException, InterruptedException {
    Path undisturbed = folder.resolve("undisturbed");
    Path killed = folder.resolve("killed");
    List<String> arguments = List.of("--draws", "7000", "--without-lid-test", "--quiet");
    Random random = new Random(3);
    int kills = 0;
    for (int attempt = 0; attempt < 4; attempt++) {
      Process process = process(killed, arguments);
      if (!process.waitFor(1000 + random.nextInt(2500), TimeUnit.MILLISECONDS)) {
        process.destroyForcibly().waitFor();
        kills++;
      }
    }
    assertThat(kills).isPositive();
    assertThat(process(killed, arguments).waitFor()).isZero();
    List<String> plain = new ArrayList<>(arguments);
    plain.addAll(List.of("--out", undisturbed.toString()));
    assertThat(ensemble(plain.toArray(String[]::new)).status()).isZero();
    assertThat(bytes(killed)).isEqualTo(bytes(undisturbed));
  }

  private static Process process(Path out, List<String> arguments) throws IOException {
    String java = Path.of(System.getProperty("java.home"), "bin", "java").toString();
    List<String> command = new ArrayList<>(List.of(java, "-cp", System.getProperty("java.class.path"),
        "org.archspan.cli.Main", "ensemble", MODEL, "--set", "waves.branches=1", "--resume", "--out", out.toString()));
    command.addAll(arguments);
    return new ProcessBuilder(command).redirectErrorStream(true).redirectOutput(ProcessBuilder.Redirect.DISCARD)
        .start();
  }

  /** More draws can be asked for later; fewer would leave some unaccounted for. */
  @Test
  void aLongerRunGoesOnFromAShorterOne() throws IOException {
    String out = folder.resolve("out").toString();
    String longer = folder.resolve("longer").toString();
    assertThat(ensemble("--draws", "20", "--out", out, "--quiet").status()).isZero();
    assertThat(ensemble("--draws", "50", "--out", out, "--quiet", "--resume").status()).isZero();
    assertThat(ensemble("--draws", "50", "--out", longer, "--quiet").status()).isZero();
    assertThat(bytes(Path.of(out))).isEqualTo(bytes(Path.of(longer)));
    CommandRun shorter = ensemble("--draws", "30", "--out", out, "--resume");
    assertThat(shorter.status()).isEqualTo(5);
    assertThat(shorter.err()).contains("beyond those asked for");
  }

  @Test
  void aDamagedBlockIsNamed() throws IOException {
    Path out = folder.resolve("out");
    assertThat(ensemble("--draws", "20", "--out", out.toString(), "--quiet").status()).isZero();
    Path block = out.resolve("draws/draws-000000000000-000000000019.ecsv");
    String text = Files.readString(block);
    Files.writeString(block, text.substring(0, text.length() - 40));
    CommandRun run = ensemble("--draws", "20", "--out", out.toString(), "--resume");
    assertThat(run.status()).isEqualTo(5);
    assertThat(run.err()).contains("is damaged", "--resume");
    Files.writeString(block, text.substring(0, text.lastIndexOf("\n19,") + 1));
    CommandRun shorter = ensemble("--draws", "20", "--out", out.toString(), "--resume");
    assertThat(shorter.err()).contains("does not hold the draws");
  }

  @Test
  void drawsOfAnotherEnsembleAreRefused() {
    String out = folder.resolve("out").toString();
    assertThat(ensemble("--draws", "10", "--out", out, "--quiet").status()).isZero();
    CommandRun again = ensemble("--draws", "10", "--out", out);
    assertThat(again.status()).isEqualTo(2);
    assertThat(again.err()).contains("--resume");
    CommandRun other = ensemble("--draws", "10", "--out", out, "--resume", "--seed", "2");
    assertThat(other.status()).isEqualTo(5);
    assertThat(other.err()).contains("another ensemble");
    assertThat(ensemble("--draws", "10", "--out", out, "--overwrite", "--seed", "2", "--quiet").status()).isZero();
  }

  /** A field far too strong for the column has no state: the draw says so, the others go on, and the status tells. */
  @Test
  void aDrawWithoutAnswerIsARow() {
    CommandRun run = ensemble("--draws", "60", "--json", "--set", "gas.surface-density=5Msun/pc^2", "--set",
        "field.strength={ low = \"1 uG\", high = \"7 uG\" }");
    JsonObject json = JsonParser.parseString(run.out()).getAsJsonObject();
    assertThat(run.status()).isEqualTo(4);
    assertThat(json.get("failures").getAsInt()).isBetween(1, 59);
    assertThat(json.get("failures").getAsInt() + json.get("unstable").getAsInt() + json.get("stable").getAsInt())
        .isEqualTo(60);
  }

  /** The width of the arm changes masses alone: nothing drives the spacing, and the figure has no panel for it. */
  @Test
  void anInputThatDoesNotMatterForTheSpacing() {
    CommandRun run = CommandRun.of("ensemble", "models/stellar-sheet.toml", "--set", "arm.width.factor=1.5", "--set",
        "rotation.angular-speed=0 km/s/kpc", "--draws", "30", "--out", folder.resolve("out").toString());
    assertThat(run.status()).as(run.err()).isZero();
    assertThat(run.out()).contains("None of the uncertain inputs moves the spacing by itself.");
  }

  @Test
  void theMassOfANucleusCannotBeDrawn() {
    CommandRun run = ensemble("--set", "gas.mass-per-hydrogen={ low = 1.3, high = 1.5 }");
    assertThat(run.status()).isEqualTo(3);
    assertThat(run.err()).contains("gas.mass-per-hydrogen cannot be uncertain");
  }

  @Test
  void aModelWithoutUncertaintiesIsToldHowToGiveThem() {
    CommandRun run = CommandRun.of("ensemble", "models/stellar-sheet.toml");
    assertThat(run.status()).isEqualTo(3);
    assertThat(run.err()).contains("no input is uncertain", "field.strength.normal=1uG");
  }

  @ParameterizedTest
  @CsvSource(delimiter = '|', value = {"--draws 0 | 2 | FIRST:END", "--draws 5:5 | 2 | FIRST",
      "--draws x | 2 | FIRST:END",
      "--part 1/2 | 2 | --out", "--part 0/2 --out x | 2 | 3/64", "--resume | 2 | --out",
      "--merge x --resume --out y | 2 | solves nothing", "--merge src/main/java | 5 | holds no draws"})
  void faultsHaveOneMessageAndTheirStatus(String line, int status, String word) {
    CommandRun run = ensemble(line.split(" "));
    assertThat(run.status()).as(run.err()).isEqualTo(status);
    assertThat(run.err()).contains(word).doesNotContain("Exception");
    assertThat(run.out()).isEmpty();
  }
}
