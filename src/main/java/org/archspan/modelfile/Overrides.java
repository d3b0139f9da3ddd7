package org.archspan.modelfile;

import java.util.List;
import java.util.Map;
import org.tomlj.Toml;
import org.tomlj.TomlParseResult;

/** Lays {@code --set KEY=VALUE} over the values of a file. */
final class Overrides {
  private static final String SOURCE = "--set";
  /** Choosing one of these drops the others. */
  private static final List<List<String>> ALTERNATIVES = List.of(
      List.of("gas.dispersion", "gas.temperature"), List.of("gas.midplane-density", "gas.surface-density"),
      List.of("field.pressure-ratio", "field.strength"),
      List.of("cosmic-rays.pressure-ratio", "cosmic-rays.pressure"));

  /** The same, where strata are given: the force balance makes either of these from the other. */
  private static final List<String> OF_STRATA = List.of("gas.dispersion", "gas.temperature", "field.strength");

  private final Map<String, Entry> entries;
  private final List<Diagnostic> faults;

  Overrides(Map<String, Entry> entries, List<Diagnostic> faults) {
    this.entries = entries;
    this.faults = faults;
  }

  void apply(List<String> settings) {
    for (String setting : settings) {
      int equals = setting.indexOf('=');
      String key = equals < 0 ? setting.strip() : setting.substring(0, equals).strip();
      if (equals <= 0 || key.isEmpty() || key.length() > 200) {
        faults.add(new Diagnostic(SOURCE, 0, key.length() > 60 ? "" : key, "found no KEY=VALUE",
            "write --set gas.dispersion=7km/s"));
      } else {
        set(key, setting.substring(equals + 1).strip());
      }
    }
  }

  private void set(String key, String text) {
    for (List<String> group : ALTERNATIVES) {
      if (group.contains(key)) {
        group.forEach(this::remove);
      }
    }
    if (OF_STRATA.contains(key) && entries.keySet().stream().anyMatch(name -> name.startsWith("gas.stratum."))) {
      OF_STRATA.forEach(this::remove);
    }
    remove(key);
    entries.putAll(leaves(key, text));
  }

  private void remove(String key) {
    entries.keySet().removeIf(name -> name.equals(key) || name.startsWith(key + "."));
  }

  /** The text as a TOML value where it is one, otherwise as a string. */
  private static Map<String, Entry> leaves(String key, String text) {
    if (text.length() < 500 && SourceText.overnestedLine(text) == 0) {
      TomlParseResult parsed = Toml.parse("x = " + text.replace('\n', ' '));
      if (!parsed.hasErrors() && parsed.get("x") != null && parsed.keySet().size() == 1) {
        TomlLeaves inner = TomlLeaves.parse("x = " + text.replace('\n', ' '), SOURCE);
        Map<String, Entry> leaves = new java.util.LinkedHashMap<>();
        inner.leaves().forEach((name, entry) -> leaves.put(key + name.substring(1), new Entry(entry.value(), SOURCE, 0)));
        return leaves;
      }
    }
    return Map.of(key, new Entry(text, SOURCE, 0));
  }
}
