package org.archspan.modelfile;

import org.tomlj.TomlArray;

/**
 * A value as a model gives it.
 *
 * @param value  String, Long, Double, Boolean, or another TOML type
 * @param source file, or {@code --set}
 * @param line   in the file; 0 for {@code --set}
 */
record Entry(Object value, String source, int line) {
  /** As a person wrote it, shortened. */
  String shown() {
    if (value instanceof TomlArray array) {
      return array.isEmpty() ? "an empty array" : "an array";
    }
    String text = value instanceof String ? "\"" + value + "\"" : String.valueOf(value);
    return text.length() <= 60 ? text : text.substring(0, 57) + "...";
  }

  /** The value with a unit added, for messages: itself where it is a number, otherwise 1. */
  String withUnit(String unit) {
    return "\"" + (value instanceof Number ? value : "1") + " " + unit + "\"";
  }
}
