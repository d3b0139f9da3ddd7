package org.archspan.cli;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** What all commands that solve a model have in common. */
final class CommonOptions extends OutputOptions {
  @Parameters(index = "0", paramLabel = "MODEL.toml", description = "the model to solve")
  Path model;

  @Option(names = "--set", paramLabel = "KEY=VALUE",
      description = "lay a value over the model, such as --set gas.dispersion=7km/s; repeatable")
  List<String> settings = new ArrayList<>();

  @Option(names = "--tolerance", paramLabel = "ERROR", defaultValue = "1e-8",
      description = "relative error asked of growth rates, 1e-12 to 1e-2 (default ${DEFAULT-VALUE})")
  double tolerance;

  @Override
  Optional<String> fault() {
    if (!(tolerance >= 1e-12 && tolerance <= 1e-2)) {
      return Optional.of("--tolerance " + tolerance + ": allowed is 1e-12 to 1e-2");
    }
    return super.fault();
  }
}
