package org.archspan.report;

import static org.assertj.core.api.Assertions.assertThat;

import com.google.gson.GsonBuilder;
import com.google.gson.JsonArray;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonParser;
import com.google.gson.JsonPrimitive;
import java.io.IOException;
import java.math.BigDecimal;
import java.math.MathContext;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.archspan.boundary.TopBoundary;
import org.archspan.closure.CosmicRayClosure;
import org.archspan.closure.GasClosure;
import org.archspan.disk.CosmicRays;
import org.archspan.disk.Disk;
import org.archspan.disk.Domain;
import org.archspan.disk.Gas;
import org.archspan.disk.Height;
import org.archspan.disk.MagneticField;
import org.archspan.gravity.GravityLaw;
import org.archspan.gravity.TanhGravity;
import org.archspan.gravity.UniformGravity;
import org.archspan.spacing.Arm;
import org.archspan.spacing.SearchOptions;
import org.archspan.spacing.SpacingResult;
import org.archspan.spacing.SpacingStudy;
import org.archspan.units.Constants;
import org.archspan.units.OutputUnits;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** What is said of a solved disk, in words and in JSON. */
class SpacingReportTest {
  private static final Path GOLDEN = Path.of("src/test/resources/golden");
  /** Estimated errors and the work spent change with the machine's rounding; all else must stay. */
  private static final Set<String> LOOSE = Set.of("relative-error", "wavelength-relative-error",
      "force-balance-residual", "factorisations", "intervals", "growth-rate-bound");
  private static final Disk TANH = disk(1.0, 1.0, new TanhGravity(2.489e-9, 160.0 * Constants.PARSEC),
      Domain.aboutMidplane(Optional.of(Height.scaleHeights(3.0)), TopBoundary.LID));
  private static final Arm ARM =
      new Arm(OptionalDouble.of(600.0 * Constants.PARSEC), OptionalDouble.of(50.0 * Constants.MEGAYEAR));
  private static final SpacingResult SOLVED = new SpacingStudy(TANH, SearchOptions.defaults(), ARM).solve();

  private static Disk disk(double ratios, double adiabaticIndex, GravityLaw gravity, Domain domain) {
    return new Disk(new Gas.Isothermal(6.4e5, OptionalDouble.of(2.343e-24), OptionalDouble.empty()),
        new GasClosure(adiabaticIndex), new MagneticField.ConstantRatio(ratios),
        new CosmicRays.PressureRatio(ratios, CosmicRayClosure.instantDiffusion()), List.of(gravity), domain);
  }

  private static String json(SpacingResult result) {
    return SpacingJson.text(new ModelEcho("by hand", "a title", Map.of("gas.dispersion", "6.4 km/s")), result,
        OutputUnits.galactic());
  }

  private static String text(Disk disk, SpacingResult result, int width) {
    return SpacingText.text("a title", disk, result, OutputUnits.galactic(), width);
  }

  @Test
  void jsonKeepsKeysAndNumbers() throws IOException {
    String found = new GsonBuilder().setPrettyPrinting().serializeNulls().create()
        .toJson(rounded(JsonParser.parseString(json(SOLVED)))) + "\n";
    compare(found, "spacing-tanh-lid.json");
  }

  /** The case that marks a branch: nothing above the disk grows faster, and an arm is given. */
  @Test
  void textKeepsItsWords() throws IOException {
    compare(text(TANH, SOLVED, 80), "spacing-tanh-lid.txt");
  }

  private static void compare(String found, String name) throws IOException {
    if (System.getenv("ARCHSPAN_RENEW_GOLDEN") != null) {
      Files.writeString(GOLDEN.resolve(name), found);
    }
    assertThat(found).isEqualTo(Files.readString(GOLDEN.resolve(name)));
  }

  @Test
  void boundIsAboveTheFastest() {
    JsonObject document = JsonParser.parseString(json(SOLVED)).getAsJsonObject();
    assertThat(value(document.getAsJsonObject("certificate"), "growth-rate-bound"))
        .isGreaterThanOrEqualTo(value(document.getAsJsonObject("fastest"), "growth-rate"));
  }

  private static double value(JsonObject object, String key) {
    return object.getAsJsonObject(key).get("value").getAsDouble();
  }

  /** Five digits: the influence of the lid is a small difference of numbers that hold to 1e-8. */
  private static JsonElement rounded(JsonElement element) {
    if (element instanceof JsonObject object) {
      JsonObject copy = new JsonObject();
      object.entrySet().forEach(entry -> copy.add(entry.getKey(),
          LOOSE.contains(entry.getKey()) ? new JsonPrimitive("loose") : rounded(entry.getValue())));
      return copy;
    }
    if (element instanceof JsonArray array) {
      JsonArray copy = new JsonArray();
      array.forEach(item -> copy.add(rounded(item)));
      return copy;
    }
    return element instanceof JsonPrimitive value && value.isNumber()
        ? new JsonPrimitive(value.getAsBigDecimal().round(new MathContext(5)).add(BigDecimal.ZERO)) : element;
  }

  /** Rows of a table keep together; everything else stays within the width. */
  @ParameterizedTest
  @ValueSource(ints = {40, 60, 80, 120})
  void sentencesWrap(int width) {
    List<String> lines = text(TANH, SOLVED, width).lines().toList();
    assertThat(lines).filteredOn(line -> !line.matches(".* (lid|disk|held by)")).allMatch(line -> line.length() <= width);
    assertThat(lines).filteredOn(line -> width >= 80).allMatch(line -> line.length() <= width);
    assertThat(lines).allMatch(line -> line.equals(line.stripTrailing()));
    assertThat(String.join(" ", lines).replaceAll("\\s+", " ")).contains("no wave with the given wavelength across the"
        + " field grows faster than", "Linear theory", "e-foldings", "of the surface density");
  }

  /**
   * With alpha = beta = 0.4 waves along the field grow below gamma = (1+alpha+beta)^2/(1+beta+3 alpha/2) = 1.62 (Parker
   * 1966), short waves across it below 1+alpha+beta = 1.8 (Newcomb 1961): between the two only the latter.
   */
  @Test
  void stableAlongTheFieldIsNotCalledStable() {
    Disk disk = disk(0.4, 1.7, new UniformGravity(2.489e-9), new Domain(Optional.of(Height.centimetres(0.0)),
        Optional.of(Height.scaleHeights(10.0)), Optional.of(TopBoundary.LID)));
    SpacingResult along = new SpacingStudy(disk, SearchOptions.defaults(), Arm.unknown()).solve();
    assertThat(along.stable()).isTrue();
    SpacingResult across = new SpacingStudy(disk, withCrossWavelength(Height.scaleHeights(1.0)), Arm.unknown()).solve();
    assertThat(across.stable()).as("the same gas with short waves across the field").isFalse();
    assertThat(text(disk, along, 200)).contains("Shorter waves across the field do grow");
    assertThat(SpacingText.sentence(along, OutputUnits.galactic())).doesNotContain("The gas is stable");
    assertThat(JsonParser.parseString(json(along)).getAsJsonObject().getAsJsonArray("warnings")).hasSize(1);
  }

  private static SearchOptions withCrossWavelength(Height crossWavelength) {
    SearchOptions usual = SearchOptions.defaults();
    return new SearchOptions(Optional.of(crossWavelength), usual.parities(), usual.shortest(), usual.longest(),
        usual.gatheringHeight(), usual.tolerance(), usual.branches());
  }
}
