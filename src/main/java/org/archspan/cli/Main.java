package org.archspan.cli;

import java.io.File;
import java.io.IOException;
import java.net.URL;
import java.util.jar.JarFile;
import org.archspan.catalogue.RefusedTableException;
import org.archspan.catalogue.UnreadableTableException;
import org.archspan.disk.RefusedModelException;
import org.archspan.modelfile.UnreadableFileException;
import org.archspan.observe.UnmeasurableArmException;
import org.archspan.stability.UnsolvedException;
import org.archspan.table.ReadException;
import org.archspan.table.WriteException;
import picocli.CommandLine;
import picocli.CommandLine.Command;
import picocli.CommandLine.IVersionProvider;

/** The command line. */
@Command(name = "archspan", mixinStandardHelpOptions = true, versionProvider = Main.Version.class,
    description = "Magnetic buoyancy of gas disks and stellar atmospheres: which wave wins, how fast it grows, how far"
        + " apart the clouds stand.")
public final class Main {
  private Main() {
  }

  /** The version and the commit in the manifest of the jar. */
  static final class Version implements IVersionProvider {
    @Override
    public String[] getVersion() throws IOException {
      String version = Main.class.getPackage().getImplementationVersion();
      return new String[] {"Archspan " + (version == null ? "(not packaged)" : version + commit())};
    }

    private static String commit() throws IOException {
      URL code = Main.class.getProtectionDomain().getCodeSource().getLocation();
      try (JarFile jar = new JarFile(new File(code.getPath()))) {
        String commit = jar.getManifest().getMainAttributes().getValue("Source-Commit");
        return commit == null || commit.startsWith("$") ? "" : " (" + commit + ")";
      }
    }
  }

  /** Runs a command and exits with its status. */
  public static void main(String[] arguments) {
    System.setProperty("java.awt.headless", "true");
    System.exit(commandLine(arguments).execute(arguments));
  }

  /** The configured parser for what is called; for anything when nothing is said. */
  static CommandLine commandLine(String... arguments) {
    CommandLine commandLine = new CommandLine(new Main());
    new CommandList().addTo(commandLine, arguments);
    commandLine.setUsageHelpAutoWidth(true);
    commandLine.setExecutionExceptionHandler(Main::report);
    commandLine.setParameterExceptionHandler((fault, given) -> {
      fault.getCommandLine().getErr().println(fault.getMessage());
      fault.getCommandLine().getErr().println("See archspan "
          + (fault.getCommandLine().getParent() == null ? "" : fault.getCommandLine().getCommandName() + " ")
          + "--help.");
      return ExitStatus.USAGE;
    });
    return commandLine;
  }

  /** One clear message and the status that belongs to it; only a fault of the program shows a trace. */
  private static int report(Exception fault, CommandLine commandLine, CommandLine.ParseResult parsed)
      throws Exception {
    int status = status(fault);
    if (status < 0) {
      throw fault;
    }
    commandLine.getErr().println(fault.getMessage());
    commandLine.getErr().flush();
    return status;
  }

  private static int status(Exception fault) {
    if (fault instanceof ModelFault || fault instanceof RefusedModelException
        || fault instanceof RefusedTableException || fault instanceof UnmeasurableArmException) {
      return ExitStatus.MODEL;
    }
    if (fault instanceof UnsolvedException) {
      return ExitStatus.UNSOLVED;
    }
    if (fault instanceof UnreadableFileException || fault instanceof WriteException
        || fault instanceof ReadException || fault instanceof UnreadableTableException) {
      return ExitStatus.FILE;
    }
    return -1;
  }
}
