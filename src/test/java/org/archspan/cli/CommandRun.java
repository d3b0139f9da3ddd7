package org.archspan.cli;

import java.io.PrintWriter;
import java.io.StringWriter;
import picocli.CommandLine;

/**
 * One run of the command line inside the test's own process.
 *
 * @param status exit status
 * @param out    standard output
 * @param err    standard error
 */
record CommandRun(int status, String out, String err) {
  static CommandRun of(String... arguments) {
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    CommandLine commandLine = Main.commandLine();
    commandLine.setOut(new PrintWriter(out));
    commandLine.setErr(new PrintWriter(err));
    int status = commandLine.execute(arguments);
    return new CommandRun(status, out.toString(), err.toString());
  }
}
