package org.archspan.modelfile;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Pattern;
import org.tomlj.Toml;
import org.tomlj.TomlArray;
import org.tomlj.TomlParseError;
import org.tomlj.TomlParseResult;
import org.tomlj.TomlTable;

/** Flattens a TOML document into dotted keys; tables in arrays are numbered from 1. */
final class TomlLeaves {
  private static final int MOST_SYNTAX_FAULTS = 20;
  private static final int LONGEST_KEY = 60;
  private static final Pattern BARE_KEY = Pattern.compile("[A-Za-z0-9_-]+");

  private final Map<String, Entry> leaves = new LinkedHashMap<>();
  private final List<Diagnostic> faults = new ArrayList<>();
  private final String source;

  private TomlLeaves(String source) {
    this.source = source;
  }

  /** Parses a text whose size and nesting have been checked. */
  static TomlLeaves parse(String text, String source) {
    TomlLeaves result = new TomlLeaves(source);
    try {
      TomlParseResult parsed = Toml.parse(text);
      for (TomlParseError error : parsed.errors()) {
        if (result.faults.size() < MOST_SYNTAX_FAULTS) {
          result.faults.add(new Diagnostic(source, error.position().line(), "", firstLine(error.getMessage()),
              "the file must be TOML 1.0"));
        }
      }
      result.collect(parsed, "", 0);
    } catch (StackOverflowError tooDeep) {
      result.faults.add(new Diagnostic(source, 0, "", "tables are nested too deeply", "the model has three levels"));
    }
    return result;
  }

  private static String firstLine(String message) {
    String line = message.lines().findFirst().orElse("syntax error");
    return line.length() <= 160 ? line : line.substring(0, 157) + "...";
  }

  private void collect(TomlTable table, String prefix, int tableLine) {
    for (String key : table.keySet()) {
      List<String> path = List.of(key);
      int line = table.inputPositionOf(path) == null ? tableLine : table.inputPositionOf(path).line();
      collect(table.get(path), prefix + shown(key), line);
    }
  }

  /** A key in quotes stays in them when it holds a dot or the like, so that it cannot pass for a path. */
  private static String shown(String key) {
    String shortened = key.length() <= LONGEST_KEY ? key : key.substring(0, LONGEST_KEY) + "...";
    return BARE_KEY.matcher(key).matches() ? shortened : "\"" + shortened + "\"";
  }

  private void collect(Object value, String key, int line) {
    if (value instanceof TomlTable empty && empty.isEmpty()) {
      leaves.put(key, new Entry(Map.of(), source, line));
    } else if (value instanceof TomlTable inner) {
      collect(inner, key + ".", line);
    } else if (value instanceof TomlArray array && holdsTables(array)) {
      for (int i = 0; i < array.size(); i++) {
        collect((Object) array.getTable(i), key + "." + (i + 1), array.inputPositionOf(i).line());
      }
    } else {
      leaves.put(key, new Entry(value, source, line));
    }
  }

  private static boolean holdsTables(TomlArray array) {
    return !array.isEmpty() && array.toList().stream().allMatch(TomlTable.class::isInstance);
  }

  Map<String, Entry> leaves() {
    return leaves;
  }

  List<Diagnostic> faults() {
    return faults;
  }
}
