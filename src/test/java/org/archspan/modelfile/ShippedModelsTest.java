package org.archspan.modelfile;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.archspan.spacing.BranchPeak;
import org.archspan.spacing.SpacingResult;
import org.archspan.spacing.SpacingStudy;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class ShippedModelsTest {
  static List<String> names() {
    return ShippedModels.names();
  }

  @Test
  void theListIsTheFolder() throws IOException {
    try (Stream<Path> files = Files.list(Path.of("models"))) {
      assertThat(files.map(file -> file.getFileName().toString()).filter(file -> file.endsWith(".toml"))
          .map(file -> file.replace(".toml", "")))
          .containsExactlyInAnyOrderElementsOf(names());
    }
  }

  @ParameterizedTest
  @MethodSource("names")
  void readsAndSolves(String name) throws IOException {
    Reading reading = ModelReader.read(Path.of("models", name + ".toml"), List.of(), 1e-8);
    assertThat(reading.faults()).isEmpty();
    Model model = reading.model().orElseThrow();
    SpacingResult result = new SpacingStudy(model.disk(), model.options(), model.arm()).solve();
    // 1e-10: asked of every equilibrium
    assertThat(result.forceBalanceResidual()).isLessThan(1e-10);
    assertThat(result.stable()).isEqualTo(name.equals("stable-disk"));
    for (BranchPeak peak : result.branches()) {
      assertThat(peak.growthError()).isLessThan(1e-7);
    }
  }
}
