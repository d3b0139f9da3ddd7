package org.archspan.cli;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.concurrent.Callable;
import java.util.function.Supplier;
import picocli.CommandLine;

/** The commands by name, in the order of the help. */
final class CommandList {
  private final Map<String, Supplier<Callable<Integer>>> commands = new LinkedHashMap<>();

  CommandList() {
    commands.put("spacing", SpacingCommand::new);
    commands.put("equilibrium", EquilibriumCommand::new);
    commands.put("dispersion", DispersionCommand::new);
    commands.put("mode", ModeCommand::new);
    commands.put("plane", PlaneCommand::new);
    commands.put("compare", CompareCommand::new);
    commands.put("ensemble", EnsembleCommand::new);
    commands.put("infer", InferCommand::new);
    commands.put("observe", ObserveCommand::new);
    commands.put("rivals", RivalsCommand::new);
    commands.put("amplify", AmplifyCommand::new);
    commands.put("check", CheckCommand::new);
    commands.put("models", ModelsCommand::new);
    commands.put("manual", ManualCommand::new);
    commands.put("completion", CompletionCommand::new);
  }

  /**
   * Adds all; or only the one that is called, since describing the others to the parser takes as long as a solution.
   */
  void addTo(CommandLine commandLine, String... arguments) {
    Supplier<Callable<Integer>> called = arguments.length == 0 ? null : commands.get(arguments[0]);
    if (called != null) {
      commandLine.addSubcommand(arguments[0], called.get());
    } else {
      commands.forEach((name, command) -> commandLine.addSubcommand(name, command.get()));
    }
  }
}
