package org.archspan.modelfile;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.archspan.disk.Height;
import org.archspan.uncertainty.Uncertainty;

/** The checked values of a model by key, and the faults found so far. */
final class Inputs {
  private final String source;
  private final Map<String, Entry> entries;
  private final Map<String, Object> values = new LinkedHashMap<>();
  private final Map<String, Uncertainty> uncertainties = new LinkedHashMap<>();
  private final List<Diagnostic> faults;

  Inputs(String source, Map<String, Entry> entries, List<Diagnostic> faults) {
    this.source = source;
    this.entries = entries;
    this.faults = faults;
    ValueReader reader = new ValueReader(this);
    // densities of nuclei need the mass of each, wherever it stands
    entries.keySet().stream().filter(HydrogenMass::decidedBy).forEach(reader::read);
    entries.keySet().stream().filter(key -> !HydrogenMass.decidedBy(key)).forEach(reader::read);
  }

  private Inputs(Inputs other) {
    source = other.source;
    entries = other.entries;
    values.putAll(other.values);
    uncertainties.putAll(other.uncertainties);
    faults = new ArrayList<>();
  }

  /** The same inputs with other values (CGS) at some keys, and no faults yet. */
  Inputs with(List<String> keys, double[] numbers) {
    Inputs changed = new Inputs(this);
    for (int i = 0; i < numbers.length; i++) {
      String key = keys.get(i);
      changed.values.put(key, values.get(key) instanceof Height ? Height.centimetres(numbers[i]) : (Object) numbers[i]);
    }
    return changed;
  }

  /** The same inputs with one number times a factor (dimensionless), and no faults yet. */
  Inputs scaled(String key, double factor) {
    Inputs changed = new Inputs(this);
    changed.values.put(key, values.get(key) instanceof Height height
        ? new Height(factor * height.value(), height.inScaleHeights()) : (Object) (factor * number(key).orElseThrow()));
    return changed;
  }

  Entry entry(String key) {
    return entries.get(key);
  }

  /** What stands at a key, for messages; an uncertain value is a table. */
  String shown(String key) {
    return entries.containsKey(key) ? entries.get(key).shown() : "a table";
  }

  Map<String, Entry> entries() {
    return entries;
  }

  void put(String key, Object value) {
    values.put(key, value);
  }

  void put(String key, Uncertainty uncertainty) {
    uncertainties.put(key, uncertainty);
  }

  Map<String, Uncertainty> uncertainties() {
    return uncertainties;
  }

  List<Diagnostic> faults() {
    return faults;
  }

  /** Whether the file gives the key, well or badly. */
  boolean given(String key) {
    return entries.containsKey(key) || entries.keySet().stream().anyMatch(name -> name.startsWith(key + "."));
  }

  /** Whether the key is given and its value is allowed. */
  boolean valid(String key) {
    return values.containsKey(key);
  }

  OptionalDouble number(String key) {
    return values.get(key) instanceof Double number ? OptionalDouble.of(number) : OptionalDouble.empty();
  }

  /** The number, or NaN where it is missing or faulty (a fault has been noted then). */
  double required(String key, String why) {
    if (!given(key)) {
      missing(key, why);
    }
    return number(key).orElse(Double.NaN);
  }

  Optional<String> text(String key) {
    return values.get(key) instanceof String text ? Optional.of(text) : Optional.empty();
  }

  /** The keys that hold numbers, in the order in which they were read. */
  List<String> numericKeys() {
    return values.keySet().stream().filter(key -> !(values.get(key) instanceof String)).toList();
  }

  Optional<Height> height(String key) {
    return values.get(key) instanceof Height height ? Optional.of(height) : Optional.empty();
  }

  /** How many tables an array holds. */
  int tables(String array) {
    int count = 0;
    while (given(array + "." + (count + 1))) {
      count++;
    }
    return count;
  }

  void missing(String key, String why) {
    faults.add(new Diagnostic(source, 0, key, "missing", why));
  }

  void fault(String key, String found, String allowed) {
    Entry entry = entries.get(key);
    if (entry == null) {
      entry = entries.entrySet().stream().filter(e -> e.getKey().startsWith(key + ".")).map(Map.Entry::getValue)
          .findFirst().orElse(new Entry("", source, 0));
    }
    faults.add(new Diagnostic(entry.source(), entry.line(), key, found, allowed));
  }

  /** Notes a fault when more than one of several keys is given; names the one to use otherwise. */
  Optional<String> oneOf(String... keys) {
    List<String> given = new ArrayList<>();
    for (String key : keys) {
      if (given(key)) {
        given.add(key);
      }
    }
    if (given.size() > 1) {
      fault(given.get(1), "given beside " + given.get(0), "give one of " + String.join(", ", keys));
    }
    return given.stream().findFirst();
  }

  /** The same, but one must be there. */
  Optional<String> exactlyOneOf(String... keys) {
    Optional<String> one = oneOf(keys);
    if (one.isEmpty()) {
      missing(keys[0], keys.length == 1 ? "this key is needed" : "give one of " + String.join(", ", keys));
    }
    return one;
  }
}
