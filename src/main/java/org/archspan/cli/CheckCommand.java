package org.archspan.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import org.archspan.modelfile.KeySpec;
import org.archspan.modelfile.ModelReader;
import org.archspan.modelfile.Reading;
import org.archspan.modelfile.Schema;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Says everything that is wrong with a model. */
@Command(name = "check", mixinStandardHelpOptions = true,
    description = "Read a model and say everything that is wrong with it, with line numbers; solve nothing.")
final class CheckCommand implements Callable<Integer> {
  @Parameters(index = "0", arity = "0..1", paramLabel = "MODEL.toml", description = "the model to read")
  Path model;

  @Option(names = "--set", paramLabel = "KEY=VALUE", description = "lay a value over the model; repeatable")
  List<String> settings = new ArrayList<>();

  @Option(names = "--keys", description = "list every key of the model file, with its unit and meaning")
  boolean keys;

  @Spec
  CommandSpec spec;

  @Override
  public Integer call() throws IOException {
    if (keys) {
      Schema.all().forEach(this::describe);
      return ExitStatus.SOLVED;
    }
    if (model == null) {
      throw new ParameterException(spec.commandLine(), "give a model, or --keys");
    }
    Reading reading = ModelReader.read(model, settings, 1e-8);
    if (reading.faults().isEmpty()) {
      spec.commandLine().getOut().println(model + ": nothing wrong found");
      return ExitStatus.SOLVED;
    }
    reading.faults().forEach(fault -> spec.commandLine().getErr().println(fault));
    return ExitStatus.MODEL;
  }

  private void describe(KeySpec key) {
    String unit = key.unit().isEmpty() ? "" : " [" + key.unit() + "]";
    String choices = key.choices().isEmpty() ? "" : " (" + String.join(" | ", key.choices()) + ")";
    spec.commandLine().getOut().println(key.key() + unit + choices + ": " + key.meaning() + "; default "
        + key.standard());
  }
}
