package org.archspan.cli;

import java.util.concurrent.Callable;
import picocli.AutoComplete;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;

/** Completion of commands and options in a shell. */
@Command(name = "completion", mixinStandardHelpOptions = true,
    description = "Print a script that lets bash and zsh complete commands and options: source <(archspan completion).")
final class CompletionCommand implements Callable<Integer> {
  @Spec
  CommandSpec spec;

  @Override
  public Integer call() {
    spec.commandLine().getOut().print(AutoComplete.bash("archspan", Main.commandLine()));
    spec.commandLine().getOut().flush();
    return ExitStatus.SOLVED;
  }
}
