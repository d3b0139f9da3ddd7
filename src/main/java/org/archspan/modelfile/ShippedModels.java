package org.archspan.modelfile;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** The models that ship with the program. */
public final class ShippedModels {
  private static final List<String> NAMES = List.of("thick-disk-near-the-sun", "solar-neighbourhood",
      "uniform-gravity-atmosphere", "stellar-sheet", "galactic-centre-ring", "outer-disk", "starburst", "tanh-halo",
      "stable-disk", "solar-flux-sheet", "cool-star-flux-sheet", "half-space-field",
      "uncertain-disk", "gas-and-stars-with-shell");

  private ShippedModels() {
  }

  /** Their names. */
  public static List<String> names() {
    return NAMES;
  }

  /** The text of one. */
  public static String text(String name) {
    if (!NAMES.contains(name)) {
      throw new IllegalArgumentException("no model \"" + name + "\" ships; there are " + String.join(", ", NAMES));
    }
    try (InputStream stream = ShippedModels.class.getResourceAsStream("/models/" + name + ".toml")) {
      return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException broken) {
      throw new UncheckedIOException("the program's own model " + name + " cannot be read", broken);
    }
  }

  /** The title of one. */
  public static String title(String name) {
    return text(name).lines().filter(line -> line.startsWith("title"))
        .map(line -> line.replaceFirst("title\\s*=\\s*\"", "").replaceFirst("\"\\s*$", "")).findFirst().orElse(name);
  }
}
