package org.archspan.report;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.archspan.closure.CosmicRayClosure;
import org.archspan.disk.Disk;
import org.archspan.gravity.UniformGravity;
import org.archspan.spacing.Arm;
import org.archspan.spacing.SearchOptions;
import org.archspan.spacing.SpacingResult;
import org.archspan.spacing.SpacingStudy;
import org.archspan.stability.TestDisks;
import org.archspan.table.WriteException;
import org.archspan.units.OutputUnits;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The files of a disk in which nothing grows: gamma = 3 exceeds 1 + alpha + beta (Newcomb 1961). */
class SpacingFilesTest {
  private static final Disk STABLE =
      TestDisks.isothermal(new UniformGravity(2e-9), 0.5, 0.5, 3.0, CosmicRayClosure.instantDiffusion(), 5.0);

  @TempDir
  Path folder;

  private void write(boolean overwrite) throws WriteException {
    SpacingResult result = new SpacingStudy(STABLE, SearchOptions.defaults(), Arm.unknown()).solve();
    new SpacingFiles(result, STABLE, SearchOptions.defaults(), OutputUnits.galactic()).write(folder.resolve("out"),
        "{}\n", "summary\n", new ModelEcho("by hand", "stable", Map.of()), overwrite);
  }

  /** A script that reads the tables of many models finds them for a stable one too, without rows. */
  @Test
  void tablesOfAStableDiskHaveNoRows() throws IOException {
    write(false);
    for (String name : List.of("branches.ecsv", "growth.ecsv")) {
      List<String> lines = Files.readAllLines(folder.resolve("out").resolve(name));
      assertThat(lines).filteredOn(line -> !line.startsWith("#")).as(name).singleElement().asString()
          .startsWith("parity,mode_order,wavelength");
    }
  }

  /** The page is written last; that it exists must be seen before the first file is. */
  @Test
  void nothingIsWrittenWhereOneFileExists() throws IOException {
    Path page = Files.createDirectories(folder.resolve("out")).resolve("report.html");
    Files.writeString(page, "mine");
    assertThatThrownBy(() -> write(false)).isInstanceOf(WriteException.class)
        .hasMessageStartingWith(page + " exists; nothing was changed");
    try (Stream<Path> files = Files.list(folder.resolve("out"))) {
      assertThat(files).containsExactly(page);
    }
    assertThat(Files.readString(page)).isEqualTo("mine");
    write(true);
    assertThat(Files.readString(page)).startsWith("<!DOCTYPE html>").contains("is stable against magnetic buoyancy");
  }
}
