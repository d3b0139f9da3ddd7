package org.archspan.modelfile;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import org.archspan.closure.GasClosure;
import org.archspan.disk.Gas;
import org.archspan.disk.GasComponent;
import org.archspan.disk.GasLayer;
import org.archspan.disk.GasStratum;
import org.archspan.disk.SelfGravity;
import org.archspan.units.Constants;

/** Makes the gas of a model. */
final class GasReader {
  private static final String COMPONENT = "gas.component";
  private static final String STRATUM = "gas.stratum";
  private static final String LAYER = "gas.layer";
  private final Inputs inputs;

  GasReader(Inputs inputs) {
    this.inputs = inputs;
  }

  GasClosure closure() {
    double index = inputs.number("gas.adiabatic-index").orElse(1.0);
    double coolingTime = inputs.number("gas.cooling-time").orElse(Double.POSITIVE_INFINITY);
    if (Double.isFinite(coolingTime) && index < 1.0) {
      inputs.fault("gas.cooling-time", "given with gas.adiabatic-index " + index,
          "a gas that cools needs an adiabatic index of at least 1");
      return new GasClosure(index);
    }
    return new GasClosure(index, coolingTime);
  }

  SelfGravity selfGravity() {
    return inputs.text("gas.self-gravity").map(word -> SelfGravity.valueOf(word.toUpperCase(Locale.ROOT)))
        .orElse(SelfGravity.OFF);
  }

  Gas gas() {
    int components = inputs.tables(COMPONENT);
    int strata = inputs.tables(STRATUM);
    int layers = inputs.tables(LAYER);
    if (layers > 0 && components + strata > 0) {
      inputs.fault(LAYER + ".1", "given beside components or strata", "give layers, or components, or strata");
    }
    if (components > 0 && strata > 0) {
      inputs.fault(STRATUM + ".1", "given beside " + COMPONENT, "give either components or strata");
    }
    if (layers > 0) {
      refuseBeside(LAYER, "gas.dispersion", "gas.temperature");
      return layered(layers);
    }
    if (strata > 0) {
      return stratified(strata);
    }
    if (components > 0) {
      refuseBeside(COMPONENT, "gas.dispersion", "gas.temperature", "gas.midplane-density", "gas.surface-density");
      return components(components);
    }
    return isothermal();
  }

  private void refuseBeside(String array, String... keys) {
    for (String key : keys) {
      if (inputs.given(key)) {
        inputs.fault(key, "given beside " + array, "remove one of them");
      }
    }
  }

  private Gas isothermal() {
    double dispersion = dispersion(true).orElse(Double.NaN);
    inputs.exactlyOneOf("gas.midplane-density", "gas.surface-density");
    return new Gas.Isothermal(dispersion, inputs.number("gas.midplane-density"),
        inputs.number("gas.surface-density"));
  }

  /** From the dispersion, or from temperature and mean molecular weight: c^2 = k T/(mu m_u). */
  private OptionalDouble dispersion(boolean needed) {
    if (needed) {
      inputs.exactlyOneOf("gas.dispersion", "gas.temperature");
    } else {
      inputs.oneOf("gas.dispersion", "gas.temperature");
    }
    if (!inputs.given("gas.temperature") && inputs.given("gas.mean-molecular-weight")) {
      inputs.fault("gas.mean-molecular-weight", "given without gas.temperature", "remove it, or give a temperature");
    }
    if (inputs.given("gas.dispersion") || !inputs.given("gas.temperature")) {
      return inputs.number("gas.dispersion");
    }
    double weight = inputs.required("gas.mean-molecular-weight",
        "a temperature becomes a speed only with gas.mean-molecular-weight");
    OptionalDouble temperature = inputs.number("gas.temperature");
    return temperature.isPresent() ? OptionalDouble.of(Math.sqrt(
        Constants.BOLTZMANN_CONSTANT * temperature.getAsDouble() / (weight * Constants.ATOMIC_MASS)))
        : OptionalDouble.empty();
  }

  private Gas components(int count) {
    List<GasComponent> components = new ArrayList<>();
    for (int i = 1; i <= count; i++) {
      String table = COMPONENT + "." + i;
      components.add(new GasComponent(inputs.text(table + ".name").orElse("component " + i),
          inputs.required(table + ".dispersion", "each component needs one"),
          inputs.required(table + ".midplane-density", "each component needs one")));
    }
    return new Gas.Components(List.copyOf(components));
  }

  private Gas stratified(int count) {
    refuseBeside(STRATUM, "gas.midplane-density", "gas.surface-density");
    List<GasStratum> strata = new ArrayList<>();
    for (int i = 1; i <= count; i++) {
      String table = STRATUM + "." + i;
      if (!inputs.given(table + ".shape")) {
        inputs.missing(table + ".shape", "each stratum needs one");
      }
      String shape = inputs.text(table + ".shape").orElse("gaussian").toUpperCase(Locale.ROOT);
      strata.add(new GasStratum(GasStratum.Shape.valueOf(shape),
          inputs.required(table + ".midplane-density", "each stratum needs one"),
          inputs.required(table + ".height", "each stratum needs one")));
    }
    return new Gas.Stratified(List.copyOf(strata), dispersion(false));
  }

  private Gas layered(int count) {
    inputs.exactlyOneOf("gas.midplane-density", "gas.surface-density");
    List<GasLayer> layers = new ArrayList<>();
    for (int i = 1; i <= count; i++) {
      layers.add(layer(LAYER + "." + i, layers));
    }
    return new Gas.Layered(List.copyOf(layers), inputs.number("gas.midplane-density"),
        inputs.number("gas.surface-density"));
  }

  /** The lowest layer needs neither a lower end nor a blend; each other begins above the one below. */
  private GasLayer layer(String table, List<GasLayer> below) {
    double speed = layerSpeed(table);
    if (below.isEmpty()) {
      if (inputs.given(table + ".blend")) {
        inputs.fault(table + ".blend", "given for the lowest layer", "it has no layer below to blend into; remove it");
      }
      return new GasLayer(inputs.number(table + ".from").orElse(0.0), speed * speed, 1.0);
    }
    double from = inputs.required(table + ".from", "a layer above another begins somewhere");
    double blend = inputs.required(table + ".blend", "the half-width of the change from the layer below");
    boolean first = below.size() == 1 && !inputs.given(LAYER + ".1.from");
    if (!first && from <= below.get(below.size() - 1).from()) {
      inputs.fault(table + ".from", "found " + inputs.shown(table + ".from"),
          "layers are listed from below: it must exceed that of the layer before");
    }
    return new GasLayer(from, speed * speed, blend);
  }

  private double layerSpeed(String table) {
    inputs.exactlyOneOf(table + ".temperature", table + ".dispersion");
    if (!inputs.given(table + ".temperature")) {
      return inputs.number(table + ".dispersion").orElse(Double.NaN);
    }
    double weight = inputs.required("gas.mean-molecular-weight",
        "a temperature becomes a speed only with gas.mean-molecular-weight");
    return Math.sqrt(Constants.BOLTZMANN_CONSTANT * inputs.number(table + ".temperature").orElse(Double.NaN)
        / (weight * Constants.ATOMIC_MASS));
  }
}
