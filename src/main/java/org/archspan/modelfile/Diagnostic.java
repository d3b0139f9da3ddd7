package org.archspan.modelfile;

import java.util.regex.Pattern;

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
  /** Control characters and line breaks, which would let a file write to the terminal. */
  private static final Pattern INVISIBLE = Pattern.compile("[\\p{Cc}\\p{Cf}\\p{Zl}\\p{Zp}]");

  /** One line: {@code file:line: key: found ...; allowed ...}. */
  @Override
  public String toString() {
    String place = line > 0 ? source + ":" + line : source;
    String text = place + ": " + (key.isEmpty() ? "" : key + ": ") + found + (allowed.isEmpty() ? "" : "; " + allowed);
    return INVISIBLE.matcher(text).replaceAll("\ufffd");
  }
}
