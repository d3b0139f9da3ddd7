package org.archspan.modelfile;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.archspan.gravity.GravityLaw;

/** Reads a model file, strictly: everything that is wrong is said at once, and nothing is guessed. */
public final class ModelReader {
  /** More than any model has; messages about each of them would help nobody. */
  private static final int MOST_KEYS = 1000;

  private ModelReader() {
  }

  /**
   * Reads a file.
   *
   * @param file      the model
   * @param settings  {@code KEY=VALUE} to lay over it
   * @param tolerance relative error asked of growth rates, dimensionless
   * @throws UnreadableFileException when the file, or a table it names, cannot be read at all
   */
  public static Reading read(Path file, List<String> settings, double tolerance) throws UnreadableFileException {
    Optional<byte[]> bytes = SourceText.bytes(file, SourceText.LARGEST_MODEL);
    if (bytes.isEmpty()) {
      return refused(file.toString(), 0, "larger than " + SourceText.LARGEST_MODEL / 1024 + " kB",
          "a model is a short text");
    }
    Optional<String> text = SourceText.text(bytes.get());
    if (text.isEmpty()) {
      return refused(file.toString(), 0, "not UTF-8 text", "save the model as UTF-8");
    }
    Path folder = file.toAbsolutePath().getParent();
    return read(text.get(), file.toString(), folder, settings, tolerance);
  }

  /**
   * Reads a text.
   *
   * @param text      TOML
   * @param source    what to call it in messages
   * @param folder    where tables it names lie
   * @param settings  {@code KEY=VALUE} to lay over it
   * @param tolerance relative error asked of growth rates, dimensionless
   * @throws UnreadableFileException when a table it names cannot be read at all
   */
  public static Reading read(String text, String source, Path folder, List<String> settings, double tolerance)
      throws UnreadableFileException {
    int overnested = SourceText.overnestedLine(text);
    if (overnested > 0) {
      return refused(source, overnested, "brackets nested more deeply than any model", "the model has three levels");
    }
    TomlLeaves leaves = TomlLeaves.parse(text, source);
    if (leaves.leaves().size() > MOST_KEYS) {
      return refused(source, 0, leaves.leaves().size() + " keys", "a model has at most " + MOST_KEYS);
    }
    List<Diagnostic> faults = new ArrayList<>(leaves.faults());
    if (!faults.isEmpty()) {
      return new Reading(Optional.empty(), List.copyOf(faults));
    }
    Map<String, Entry> entries = new LinkedHashMap<>(leaves.leaves());
    new Overrides(entries, faults).apply(settings);
    new ArrayNumbers(entries, faults).check();
    Inputs inputs = new Inputs(source, entries, faults);
    Model model = model(inputs, source, folder, tolerance);
    return faults.isEmpty() ? new Reading(Optional.of(model), List.of())
        : new Reading(Optional.empty(), inFileOrder(faults));
  }

  private static Reading refused(String source, int line, String found, String allowed) {
    return new Reading(Optional.empty(), List.of(new Diagnostic(source, line, "", found, allowed)));
  }

  private static List<Diagnostic> inFileOrder(List<Diagnostic> faults) {
    return faults.stream().distinct().sorted(java.util.Comparator.comparingInt(Diagnostic::line)).toList();
  }

  private static Model model(Inputs inputs, String source, Path folder, double tolerance)
      throws UnreadableFileException {
    Unsolved.refuse(inputs);
    List<GravityLaw> gravity = new GravityReader(inputs, folder).laws();
    DrawnModel central = DrawnModel.of(inputs, gravity, tolerance);
    Map<String, String> given = new LinkedHashMap<>();
    inputs.entries().forEach((key, entry) -> given.put(key, String.valueOf(entry.value())));
    return new Model(source, inputs.text("title").orElse(source), central.disk(), central.options(), central.arm(),
        new RivalReader(inputs).read(gravity), new SurroundingsReader(inputs).units(), given, inputs.uncertainties(),
        new UncertainModel(inputs, folder, gravity, tolerance),
        new ModelInputs(inputs, folder, gravity, tolerance).list());
  }
}
