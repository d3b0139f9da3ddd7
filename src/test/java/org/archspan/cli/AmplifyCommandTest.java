package org.archspan.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** A wave in a shearing disk, end to end. */
class AmplifyCommandTest {
  private static final String MODEL = "models/solar-neighbourhood.toml";

  @TempDir
  Path folder;

  /** Output that is compared to the letter. */
  @Test
  void golden() throws IOException {
    CommandRun run = CommandRun.of("amplify", MODEL);
    Path golden = Path.of("src/test/resources/golden/amplify-solar-neighbourhood.txt");
    if (System.getenv("ARCHSPAN_RENEW_GOLDEN") != null) {
      Files.writeString(golden, run.out());
    }
    assertThat(run.out()).isEqualTo(Files.readString(golden));
  }

  @Test
  void followsTheWaveThatIsAskedFor() {
    Path out = folder.resolve("amplify");
    CommandRun run = CommandRun.of("amplify", MODEL, "--wavelength", "1 kpc", "--start", "-2", "--duration", "100 Myr",
        "--amplification-error", "1e-3", "--json", "--out", out.toString());
    assertThat(run.status()).as(run.err()).isZero();
    JsonObject json = JsonParser.parseString(run.out()).getAsJsonObject();
    assertThat(json.getAsJsonObject("duration").get("value").getAsDouble()).isCloseTo(100.0, within(1e-9));
    assertThat(json.getAsJsonObject("winding").get("start").getAsDouble()).isEqualTo(-2.0);
    assertThat(json.get("relative-error").getAsDouble()).isLessThan(1e-3);
    assertThat(json.getAsJsonArray("time")).hasSameSizeAs(json.getAsJsonArray("amplification-in-time"));
    for (String file : List.of("amplify.ecsv", "starts.ecsv", "amplify.svg", "amplify.png", "summary.json",
        "summary.txt")) {
      assertThat(out.resolve(file)).isNotEmptyFile();
    }
  }

  /** arguments; status; a word of the message. */
  @ParameterizedTest
  @CsvSource(delimiter = ';', value = {"models/uncertain-disk.toml; 3; [rotation]",
      MODEL + " --set gas.self-gravity=full; 3; gas.self-gravity", MODEL + " --duration 3; 2; time",
      MODEL + " --start 1e9; 2; -1000 to 1000", MODEL + " --amplification-error 2; 2; 1e-8 to 1e-1",
      MODEL + " --wavelength infinite; 2; finite"})
  void faultsHaveOneMessageAndTheirStatus(String line, int status, String word) {
    CommandRun run = CommandRun.of(("amplify " + line).split(" "));
    assertThat(run.status()).as(run.err()).isEqualTo(status);
    assertThat(run.err()).contains(word).doesNotContain("Exception").doesNotContain("\tat ");
    assertThat(run.out()).isEmpty();
  }
}
