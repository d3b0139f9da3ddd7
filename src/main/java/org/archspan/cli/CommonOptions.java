package org.archspan.cli;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** What all commands that solve a model have in common. */
final class CommonOptions {
  @Parameters(index = "0", paramLabel = "MODEL.toml", description = "the model to solve")
  Path model;

  @Option(names = "--set", paramLabel = "KEY=VALUE",
      description = "lay a value over the model, such as --set gas.dispersion=7km/s; repeatable")
  List<String> settings = new ArrayList<>();

  @Option(names = "--out", paramLabel = "DIR", description = "write all tables and figures into this folder")
  Path out;

  @Option(names = "--overwrite", description = "replace files that exist in --out")
  boolean overwrite;

  @Option(names = "--json", description = "print the result as one JSON document, and nothing else")
  boolean json;

  @Option(names = "--quiet", description = "print no summary and no progress")
  boolean quiet;

  @Option(names = "--tolerance", paramLabel = "ERROR", defaultValue = "1e-8",
      description = "relative error asked of growth rates, 1e-12 to 1e-2 (default ${DEFAULT-VALUE})")
  double tolerance;

  @Option(names = "--threads", paramLabel = "N", description = "threads to use (default: all cores); the digits do not"
      + " depend on it")
  int threads = Runtime.getRuntime().availableProcessors();

  /** What is wrong with the values, if anything. */
  Optional<String> fault() {
    if (!(tolerance >= 1e-12 && tolerance <= 1e-2)) {
      return Optional.of("--tolerance " + tolerance + ": allowed is 1e-12 to 1e-2");
    }
    if (threads < 1 || threads > 1024) {
      return Optional.of("--threads " + threads + ": allowed is 1 to 1024");
    }
    return Optional.empty();
  }
}
