package org.archspan.modelfile;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.archspan.gravity.GravityLaw;
import org.archspan.gravity.GravityLawKind;
import org.archspan.gravity.GravityLaws;
import org.archspan.gravity.LawInput;

/** Makes the gravity laws of a model. */
final class GravityReader {
  private final Inputs inputs;
  private final Path folder;

  GravityReader(Inputs inputs, Path folder) {
    this.inputs = inputs;
    this.folder = folder;
  }

  List<GravityLaw> laws() throws UnreadableFileException {
    int tables = inputs.tables("gravity");
    List<GravityLaw> laws = new ArrayList<>();
    if (tables == 0 && !inputs.given("gravity")) {
      if (inputs.text("gas.self-gravity").orElse("off").equals("off")) {
        inputs.missing("gravity", "give a [gravity] table with a law, or gas.self-gravity = \"equilibrium\" or \"full\"");
      }
    } else if (tables == 0) {
      law("gravity").ifPresent(laws::add);
    }
    for (int i = 1; i <= tables; i++) {
      law("gravity." + i).ifPresent(laws::add);
    }
    return List.copyOf(laws);
  }

  private Optional<GravityLaw> law(String table) throws UnreadableFileException {
    String key = table + ".law";
    if (!inputs.given(key)) {
      inputs.missing(key, "allowed are " + String.join(", ", Schema.of(key).orElseThrow().choices()));
      return Optional.empty();
    }
    Optional<String> name = inputs.text(key);
    if (name.isEmpty()) {
      return Optional.empty();
    }
    if (name.get().equals(GravityLaws.TABLE)) {
      return table(table);
    }
    return formula(table, GravityLaws.named(name.get()).orElseThrow());
  }

  private Optional<GravityLaw> formula(String table, GravityLawKind kind) {
    int faultsBefore = inputs.faults().size();
    refuseOthers(table, kind.inputs().stream().map(LawInput::key).toList(), kind.name());
    double[] values = new double[kind.inputs().size()];
    boolean complete = true;
    for (int i = 0; i < values.length; i++) {
      values[i] = inputs.required(table + "." + kind.inputs().get(i).key(),
          "the law \"" + kind.name() + "\" (" + kind.formula() + ") needs it");
      complete &= !Double.isNaN(values[i]);
    }
    return complete && inputs.faults().size() == faultsBefore ? Optional.of(kind.factory().apply(values))
        : Optional.empty();
  }

  private void refuseOthers(String table, List<String> allowed, String law) {
    for (String key : inputs.entries().keySet()) {
      String rest = key.startsWith(table + ".") ? key.substring(table.length() + 1).split("\\.", 2)[0] : "law";
      if (!rest.equals("law") && !allowed.contains(rest) && Schema.of(table + "." + rest).isPresent()) {
        inputs.fault(key, "not an input of the law \"" + law + "\"", "its inputs are " + String.join(", ", allowed));
      }
    }
  }

  private Optional<GravityLaw> table(String table) throws UnreadableFileException {
    refuseOthers(table, List.of("file"), GravityLaws.TABLE);
    String key = table + ".file";
    if (!inputs.given(key)) {
      inputs.missing(key, "the law \"table\" needs a file of height and acceleration");
    }
    Optional<String> name = inputs.text(key);
    try {
      return name.isEmpty() ? Optional.empty() : new GravityTable(inputs.faults()).read(folder.resolve(name.get()));
    } catch (InvalidPathException noPath) {
      inputs.fault(key, "found " + inputs.shown(key), "the name of a file is needed");
      return Optional.empty();
    }
  }
}
