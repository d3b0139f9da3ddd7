package org.archspan.modelfile;

import java.util.List;
import java.util.Optional;
import org.archspan.disk.Height;
import org.archspan.uncertainty.Uncertainty;

/** Reads {@code { value, normal }}, {@code { value, factor }} and {@code { low, high }}. */
final class UncertainValue {
  static final List<String> PARTS = List.of("value", "normal", "factor", "low", "high");

  private final Inputs inputs;
  private final ValueReader reader;
  private final String key;
  private final KeySpec spec;

  UncertainValue(Inputs inputs, ValueReader reader, String key, KeySpec spec) {
    this.inputs = inputs;
    this.reader = reader;
    this.key = key;
    this.spec = spec;
  }

  void read() {
    boolean numeric = spec.kind() == KeySpec.Kind.QUANTITY || spec.kind() == KeySpec.Kind.DENSITY
        || spec.kind() == KeySpec.Kind.NUMBER || spec.kind() == KeySpec.Kind.HEIGHT;
    boolean range = has("low") && has("high") && !has("value") && !has("normal") && !has("factor");
    boolean spread = has("value") && (has("normal") != has("factor")) && !has("low") && !has("high");
    if (!numeric || !range && !spread) {
      inputs.fault(key, numeric ? "found an incomplete uncertainty" : "found a table", numeric
          ? "allowed are { value, normal }, { value, factor } and { low, high }" : "this key takes a single value");
      return;
    }
    if (range) {
      range();
    } else {
      spread();
    }
  }

  private boolean has(String part) {
    return inputs.entry(key + "." + part) != null;
  }

  private void range() {
    Optional<Double> low = part("low");
    Optional<Double> high = part("high");
    if (low.isPresent() && high.isPresent()) {
      if (low.get() < high.get()) {
        double middle = 0.5 * (low.get() + high.get());
        put(middle);
        inputs.put(key, uncertainty(Uncertainty.Shape.RANGE, middle, high.get() - middle));
      } else {
        inputs.fault(key + ".high", "the upper end does not exceed the lower one", "low must be less than high");
      }
    }
  }

  private void spread() {
    Optional<Double> value = part("value");
    boolean normal = has("normal");
    Optional<Double> spread = normal ? part("normal") : factor();
    if (value.isPresent() && spread.isPresent()) {
      put(value.get());
      inputs.put(key, uncertainty(normal ? Uncertainty.Shape.NORMAL : Uncertainty.Shape.FACTOR, value.get(),
          spread.get()));
    }
  }

  private Uncertainty uncertainty(Uncertainty.Shape shape, double centre, double spread) {
    return new Uncertainty(shape, centre, spread, spec.range().lowest(), spec.range().highest());
  }

  private void put(double value) {
    inputs.put(key, spec.kind() == KeySpec.Kind.HEIGHT ? Height.centimetres(value) : (Object) value);
  }

  private Optional<Double> part(String part) {
    String at = key + "." + part;
    if (spec.kind() != KeySpec.Kind.NUMBER) {
      return reader.parse(key, inputs.entry(at).value(), spec, at);
    }
    Object value = inputs.entry(at).value();
    double number = value instanceof Long whole ? whole.doubleValue() : value instanceof Double real ? real : Double.NaN;
    if (spec.range().holds(number)) {
      return Optional.of(number);
    }
    inputs.fault(at, "found " + inputs.entry(at).shown(), "allowed is a number "
        + spec.range().wordsFor(number));
    return Optional.empty();
  }

  private Optional<Double> factor() {
    Object value = inputs.entry(key + ".factor").value();
    double number = value instanceof Long whole ? whole.doubleValue() : value instanceof Double real ? real : Double.NaN;
    if (number > 1.0 && number < 1e6) {
      return Optional.of(number);
    }
    inputs.fault(key + ".factor", "found " + inputs.entry(key + ".factor").shown(), "a factor greater than 1 is needed");
    return Optional.empty();
  }
}
