package org.archspan.modelfile;

/**
 * One fault of a model, as a value.
 *
 * @param source  file, or {@code --set}
 * @param line    1 for the first; 0 where there is none
 * @param key     dotted key; empty where the fault has none
 * @param found   what stands there
 * @param allowed what may stand there, or what to do
 */
public record Diagnostic(String source, int line, String key, String found, String allowed) {
  /** One line: {@code file:line: key: found ...; allowed ...}. */
  @Override
  public String toString() {
    String place = line > 0 ? source + ":" + line : source;
    return place + ": " + (key.isEmpty() ? "" : key + ": ") + found + (allowed.isEmpty() ? "" : "; " + allowed);
  }
}
