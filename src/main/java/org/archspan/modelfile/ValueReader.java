package org.archspan.modelfile;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Pattern;
import org.archspan.disk.Height;
import org.archspan.units.Dimension;
import org.archspan.units.NearestName;
import org.archspan.units.Quantity;
import org.archspan.units.UnitException;
import org.archspan.units.UnitParser;

/** Reads one key after another by its specification; what does not fit becomes a fault. */
final class ValueReader {
  private static final Dimension LENGTH = new Dimension(2, 0, 0, 0);
  private static final Dimension MASS_DENSITY = new Dimension(-6, 2, 0, 0);
  private static final Dimension NUMBER_DENSITY = new Dimension(-6, 0, 0, 0);
  private static final Pattern SCALE_HEIGHTS = Pattern.compile("(.*?)\\s*scale-heights?", Pattern.DOTALL);

  private final Inputs inputs;

  ValueReader(Inputs inputs) {
    this.inputs = inputs;
  }

  /** Reads the value of a key of the file. */
  void read(String key) {
    if (inputs.entry(key).value() instanceof Map<?, ?> && Schema.isTable(key)) {
      return;
    }
    Optional<KeySpec> spec = Schema.of(key);
    if (spec.isPresent()) {
      read(key, spec.get());
      return;
    }
    int dot = key.lastIndexOf('.');
    String parent = dot < 0 ? "" : key.substring(0, dot);
    String part = key.substring(dot + 1);
    Optional<KeySpec> uncertain = Schema.of(parent);
    if (uncertain.isPresent() && UncertainValue.PARTS.contains(part)) {
      if (firstPart(parent).equals(key)) {
        new UncertainValue(inputs, this, parent, uncertain.get()).read();
      }
    } else {
      unknown(key);
    }
  }

  private String firstPart(String parent) {
    return inputs.entries().keySet().stream().filter(name -> name.startsWith(parent + ".")).findFirst().orElse("");
  }

  private void unknown(String key) {
    Optional<String> array = Schema.arrayOf(key);
    if (array.isPresent()) {
      inputs.fault(key, array.get() + " stands as a single table", "write [[" + array.get() + "]] once for each");
      return;
    }
    if (Schema.isTable(key)) {
      inputs.fault(key, "found " + inputs.entry(key).shown(), "it is a table of keys: write " + Schema.header(key));
      return;
    }
    List<String> known = Schema.all().stream().map(KeySpec::key).toList();
    String hint = NearestName.of(Schema.pattern(key), known).map(near -> "did you mean " + near.replace(".#", "") + "?")
        .orElse("see `archspan check --keys` for all keys");
    inputs.fault(key, "unknown key", hint);
  }

  private void read(String key, KeySpec spec) {
    Object value = inputs.entry(key).value();
    if (value instanceof Map<?, ?>) {
      inputs.fault(key, "found an empty table", "give it a value");
      return;
    }
    switch (spec.kind()) {
      case TEXT -> text(key, value);
      case CHOICE -> choice(key, value, spec);
      case NUMBER, INTEGER -> number(key, value, spec);
      case QUANTITY, DENSITY -> quantity(key, value, spec);
      case HEIGHT -> height(key, value, spec);
    }
  }

  private void text(String key, Object value) {
    if (value instanceof String) {
      inputs.put(key, value);
    } else {
      inputs.fault(key, "found " + inputs.entry(key).shown(), "a text in quotes is needed");
    }
  }

  private void choice(String key, Object value, KeySpec spec) {
    if (value instanceof String word && spec.choices().contains(word)) {
      inputs.put(key, word);
      return;
    }
    String hint = value instanceof String word
        ? NearestName.of(word, spec.choices()).map(near -> "; did you mean \"" + near + "\"?").orElse("") : "";
    inputs.fault(key, "found " + inputs.entry(key).shown(), "allowed are \""
        + String.join("\", \"", spec.choices()) + "\"" + hint);
  }

  private void number(String key, Object value, KeySpec spec) {
    double number = value instanceof Long whole ? whole.doubleValue() : value instanceof Double real ? real : Double.NaN;
    boolean whole = spec.kind() == KeySpec.Kind.NUMBER || number == Math.rint(number);
    if (!(value instanceof Long || value instanceof Double)) {
      inputs.fault(key, "found " + inputs.entry(key).shown(), "a number without unit is needed, "
          + spec.range().words());
    } else if (!whole || !spec.range().holds(number)) {
      inputs.fault(key, "found " + inputs.entry(key).shown(), "allowed is a "
          + (spec.kind() == KeySpec.Kind.INTEGER ? "whole " : "finite ") + "number "
          + spec.range().wordsFor(number));
    } else {
      inputs.put(key, number);
    }
  }

  private void quantity(String key, Object value, KeySpec spec) {
    if (value instanceof String word && word.equals("infinite") && spec.key().equals("cosmic-rays.diffusivity")) {
      inputs.put(key, Double.POSITIVE_INFINITY);
      return;
    }
    parse(key, value, spec, key).ifPresent(number -> inputs.put(key, number));
  }

  /** A number with unit in CGS, checked; number densities become mass densities of so many hydrogen masses later. */
  Optional<Double> parse(String key, Object value, KeySpec spec, String at) {
    if (!(value instanceof String text)) {
      inputs.fault(at, "found " + inputs.entry(at).shown(), "a unit is missing: write a string such as "
          + inputs.entry(at).withUnit(spec.unit()));
      return Optional.empty();
    }
    try {
      Quantity quantity = Quantity.parse(text);
      if (!fits(quantity.dimension(), spec)) {
        inputs.fault(at, "found \"" + text + "\", whose dimension is " + quantity.dimension(),
            "a unit such as " + spec.unit() + " is needed");
      } else if (!spec.range().holds(quantity.value())) {
        inputs.fault(at, "found \"" + text + "\"", "allowed is a value "
            + spec.range().wordsFor(quantity.value()));
      } else {
        boolean nuclei = quantity.dimension().equals(NUMBER_DENSITY) && spec.kind() == KeySpec.Kind.DENSITY;
        return Optional.of(quantity.value() * (nuclei ? HydrogenMass.perNucleus(inputs) : 1.0));
      }
    } catch (UnitException fault) {
      inputs.fault(at, fault.getMessage(), "a value with a unit such as " + spec.unit() + " is needed");
    }
    return Optional.empty();
  }

  private static boolean fits(Dimension dimension, KeySpec spec) throws UnitException {
    if (spec.kind() == KeySpec.Kind.DENSITY) {
      return dimension.equals(NUMBER_DENSITY) || dimension.equals(MASS_DENSITY);
    }
    return dimension.equals(spec.unit().isEmpty() ? Dimension.NONE : UnitParser.parse(spec.unit()).dimension());
  }

  private void height(String key, Object value, KeySpec spec) {
    if (value instanceof String word && spec.choices().contains(word)) {
      inputs.put(key, word);
    } else if (value instanceof String text && SCALE_HEIGHTS.matcher(text.strip()).matches()) {
      scaleHeights(key, text.strip(), spec);
    } else if (value instanceof String text) {
      length(key, text, spec);
    } else {
      inputs.fault(key, "found " + inputs.entry(key).shown(), "a unit is missing: write a string such as "
          + inputs.entry(key).withUnit("pc") + " or " + inputs.entry(key).withUnit("scale-heights"));
    }
  }

  private void scaleHeights(String key, String text, KeySpec spec) {
    try {
      Quantity number = Quantity.parse(SCALE_HEIGHTS.matcher(text).replaceFirst("$1"));
      if (number.dimension().equals(Dimension.NONE) && spec.range().holds(number.value())) {
        inputs.put(key, Height.scaleHeights(number.value()));
        return;
      }
    } catch (UnitException notANumber) {
      // falls through to the fault below, which shows the text
    }
    inputs.fault(key, "found \"" + text + "\"", "a number of scale heights " + spec.range().words() + " is needed");
  }

  private void length(String key, String text, KeySpec spec) {
    String words = spec.choices().isEmpty() ? "" : ", or \"" + String.join("\", \"", spec.choices()) + "\"";
    try {
      Quantity quantity = Quantity.parse(text);
      if (quantity.dimension().equals(LENGTH) && spec.range().holds(quantity.value())) {
        inputs.put(key, Height.centimetres(quantity.value()));
      } else {
        inputs.fault(key, "found \"" + text + "\"", String.format(Locale.ROOT,
            "a length %s such as \"500 pc\" or \"12 scale-heights\" is needed%s",
            spec.range().wordsFor(quantity.value()), words));
      }
    } catch (UnitException fault) {
      inputs.fault(key, fault.getMessage(), "a length such as \"500 pc\" or \"12 scale-heights\" is needed" + words);
    }
  }
}
