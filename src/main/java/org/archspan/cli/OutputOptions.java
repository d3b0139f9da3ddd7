package org.archspan.cli;

import java.nio.file.Path;
import java.util.Optional;
import picocli.CommandLine.Option;

/** What all commands that compute something have in common: where results go, what is said, and threads. */
class OutputOptions {
  @Option(names = "--out", paramLabel = "DIR", description = "write all tables and figures into this folder")
  Path out;

  @Option(names = "--overwrite", description = "replace files that exist in --out")
  boolean overwrite;

  @Option(names = "--json", description = "print the result as one JSON document, and nothing else")
  boolean json;

  @Option(names = "--quiet", description = "print no summary and no progress")
  boolean quiet;

  @Option(names = "--threads", paramLabel = "N", description = "threads to use (default: all cores); the digits do not"
      + " depend on it")
  int threads = Runtime.getRuntime().availableProcessors();

  /** What is wrong with the values, if anything. */
  Optional<String> fault() {
    return threads < 1 || threads > 1024 ? Optional.of("--threads " + threads + ": allowed is 1 to 1024")
        : Optional.empty();
  }
}
