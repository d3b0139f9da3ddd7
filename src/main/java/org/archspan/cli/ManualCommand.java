package org.archspan.cli;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.archspan.table.WholeFile;
import org.archspan.table.WriteException;
import org.archspan.units.NearestName;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** The manual pages. */
@Command(name = "manual", mixinStandardHelpOptions = true,
    description = "Print a manual page for man(1): archspan manual spacing > archspan-spacing.1; without a name, that of the"
        + " whole program.")
final class ManualCommand implements Callable<Integer> {
  @Parameters(index = "0", arity = "0..1", paramLabel = "COMMAND", description = "the command to describe")
  String name;

  @Option(names = "--folder", paramLabel = "DIR", description = "write the pages of all commands into this folder")
  Path folder;

  @Spec
  CommandSpec spec;

  @Override
  public Integer call() throws WriteException {
    if (folder != null) {
      writeAll();
      return ExitStatus.SOLVED;
    }
    CommandLine program = Main.commandLine();
    CommandLine described = name == null ? program : Optional.ofNullable(program.getSubcommands().get(name))
        .orElseThrow(() -> new ParameterException(spec.commandLine(), "no command \"" + name + "\"" + NearestName.of(name,
            program.getSubcommands().keySet().stream().toList()).map(near -> "; did you mean " + near + "?").orElse("")));
    spec.commandLine().getOut().print(new ManualPage(described.getCommandSpec()).text());
    spec.commandLine().getOut().flush();
    return ExitStatus.SOLVED;
  }

  private void writeAll() throws WriteException {
    CommandLine program = Main.commandLine();
    write(program);
    for (CommandLine command : program.getSubcommands().values()) {
      write(command);
    }
  }

  private void write(CommandLine command) throws WriteException {
    Path file = folder.resolve(command.getCommandSpec().qualifiedName("-") + ".1");
    WholeFile.write(file, new ManualPage(command.getCommandSpec()).text().getBytes(StandardCharsets.UTF_8), true);
  }
}
