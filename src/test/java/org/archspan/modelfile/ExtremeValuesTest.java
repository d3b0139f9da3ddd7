package org.archspan.modelfile;

import static org.archspan.modelfile.ModelTexts.PLAIN;
import static org.archspan.modelfile.ModelTexts.messages;
import static org.assertj.core.api.Assertions.assertThat;

import java.util.Random;
import java.util.concurrent.TimeUnit;
import org.archspan.disk.RefusedModelException;
import org.archspan.spacing.SpacingResult;
import org.archspan.spacing.SpacingStudy;
import org.archspan.stability.UnsolvedException;
import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.RepetitionInfo;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.Timeout.ThreadMode;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Values that the reader lets pass but no astronomer would give: an answer, or a refusal in words; never a hang. */
@Timeout(value = 20, unit = TimeUnit.SECONDS, threadMode = ThreadMode.SEPARATE_THREAD)
class ExtremeValuesTest {
  private static final String[] KEYS = {"gas.dispersion=%s cm/s", "gas.midplane-density=%s g/cm^3",
      "gas.surface-density=%s g/cm^2", "gas.adiabatic-index=%s", "field.pressure-ratio=%s", "field.strength=%s G",
      "gravity.strength=%s cm/s^2", "gravity.height=%s cm", "domain.top=%s cm", "domain.bottom=%s cm",
      "cosmic-rays.pressure-ratio=%s", "cosmic-rays.pressure=%s erg/cm^3", "cosmic-rays.diffusivity=%s cm^2/s",
      "waves.shortest=%s cm", "waves.longest=%s cm", "waves.cross-wavelength=%s cm", "arm.width=%s cm"};
  private static final String[] BOUNDARIES = {"open", "lid", "free"};

  @RepeatedTest(100)
  void answersOrRefuses(RepetitionInfo repetition) {
    Random random = new Random(repetition.getCurrentRepetition());
    String key = KEYS[random.nextInt(KEYS.length)];
    String value = "1e" + (random.nextInt(124) - 62);
    String boundary = "domain.top-boundary=" + BOUNDARIES[random.nextInt(3)];
    Reading reading = ModelTexts.read(PLAIN, boundary, String.format(java.util.Locale.ROOT, key, value));
    if (reading.model().isEmpty()) {
      assertThat(messages(reading)).startsWith("--set: ");
      return;
    }
    Model model = reading.model().get();
    try {
      SpacingResult result = new SpacingStudy(model.disk(), model.options(), model.arm()).solve();
      result.fastest().ifPresent(peak -> assertThat(peak.growthRate()).isPositive().isFinite());
    } catch (RefusedModelException | UnsolvedException refusal) {
      assertThat(refusal.getMessage()).hasSizeGreaterThan(20);
    }
  }

  /** The answer depends on ratios alone: a disk a million times as dense is the same disk in other units. */
  @ParameterizedTest
  @CsvSource({"1e-55 g/cm^3", "1e-10 g/cm^3", "1e55 g/cm^3"})
  void scaledDensityChangesNothing(String density) {
    double expected = growth("gas.midplane-density=1e-24 g/cm^3");
    // 1e-7: ten times the tolerance asked for
    assertThat(growth("gas.midplane-density=" + density) / expected - 1.0).isBetween(-1e-7, 1e-7);
  }

  private static double growth(String setting) {
    Model model = ModelTexts.model(PLAIN, setting, "domain.top-boundary=lid");
    return new SpacingStudy(model.disk(), model.options(), model.arm()).solve().fastest().orElseThrow().growthRate();
  }
}
