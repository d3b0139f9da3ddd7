package org.archspan.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.Files;
import java.util.concurrent.Callable;
import java.util.stream.Collectors;
import org.archspan.modelfile.Diagnostic;
import org.archspan.modelfile.Model;
import org.archspan.modelfile.ModelReader;
import org.archspan.modelfile.Reading;
import org.archspan.modelfile.ShippedModels;
import org.archspan.modelfile.UnreadableFileException;
import org.archspan.report.ModelEcho;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** A command that reads a model and solves something. */
abstract class ModelCommand implements Callable<Integer> {
  @Mixin
  CommonOptions common;

  @Spec
  CommandSpec spec;

  /** Solves and prints; files go through {@link OutputFolder}. */
  abstract void solve(Model model) throws IOException;

  @Override
  public final Integer call() throws IOException {
    common.fault().ifPresent(fault -> {
      throw new ParameterException(spec.commandLine(), fault);
    });
    solve(read());
    return status();
  }

  /** The exit status once it is solved. */
  int status() {
    return ExitStatus.SOLVED;
  }

  private Model read() throws UnreadableFileException {
    if (!Files.exists(common.model) && ShippedModels.names().contains(common.model.toString())) {
      throw new UnreadableFileException(common.model + " does not exist; a model of that name ships: archspan models "
          + common.model + " --copy " + common.model + ".toml");
    }
    Reading reading = ModelReader.read(common.model, common.settings, common.tolerance);
    return reading.model().orElseThrow(() -> new ModelFault(
        reading.faults().stream().map(Diagnostic::toString).collect(Collectors.joining(System.lineSeparator()))));
  }

  /** Where results go. */
  PrintWriter out() {
    return spec.commandLine().getOut();
  }

  /** Where warnings and progress go. */
  PrintWriter err() {
    return spec.commandLine().getErr();
  }

  /** Prints the document or the summary, as asked. */
  void print(java.util.function.Supplier<String> json, java.util.function.Supplier<String> text) {
    if (common.json) {
      out().print(json.get());
    } else if (!common.quiet) {
      out().print(text.get());
    }
    out().flush();
  }

  static ModelEcho echo(Model model) {
    return new ModelEcho(model.source(), model.title(), model.inputs());
  }

  /** Columns of the terminal, for wrapping. */
  static int width() {
    try {
      return Math.max(60, Math.min(120, Integer.parseInt(System.getenv().getOrDefault("COLUMNS", "88"))));
    } catch (NumberFormatException notANumber) {
      return 88;
    }
  }
}
