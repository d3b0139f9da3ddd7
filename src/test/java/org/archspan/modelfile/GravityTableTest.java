package org.archspan.modelfile;

import static org.archspan.modelfile.ModelTexts.messages;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.archspan.gravity.GravityLaw;
import org.archspan.spacing.SpacingResult;
import org.archspan.spacing.SpacingStudy;
import org.archspan.units.Constants;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class GravityTableTest {
  private static final String MODEL = """
      [gas]
      dispersion = "6.4 km/s"
      midplane-density = "1.0 cm^-3"
      [gravity]
      law = "table"
      file = "g.csv"
      """;
  private static final double PC = Constants.PARSEC;

  @TempDir
  Path folder;

  private Reading read(String table) throws IOException {
    Files.write(folder.resolve("g.csv"), table.replace("\\n", "\n").getBytes(StandardCharsets.UTF_8));
    return ModelTexts.read(MODEL, folder);
  }

  @ParameterizedTest
  @CsvSource(delimiter = '|', quoteCharacter = '`', value = {
      "z [pc], g [cm/s^2]\\n0, 0\\n100, 1e-9\\n300, 2e-9\\n",
      "height [kpc],g_z [km^2/s^2/pc]\\n0,0\\n0.1,0.308567758\\n0.3,0.617135516\\n",
      "# a remark\\n\\nz [pc], g [cm/s^2]\\n# another\\n100, 1e-9\\n\\n300, 2e-9\\n",
      "\ufeffz [pc], g [cm/s^2]\\n100, 1e-9\\n300, 2e-9",
      "# %ECSV 1.0\\n# ---\\n# delimiter: ','\\n# datatype:\\n# - {name: z, unit: pc, datatype: float64}\\n"
          + "# - {name: g, unit: cm / s2, datatype: float64}\\n# schema: astropy-2.0\\nz,g\\n100.0,1e-9\\n300.0,2e-9\\n",
      "# %ECSV 1.0\\n# ---\\n# datatype:\\n# - {name: z, unit: pc, datatype: float64}\\n"
          + "# - {name: g, unit: cm s-2, datatype: float64}\\nz g\\n100.0 1e-9\\n300.0 2e-9\\n",
      "# %ECSV 1.0\\n# ---\\n# datatype:\\n# - {name: z, unit: pc, datatype: float64, description: 'height, above'}\\n"
          + "# - {name: g, datatype: float64, unit: cm / s**2}\\nz g\\n100.0 1e-9\\n300.0 2e-9\\n"})
  void readsTheSameTableInEveryForm(String table) throws IOException {
    Reading reading = read(table);
    assertThat(reading.faults()).isEmpty();
    GravityLaw law = reading.model().orElseThrow().disk().gravity().get(0);
    // 1e-9 of the value: the second table gives nine digits
    assertThat(law.acceleration(100.0 * PC)).isCloseTo(1e-9, within(2e-18));
    assertThat(law.acceleration(300.0 * PC)).isCloseTo(2e-9, within(2e-18));
    assertThat(law.greatestHeight()).isCloseTo(300.0 * PC, within(1e6));
  }

  @ParameterizedTest
  @CsvSource(delimiter = '|', quoteCharacter = '`', value = {
      "`` | g.csv: the table is empty; a header and at least two rows are needed",
      "# only a remark\\n | g.csv: the table is empty",
      "z [pc], g [cm/s^2]\\n | g.csv: a gravity table needs at least two heights",
      "z [pc], g [cm/s^2]\\n0, 0\\n | g.csv: a gravity table needs at least two heights",
      "z, g\\n0, 0\\n1, 1\\n | g.csv:1: \"\" is not a unit",
      "0, 0\\n1, 1\\n | g.csv:1: \"\" is not a unit",
      "z [pc]\\n0\\n1\\n | g.csv:1: found 1 columns; two are needed",
      "z [pc], g [cm/s^2], e [cm/s^2]\\n0,0,0\\n | g.csv:1: found 3 columns; two are needed",
      "g [cm/s^2], z [pc]\\n0,0\\n | g.csv:1: the unit cm/s^2 of column 1 has the wrong dimension",
      "z [pc], g [km/s]\\n0,0\\n | g.csv:1: the unit km/s of column 2 has the wrong dimension",
      "z [parsec], g [cm/s^2]\\n0,0\\n | g.csv:1: \"parsec\" is not a known unit",
      "z [pc], g [cm/s^2]\\n0, 0\\n100,\\n200, 1e-9\\n | g.csv:3: a gap in column 2; fill it or remove the row",
      "z [pc], g [cm/s^2]\\n0, 0\\n100\\n200, 1e-9\\n | g.csv:3: found 1 values; each row needs two",
      "z [pc], g [cm/s^2]\\n0, 0\\n\\n# x\\n100, --\\n200, 1e-9\\n | g.csv:5: \"--\" is not a finite number",
      "z [pc], g [cm/s^2]\\n0, 0\\n100, nan\\n200, 1e-9\\n | g.csv:3: \"nan\" is not a finite number",
      "z [pc], g [cm/s^2]\\n0, 0\\n100, NaN\\n200, 1e-9\\n | g.csv:3: \"NaN\" is not a finite number",
      "z [pc], g [cm/s^2]\\n0, 0\\n100, 1e400\\n200, 1e-9\\n | g.csv:3: \"1e400\" is not a finite number",
      "z [pc], g [cm/s^2]\\n0, 0\\n200, 1e-9\\n100, 2e-9\\n | g.csv:4: the height \"100\" does not exceed the one before",
      "z [pc], g [cm/s^2]\\n0, 0\\n200, 1e-9\\n200, 2e-9\\n | g.csv:4: the height \"200\" does not exceed the one before",
      "z [pc], g [cm/s^2]\\n-100, 0\\n200, 1e-9\\n | g.csv:2: the height \"-100\" is negative",
      "z [pc], g [cm/s^2]\\n0, 0\\n\"200, 1e-9\\n | g.csv: not a CSV table"})
  void saysWhatIsWrongWithATable(String table, String message) throws IOException {
    Reading reading = read(table == null ? "" : table);
    assertThat(reading.model()).isEmpty();
    assertThat(messages(reading)).contains(message).doesNotContain("\n");
  }

  @Test
  void tablesOfWrongSizeOrEncoding() throws IOException {
    StringBuilder rows = new StringBuilder("z [pc], g [cm/s^2]\n");
    for (int i = 0; i < 30_000; i++) {
      rows.append(i).append(",1e-9\n");
    }
    assertThat(messages(read(rows.toString()))).contains("g.csv: 30000 rows; at most 2000").doesNotContain("\n");
    assertThat(messages(read("z [pc], g [cm/s^2]\n" + "x,y\n".repeat(30_000))).lines().count()).isEqualTo(20);
    assertThat(messages(read(",".repeat(5_000_000)))).contains("found 5000001 columns").doesNotContain("\n");
    Files.write(folder.resolve("g.csv"), "z [pc], g [cm/s^2]\n0,0\n".getBytes(StandardCharsets.UTF_16));
    assertThat(messages(ModelTexts.read(MODEL, folder))).contains("g.csv: not UTF-8 text");
  }

  /** The growth of a sampled tanh law tends to that of the law itself, as the fourth power of the step. */
  @ParameterizedTest
  @CsvSource({"20, 2e-3", "80, 1e-5"})
  void aSampledLawTendsToTheLaw(int rows, double tolerance) throws IOException {
    StringBuilder table = new StringBuilder("z [pc], g [cm/s^2]\n");
    for (int i = 0; i < rows; i++) {
      double z = 2000.0 * i / (rows - 1);
      table.append(z).append(',').append(2e-9 * Math.tanh(z / 160.0)).append('\n');
    }
    Files.writeString(folder.resolve("g.csv"), table);
    SpacingResult sampled = solve(MODEL + "[field]\npressure-ratio = 1.0\n");
    SpacingResult law = solve(ModelTexts.PLAIN);
    // 1e-10: asked of every equilibrium, the kinks of a table included
    assertThat(sampled.forceBalanceResidual()).isLessThan(1e-10);
    // errors fall 250 times from 20 to 80 rows; the tolerances are four times the errors found
    double rate = law.fastest().orElseThrow().growthRate();
    assertThat(sampled.fastest().orElseThrow().growthRate()).isCloseTo(rate, within(tolerance * rate));
  }

  private SpacingResult solve(String text) {
    Reading reading = ModelTexts.read(text, folder, "domain.top=1.2 kpc", "domain.top-boundary=lid");
    Model model = reading.model().orElseThrow(() -> new AssertionError(messages(reading)));
    return new SpacingStudy(model.disk(), model.options(), model.arm()).solve();
  }

  @Test
  void tablesThatCannotBeRead() {
    assertThatThrownBy(() -> ModelReader.read(MODEL, "m.toml", folder, java.util.List.of(), 1e-8))
        .isInstanceOf(UnreadableFileException.class).hasMessageEndingWith("g.csv does not exist");
    assertThatThrownBy(() -> ModelReader.read(MODEL.replace("g.csv", "."), "m.toml", folder, java.util.List.of(), 1e-8))
        .isInstanceOf(UnreadableFileException.class).hasMessageEndingWith("is a directory; give a file");
  }
}
