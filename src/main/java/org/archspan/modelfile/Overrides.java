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
      List.of("field.pressure-ratio", "field.strength", "field.plasma-beta"),
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
    String input = inputOf(key);
    for (List<String> group : ALTERNATIVES) {
      dropOthers(group, input);
    }
    if (entries.keySet().stream().anyMatch(name -> name.startsWith("gas.stratum."))) {
      dropOthers(OF_STRATA, input);
    }
    if (!input.equals(key)) {
      makeRoom(input, key.substring(input.length() + 1));
    }
    remove(key);
    entries.putAll(leaves(key, text));
  }

  /** The input that a key belongs to: the key itself, or that of which it sets one part of an uncertain value. */
  private static String inputOf(String key) {
    int dot = key.lastIndexOf('.');
    boolean part = dot > 0 && UncertainValue.PARTS.contains(key.substring(dot + 1))
        && Schema.of(key).isEmpty() && Schema.of(key.substring(0, dot)).isPresent();
    return part ? key.substring(0, dot) : key;
  }

  private void dropOthers(List<String> group, String input) {
    if (group.contains(input)) {
      group.stream().filter(other -> !other.equals(input)).forEach(this::remove);
    }
  }

  /** A plain value becomes the middle of a spread, and gives way to the ends of a range. */
  private void makeRoom(String input, String part) {
    Entry plain = entries.remove(input);
    if (plain != null && (part.equals("normal") || part.equals("factor"))) {
      entries.put(input + ".value", plain);
    }
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
