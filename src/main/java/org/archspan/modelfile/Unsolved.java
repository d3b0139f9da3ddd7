package org.archspan.modelfile;

import java.util.List;

/** Physics that the model file can describe but this version does not solve: refused, never ignored. */
final class Unsolved {
  private static final String ALLOWED = "known, but not solved by this version; remove it";
  private static final List<String> KEYS = List.of("field.file");

  private Unsolved() {
  }

  static void refuse(Inputs inputs) {
    for (String key : KEYS) {
      if (inputs.valid(key)) {
        inputs.fault(key, "found " + inputs.shown(key), ALLOWED);
      }
    }
    inputs.text("field.shape").filter(word -> word.equals("table"))
        .ifPresent(word -> inputs.fault("field.shape", "found \"" + word + "\"", ALLOWED));
  }
}
