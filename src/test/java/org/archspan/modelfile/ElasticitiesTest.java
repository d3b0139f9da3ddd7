package org.archspan.modelfile;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.function.ToDoubleFunction;
import org.archspan.spacing.BranchPeak;
import org.archspan.spacing.Elasticities;
import org.archspan.spacing.ElasticityStudy;
import org.archspan.spacing.ModelInput;
import org.archspan.spacing.SpacingResult;
import org.archspan.spacing.SpacingStudy;
import org.archspan.stability.PeakElasticity;
import org.archspan.units.Dimension;
import org.archspan.units.UnitException;
import org.archspan.units.UnitParser;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Elasticities against peaks that are solved again, and against what dimensional analysis demands of their sums. */
class ElasticitiesTest {
  /** Inputs with a mass, while the constant of gravity stands still: only scalings with L^3 = M T^2 are allowed. */
  private static final List<String> MASSIVE = List.of("gravity.mass", "gravity.surface-density");

  static List<String> modelsWithPeak() {
    return ShippedModels.names().stream()
        .filter(name -> !List.of("stable-disk", "tanh-halo", "half-space-field").contains(name)).toList();
  }

  private static SpacingResult solve(Model model, ModelInput.Scaled scaled) {
    return new SpacingStudy(scaled.disk().withoutRotation(), scaled.options(), model.arm()).solve();
  }

  private static SpacingResult solve(Model model) {
    return solve(model, new ModelInput.Scaled(model.disk(), model.options()));
  }

  private static Elasticities elasticities(Model model, SpacingResult result) {
    return new ElasticityStudy(model.disk(), model.options(), result).of(model.numbers());
  }

  @ParameterizedTest
  @MethodSource("modelsWithPeak")
  void agreeWithPeaksSolvedAgain(String name) {
    Model model = ModelTexts.model(ShippedModels.text(name));
    SpacingResult result = solve(model);
    Elasticities answers = elasticities(model, result);
    assertThat(answers.inputs()).hasSameSizeAs(model.numbers()).isNotEmpty();
    for (int i = 0; i < model.numbers().size(); i++) {
      PeakElasticity value = answers.inputs().get(i).value().orElseThrow();
      double step = 1e-3;
      BranchPeak more = again(model, model.numbers().get(i), 1.0 + step, result.spacingPeak().orElseThrow());
      BranchPeak less = again(model, model.numbers().get(i), 1.0 - step, result.spacingPeak().orElseThrow());
      // differences of second order: step^2 times a third derivative, which for the layers of the flux sheets is some 10
      assertThat(value.growthRate()).as("growth rate by %s", model.numbers().get(i).key())
          .isCloseTo(Math.log(more.growthRate() / less.growthRate()) / (2.0 * step), within(5e-5));
      assertThat(value.wavelength()).as("wavelength by %s", model.numbers().get(i).key())
          .isCloseTo(Math.log(more.wavelength() / less.wavelength()) / (2.0 * step), within(5e-5));
      // what a mesh that was made for growth rates to 1e-8 leaves of their derivatives
      assertThat(value.growthRateError()).isLessThan(1e-6);
      assertThat(value.wavelengthError()).isLessThan(1e-6);
    }
  }

  private static BranchPeak again(Model model, ModelInput input, double factor, BranchPeak peak) {
    return solve(model, input.scaled().apply(factor)).branches().stream()
        .filter(other -> other.parity() == peak.parity() && other.order() == peak.order()).findFirst().orElseThrow();
  }

  /** Buckingham (1914), Phys. Rev. 4, 345: what has dimensions follows when all inputs change their units together. */
  @ParameterizedTest
  @MethodSource("modelsWithPeak")
  void addUpAsDimensionsDemand(String name) {
    Model model = ModelTexts.model(ShippedModels.text(name));
    Elasticities answers = elasticities(model, solve(model));
    boolean fixedConstant = model.numbers().stream().anyMatch(input -> MASSIVE.stream().anyMatch(
        mass -> Schema.pattern(input.key()).replace(".#", "").equals(mass)))
        || !model.disk().selfGravity().equals(org.archspan.disk.SelfGravity.OFF);
    List<double[]> scalings = new ArrayList<>();
    // powers of length, mass, time
    scalings.add(new double[] {2.0, 6.0, 0.0});
    scalings.add(new double[] {0.0, -2.0, 1.0});
    if (!fixedConstant) {
      scalings.add(new double[] {0.0, 1.0, 0.0});
    }
    for (double[] scaling : scalings) {
      // the errors that the elasticities state of themselves, all in the worst direction, and rounding
      assertThat(sum(model, answers, scaling, PeakElasticity::growthRate)).isCloseTo(-scaling[2],
          within(1e-10 + worst(model, answers, scaling, PeakElasticity::growthRateError)));
      assertThat(sum(model, answers, scaling, PeakElasticity::wavelength)).isCloseTo(scaling[0],
          within(1e-9 + worst(model, answers, scaling, PeakElasticity::wavelengthError)));
    }
  }

  private static double sum(Model model, Elasticities answers, double[] scaling, ToDoubleFunction<PeakElasticity> part) {
    double sum = 0.0;
    for (Elasticities.Elasticity input : answers.inputs()) {
      sum += power(model, input.key(), scaling) * part.applyAsDouble(input.value().orElseThrow());
    }
    return sum;
  }

  private static double worst(Model model, Elasticities answers, double[] scaling,
      ToDoubleFunction<PeakElasticity> error) {
    double sum = 0.0;
    for (Elasticities.Elasticity input : answers.inputs()) {
      sum += Math.abs(power(model, input.key(), scaling)) * error.applyAsDouble(input.value().orElseThrow());
    }
    return sum;
  }

  /** The power of an input under a scaling; kelvins scale like squared speeds, numbers of scale heights not at all. */
  private static double power(Model model, String key, double[] scaling) {
    KeySpec spec = Schema.of(key).orElseThrow();
    if (model.inputs().getOrDefault(key, "").contains("scale-heights")) {
      return 0.0;
    }
    Dimension dimension;
    try {
      dimension = spec.kind() == KeySpec.Kind.DENSITY ? UnitParser.parse("g/cm^3").dimension()
          : spec.unit().isEmpty() ? Dimension.NONE : UnitParser.parse(spec.unit()).dimension();
    } catch (UnitException impossible) {
      throw new AssertionError(impossible);
    }
    double speedSquared = 2.0 * scaling[0] - 2.0 * scaling[2];
    return 0.5 * (dimension.length() * scaling[0] + dimension.mass() * scaling[1] + dimension.time() * scaling[2]
        + dimension.temperature() * speedSquared);
  }

  /** In uniform gravity lengths go as c^2/g, times as c/g: with a lid in scale heights nothing else has dimensions. */
  @Test
  void uniformGravityScalesByItsOnlyLengthAndTime() {
    Model model = ModelTexts.model(ShippedModels.text("uniform-gravity-atmosphere"), "domain.top=10 scale-heights");
    Elasticities answers = elasticities(model, solve(model));
    Map<String, double[]> expected =
        Map.of("gas.dispersion", new double[] {-1.0, 2.0}, "gravity.strength", new double[] {1.0, -1.0});
    for (Elasticities.Elasticity input : answers.inputs()) {
      double[] exact = expected.get(input.key());
      if (exact != null) {
        PeakElasticity value = input.value().orElseThrow();
        // five times the stated errors, and the rounding of the peak itself
        assertThat(value.growthRate()).isCloseTo(exact[0], within(5.0 * value.growthRateError() + 1e-11));
        assertThat(value.wavelength()).isCloseTo(exact[1], within(5.0 * value.wavelengthError() + 1e-9));
      }
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"stable-disk", "tanh-halo", "half-space-field"})
  void whereThereIsNoPeakItIsSaid(String name) {
    Model model = ModelTexts.model(ShippedModels.text(name));
    Elasticities answers = elasticities(model, solve(model));
    assertThat(answers.inputs()).isEmpty();
    assertThat(answers.remark()).endsWith(".");
  }

  /** An ideal gas that cools cannot have an index below 1: no difference to both sides. */
  @Test
  void anInputAtItsLimitIsLeftOutWithTheReason() {
    Model model = ModelTexts.model(ShippedModels.text("uniform-gravity-atmosphere"), "gas.adiabatic-index=1",
        "gas.cooling-time=10 Myr");
    Elasticities answers = elasticities(model, solve(model));
    Elasticities.Elasticity index = answers.inputs().stream()
        .filter(input -> input.key().equals("gas.adiabatic-index")).findFirst().orElseThrow();
    assertThat(index.value()).isEmpty();
    assertThat(index.why()).contains("cannot be changed both ways").contains("gas.adiabatic-index");
  }
}
