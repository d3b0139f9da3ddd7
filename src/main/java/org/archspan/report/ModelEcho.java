package org.archspan.report;

import java.util.Map;

/**
 * The model as it was given, for repeating the computation.
 *
 * @param source file or name
 * @param title  as given
 * @param inputs every key with its value as given, in order
 */
public record ModelEcho(String source, String title, Map<String, String> inputs) {
  Json json() {
    return new Json().put("source", source).put("title", title).put("inputs", inputs);
  }
}
