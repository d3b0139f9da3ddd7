package org.archspan.modelfile;

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
    String text = value instanceof String ? "\"" + value + "\"" : String.valueOf(value);
    return text.length() <= 60 ? text : text.substring(0, 57) + "...";
  }
}
