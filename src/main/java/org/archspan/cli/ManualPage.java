package org.archspan.cli;

import java.util.List;
import java.util.Locale;
import picocli.CommandLine;
import picocli.CommandLine.Model.ArgSpec;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.Model.PositionalParamSpec;

/** A manual page in the macros of man(7), made from what the parser knows. */
final class ManualPage {
  private static final String STATUS = """
      .TP
      .B 0
      solved; that a disk is stable is an answer too
      .TP
      .B 2
      the command line is wrong
      .TP
      .B 3
      the model is wrong
      .TP
      .B 4
      the computation could not reach its tolerance
      .TP
      .B 5
      a file could not be read or written
      """;
  private final CommandSpec command;
  private final StringBuilder page = new StringBuilder();

  ManualPage(CommandSpec command) {
    this.command = command;
  }

  String text() {
    String name = command.qualifiedName("-");
    page.append(".TH ").append(name.toUpperCase(Locale.ROOT)).append(" 1 \"\" \"").append(command.version().length > 0
        ? command.version()[0] : "Archspan").append("\" \"Archspan\"\n.SH NAME\n").append(escaped(name))
        .append(" \\- ").append(escaped(firstSentence())).append("\n.SH SYNOPSIS\n.B ")
        .append(escaped(synopsis())).append("\n.SH DESCRIPTION\n").append(escaped(description())).append('\n');
    arguments("ARGUMENTS", command.positionalParameters());
    arguments("OPTIONS", command.options());
    subcommands();
    page.append(".SH EXIT STATUS\n").append(STATUS);
    return page.toString();
  }

  private String description() {
    return String.join(" ", command.usageMessage().description());
  }

  private String firstSentence() {
    String all = description();
    int end = all.indexOf(". ");
    return end < 0 ? all.replaceAll("\\.$", "") : all.substring(0, end);
  }

  private String synopsis() {
    StringBuilder line = new StringBuilder(command.qualifiedName());
    command.positionalParameters().forEach(parameter -> line.append(' ').append(label(parameter)));
    return line + (command.subcommands().isEmpty() ? " [OPTIONS]" : " COMMAND");
  }

  private static String label(PositionalParamSpec parameter) {
    return parameter.arity().min() == 0 ? "[" + parameter.paramLabel() + "]" : parameter.paramLabel();
  }

  private void arguments(String heading, List<? extends ArgSpec> arguments) {
    if (arguments.isEmpty()) {
      return;
    }
    page.append(".SH ").append(heading).append('\n');
    for (ArgSpec argument : arguments) {
      String name = argument instanceof OptionSpec option
          ? String.join(", ", option.names()) + (option.arity().max() == 0 ? "" : "=" + option.paramLabel())
          : argument.paramLabel();
      page.append(".TP\n.B ").append(escaped(name)).append('\n').append(escaped(String.join(" ",
          argument.description()).replace("${DEFAULT-VALUE}", String.valueOf(argument.defaultValue())))).append('\n');
    }
  }

  private void subcommands() {
    if (command.subcommands().isEmpty()) {
      return;
    }
    page.append(".SH COMMANDS\n");
    for (CommandLine sub : command.subcommands().values()) {
      page.append(".TP\n.B ").append(escaped(sub.getCommandName())).append('\n')
          .append(escaped(String.join(" ", sub.getCommandSpec().usageMessage().description()))).append('\n');
    }
  }

  private static String escaped(String text) {
    String safe = text.replace("\\", "\\e").replace("-", "\\-");
    return safe.startsWith(".") || safe.startsWith("'") ? "\\&" + safe : safe;
  }
}
