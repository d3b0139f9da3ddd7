package org.archspan.cli;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.concurrent.Callable;
import org.archspan.modelfile.ShippedModels;
import org.archspan.table.WholeFile;
import org.archspan.units.NearestName;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** The models that ship. */
@Command(name = "models", mixinStandardHelpOptions = true,
    description = "List the models that ship, show one, or copy one as a start.")
final class ModelsCommand implements Callable<Integer> {
  @Parameters(index = "0", arity = "0..1", paramLabel = "NAME", description = "the model to show or copy")
  String name;

  @Option(names = "--copy", paramLabel = "FILE", description = "write the model to this file")
  Path copy;

  @Option(names = "--overwrite", description = "replace the file if it exists")
  boolean overwrite;

  @Spec
  CommandSpec spec;

  @Override
  public Integer call() throws IOException {
    if (name == null) {
      if (copy != null) {
        throw new ParameterException(spec.commandLine(), "--copy needs the name of a model");
      }
      int width = ShippedModels.names().stream().mapToInt(String::length).max().orElse(0);
      for (String each : ShippedModels.names()) {
        spec.commandLine().getOut().println(each + " ".repeat(width - each.length() + 2) + ShippedModels.title(each));
      }
      return ExitStatus.SOLVED;
    }
    if (!ShippedModels.names().contains(name)) {
      String hint = NearestName.of(name, ShippedModels.names()).map(near -> "; did you mean " + near + "?").orElse("");
      throw new ParameterException(spec.commandLine(), "no model \"" + name + "\" ships" + hint);
    }
    if (copy == null) {
      spec.commandLine().getOut().print(ShippedModels.text(name));
    } else {
      WholeFile.write(copy, ShippedModels.text(name).getBytes(StandardCharsets.UTF_8), overwrite);
    }
    spec.commandLine().getOut().flush();
    return ExitStatus.SOLVED;
  }
}
