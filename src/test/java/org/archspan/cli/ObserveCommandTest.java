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
import org.archspan.report.ObservationFile;
import org.archspan.units.OutputUnits;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ObserveCommandTest {
  private static final List<String> SHIPPED = List.of("observe", "models/invented-arm.ecsv", "--inclination", "35 deg",
      "--position-angle", "60 deg", "--distance", "10 Mpc");

  @TempDir
  Path folder;

  private static CommandRun run(String... more) {
    List<String> arguments = new ArrayList<>(SHIPPED);
    arguments.addAll(List.of(more));
    return CommandRun.of(arguments.toArray(String[]::new));
  }

  @Test
  void golden() throws IOException {
    CommandRun run = run();
    assertThat(run.status()).as(run.err()).isZero();
    Path golden = Path.of("src/test/resources/golden/observe-invented-arm.txt");
    if (System.getenv("ARCHSPAN_RENEW_GOLDEN") != null) {
      Files.writeString(golden, run.out());
    }
    assertThat(run.out()).isEqualTo(Files.readString(golden));
  }

  /** The truth of the generator: 17 deg, 1.6 kpc; and what `infer` reads is that spacing. */
  @Test
  void theDocumentHoldsTheTruthAndServesInfer() throws IOException {
    CommandRun run = run("--json", "--trials", "1000");
    JsonObject json = JsonParser.parseString(run.out()).getAsJsonObject();
    JsonObject pitch = json.getAsJsonObject("arm").getAsJsonObject("pitch-angle");
    // three of the stated errors
    assertThat(pitch.get("value").getAsDouble()).isCloseTo(17.0, within(3.0 * pitch.get("error").getAsDouble()));
    JsonObject spacing = json.getAsJsonObject("spacing");
    assertThat(spacing.get("value").getAsDouble()).isCloseTo(1600.0, within(3.0 * spacing.get("error").getAsDouble()));
    Path file = folder.resolve("summary.json");
    Files.writeString(file, run.out());
    assertThat(ObservationFile.read(file, OutputUnits.galactic()).wavelength())
        .isEqualTo(spacing.get("value").getAsDouble());
    assertThat(run("--json", "--trials", "1000", "--threads", "1").out())
        .isEqualTo(run("--json", "--trials", "1000", "--threads", "4").out()).isEqualTo(run.out());
  }

  @Test
  void writesItsFiles() {
    Path out = folder.resolve("out");
    assertThat(run("--quiet", "--trials", "200", "--out", out.toString()).status()).isZero();
    for (String name : List.of("summary.json", "summary.txt", "complexes.ecsv", "periodogram.ecsv", "observe.svg",
        "observe.png", "report.html")) {
      assertThat(out.resolve(name)).isNotEmptyFile();
    }
    assertThat(run("--quiet", "--trials", "200", "--out", out.toString()).status()).isEqualTo(5);
  }

  /** options (spaces as _); status; a word of the message. */
  @ParameterizedTest
  @CsvSource(delimiter = ';', value = {"--inclination 90_deg; 2; below 90 deg",
      "--inclination 35; 2; the unit is missing",
      "--distance -1_Mpc; 2; positive", "--distance 10_deg; 2; another unit", "--trials 10; 2; 100 to 10000000",
      "--threads 0; 2; 1 to 1024", "--centre 1; 2; two values", "--centre 1,2; 2; with its unit",
      "--shortest 3_kpc --longest 2_kpc; 3; must ascend", "--longest 0_kpc; 2; positive"})
  void faultsHaveOneMessageAndTheirStatus(String options, int status, String word) {
    List<String> arguments = new ArrayList<>(SHIPPED);
    List<String> given = List.of(options.split(" "));
    for (int i = 0; i < given.size(); i += 2) {
      int known = arguments.indexOf(given.get(i));
      if (known >= 0) {
        arguments.subList(known, known + 2).clear();
      }
      arguments.addAll(List.of(given.get(i), given.get(i + 1).replace('_', ' ')));
    }
    CommandRun run = CommandRun.of(arguments.toArray(String[]::new));
    assertThat(run.err()).contains(word).doesNotContain("Exception").doesNotContain("\tat ");
    assertThat(run.status()).isEqualTo(status);
    assertThat(run.out()).isEmpty();
  }

  @ParameterizedTest
  @CsvSource(delimiter = ';', value = {"x [kpc],y [kpc]|1,2|2,3; 3; found 2 complexes",
      "east [arcsec],north [arcsec]|1,2; 2; --inclination is missing", "ra [deg],dec [deg]|1,2; 2; --centre is missing",
      "x [kpc],y [kpc]|0,0; 3; stands at the centre"})
  void tablesThatDoNotDo(String text, int status, String word) throws IOException {
    Path table = folder.resolve("table.csv");
    Files.writeString(table, text.replace("|", "\n"));
    CommandRun run = CommandRun.of("observe", table.toString());
    assertThat(run.err()).contains(word).doesNotContain("\tat ");
    assertThat(run.status()).isEqualTo(status);
  }

  @Test
  void aMissingTableIsAFileFault() {
    assertThat(CommandRun.of("observe", "nowhere.csv").status()).isEqualTo(5);
  }
}
