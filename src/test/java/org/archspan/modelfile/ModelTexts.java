package org.archspan.modelfile;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Collectors;

/** Short models as texts, and ways to read them. */
final class ModelTexts {
  /** A correct model of one isothermal gas; its lines are numbered in the comments of the tests. */
  static final String PLAIN = """
      title = "Plain"
      [gas]
      dispersion = "6.4 km/s"
      midplane-density = "1.0 cm^-3"
      [field]
      pressure-ratio = 1.0
      [gravity]
      law = "tanh"
      strength = "2e-9 cm/s^2"
      height = "160 pc"
      """;

  private ModelTexts() {
  }

  static Reading read(String text, String... settings) {
    return read(text, Path.of("."), settings);
  }

  static Reading read(String text, Path folder, String... settings) {
    try {
      return ModelReader.read(text, "model.toml", folder, List.of(settings), 1e-8);
    } catch (IOException unreadable) {
      throw new UncheckedIOException(unreadable);
    }
  }

  static Model model(String text, String... settings) {
    Reading reading = read(text, settings);
    return reading.model().orElseThrow(() -> new AssertionError(messages(reading)));
  }

  static String messages(Reading reading) {
    return reading.faults().stream().map(Diagnostic::toString).collect(Collectors.joining("\n"));
  }

  /** The plain model with the line of one key replaced; a key it does not have is added to its table. */
  static String with(String table, String line) {
    String key = line.split("=", 2)[0].strip();
    StringBuilder text = new StringBuilder();
    String current = "";
    boolean seen = false;
    for (String old : PLAIN.lines().toList()) {
      current = old.startsWith("[") ? old.replaceAll("[\\[\\]]", "") : current;
      boolean same = current.equals(table) && old.split("=", 2)[0].strip().equals(key);
      text.append(same ? line : old).append('\n');
      seen |= same;
    }
    String header = "[" + table + "]\n";
    if (seen) {
      return text.toString();
    }
    return text.indexOf(header) >= 0 ? text.toString().replace(header, header + line + "\n")
        : text + header + line + "\n";
  }

  static String lines(String... lines) {
    return Arrays.stream(lines).collect(Collectors.joining("\n", "", "\n"));
  }
}
