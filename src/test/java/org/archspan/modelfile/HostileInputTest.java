package org.archspan.modelfile;

import static org.archspan.modelfile.ModelTexts.PLAIN;
import static org.archspan.modelfile.ModelTexts.messages;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Random;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.RepetitionInfo;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.Timeout.ThreadMode;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;

/** Whatever the file holds: one clear message or several, never an exception from within, never a hang. */
@Timeout(value = 30, unit = TimeUnit.SECONDS, threadMode = ThreadMode.SEPARATE_THREAD)
class HostileInputTest {
  private static final int FULL = 250_000;

  @TempDir
  Path folder;

  static Stream<Arguments> texts() {
    return Stream.of(
        Arguments.of("", "gas.dispersion: missing"),
        Arguments.of("\n\n# nothing\n", "gas.dispersion: missing"),
        Arguments.of("[".repeat(10_000_000), "larger than 256 kB"),
        Arguments.of("[".repeat(FULL), "brackets nested more deeply"),
        Arguments.of("x = " + "[".repeat(FULL / 2) + "]".repeat(FULL / 2), "brackets nested more deeply"),
        Arguments.of("x = [ \"#\", " + "[".repeat(FULL / 2), "brackets nested more deeply"),
        Arguments.of("[]".repeat(FULL / 2), ":1: "),
        Arguments.of("a" + ".a".repeat(FULL / 2) + " = 1", "nested too deeply"),
        Arguments.of("[a" + ".a".repeat(FULL / 2) + "]", "nested too deeply"),
        Arguments.of("a = {" + "a = {".repeat(FULL / 5), "brackets nested more deeply"),
        Arguments.of("a".repeat(FULL) + " = 1", "unknown key"),
        Arguments.of("x = \"\"\"" + "y".repeat(FULL), ":1: "),
        Arguments.of("x = " + "9".repeat(FULL), ":1: "),
        Arguments.of("x = 0." + "9".repeat(FULL), "x: unknown key"),
        Arguments.of("[gas]\n".repeat(FULL / 6), ":2: "),
        Arguments.of("x = 1\n".repeat(FULL / 6), ":2: "),
        Arguments.of("[[gravity]]\nlaw=\"tanh\"\n".repeat(FULL / 23), "10869 keys; a model has at most 1000"),
        Arguments.of("x = [" + "1,".repeat(FULL / 2 - 4) + "1]", "x: unknown key"),
        Arguments.of("x = [" + "{},".repeat(FULL / 3 - 4) + "{}]", "83330 keys; a model has at most 1000"),
        Arguments.of("=".repeat(FULL), ":1: "), Arguments.of("\"".repeat(FULL), ":1: "),
        Arguments.of("\\".repeat(FULL), ":1: "), Arguments.of("'''".repeat(FULL / 3), ":1: "),
        Arguments.of("\r".repeat(FULL), ":"),
        Arguments.of("gas = 1\n" + PLAIN, ":3: "),
        Arguments.of(PLAIN + "[gas]\n", ":11: "),
        Arguments.of(PLAIN.replace("law =", "law = \"tanh\"\nlaw ="), ":9: "),
        Arguments.of("\"gas.dispersion\" = \"7 km/s\"\n" + PLAIN, "\"gas.dispersion\": unknown key"),
        Arguments.of("\"a\\nb\\u001b[31m\" = 1\n" + PLAIN, "unknown key"),
        Arguments.of(PLAIN.replace("tanh", "a\\nb\\u001b[2J"), "gravity.law: found"),
        Arguments.of(PLAIN.replace("6.4 km/s", "6.4 km/s\\u0000"), "gas.dispersion: "),
        Arguments.of(PLAIN.replace("law = \"tanh\"", "law = \"table\"\nfile = \"a\\u0000b\"")
            .replaceAll("(?m)^(strength|height).*\n", ""), "gravity.file: "));
  }

  @ParameterizedTest
  @MethodSource("texts")
  void textsThatAreNoModel(String text, String message) throws IOException {
    Reading reading = read(text.getBytes(StandardCharsets.UTF_8));
    assertThat(reading.model()).isEmpty();
    assertThat(reading.faults()).hasSizeBetween(1, 100);
    assertThat(messages(reading)).contains(message);
    assertThat(reading.faults()).allSatisfy(fault -> assertThat(fault.toString()).hasSizeLessThan(600)
        .doesNotContainPattern("\\p{Cntrl}"));
  }

  private Reading read(byte[] bytes) throws IOException {
    Path file = folder.resolve("m.toml");
    Files.write(file, bytes);
    return ModelReader.read(file, List.of(), 1e-8);
  }

  @ParameterizedTest
  @CsvSource({"UTF-16", "UTF-16LE", "UTF-16BE", "UTF-32", "ISO-8859-1"})
  void otherEncodings(String encoding) throws IOException {
    Reading reading = read(("# Ångström\n" + PLAIN).getBytes(Charset.forName(encoding)));
    assertThat(messages(reading)).endsWith("m.toml: not UTF-8 text; save the model as UTF-8");
  }

  @Test
  void aByteOrderMarkDoesNoHarm() throws IOException {
    assertThat(read(("\ufeff" + PLAIN).getBytes(StandardCharsets.UTF_8)).model()).isPresent();
    assertThat(read(PLAIN.replace("\n", "\r\n").getBytes(StandardCharsets.UTF_8)).model()).isPresent();
  }

  @Test
  void filesThatCannotBeRead() {
    assertThatThrownBy(() -> ModelReader.read(folder, List.of(), 1e-8))
        .isInstanceOf(UnreadableFileException.class).hasMessageEndingWith("is a directory; give a file");
    assertThatThrownBy(() -> ModelReader.read(folder.resolve("none.toml"), List.of(), 1e-8))
        .isInstanceOf(UnreadableFileException.class).hasMessageEndingWith("none.toml does not exist");
  }

  static List<String> keys() {
    return Schema.all().stream().map(spec -> spec.key().replace("gravity.#", "gravity").replace("#", "1")).toList();
  }

  /** Each key with values of every type, laid over two models: a model or faults, and nothing else. */
  @ParameterizedTest
  @MethodSource("keys")
  void valuesOfEveryType(String key) {
    String[] values = {"1", "-1", "0", "1.5", "inf", "nan", "true", "2026-12-01", "\"\"", "\"x\"", "\"1 pc\"", "1 km/s",
        "1 cm^-3", "1 scale-heights", "[]", "[1]", "[[1]]", "[{}]", "[{a = 1}, 2]", "{}", "{value = \"1 pc\"}",
        "{low = 1, high = 2}", "{low = \"1 pc\", high = \"2 pc\"}", "{value = [], normal = {}}", "{a.b.c = 1}",
        "{value = {value = 1}}", "balance", "table", "infinite", "arm-width", "full"};
    String[] models = {PLAIN, ShippedModels.text("thick-disk-near-the-sun")};
    for (String model : models) {
      for (String value : values) {
        Reading reading = ModelTexts.read(model, key + "=" + value);
        assertThat(reading.model().isPresent()).as("%s = %s", key, value).isEqualTo(reading.faults().isEmpty());
        assertThat(messages(reading)).doesNotContain("@");
      }
    }
  }

  /** A correct model with bytes changed, removed and doubled at random: the repetition is the seed. */
  @RepeatedTest(300)
  void damagedModels(RepetitionInfo repetition) throws IOException {
    Random random = new Random(repetition.getCurrentRepetition());
    List<String> names = ShippedModels.names();
    byte[] text = ShippedModels.text(names.get(random.nextInt(names.size()))).getBytes(StandardCharsets.UTF_8);
    String odd = "[]{}=\"'#.,\n\\0e-+_ \t";
    for (int i = 0; i <= random.nextInt(6); i++) {
      int at = random.nextInt(text.length);
      if (random.nextBoolean()) {
        text[at] = (byte) odd.charAt(random.nextInt(odd.length()));
      } else {
        System.arraycopy(text, at, text, at / 2, Math.min(40, text.length - at));
      }
    }
    Reading reading = read(text);
    assertThat(reading.model().isPresent()).isEqualTo(reading.faults().isEmpty());
  }
}
