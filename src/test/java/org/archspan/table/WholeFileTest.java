package org.archspan.table;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.FileSystem;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class WholeFileTest {
  @TempDir
  Path folder;

  @Test
  void filesAreWholeOrAbsent() throws IOException {
    Path file = folder.resolve("deep/er/table.ecsv");
    WholeFile.write(file, new byte[] {1, 2}, false);
    assertThatThrownBy(() -> WholeFile.write(file, new byte[] {3}, false)).isInstanceOf(WriteException.class)
        .hasMessageContaining("exists; nothing was changed");
    assertThat(Files.readAllBytes(file)).containsExactly(1, 2);
    WholeFile.write(file, new byte[] {3}, true);
    assertThat(Files.readAllBytes(file)).containsExactly(3);
    assertThat(filesIn(folder)).containsExactly(file);
  }

  @Test
  void aFileInPlaceOfTheFolderIsNamed() throws IOException {
    Path taken = Files.write(folder.resolve("taken"), new byte[] {1});
    assertThatThrownBy(() -> WholeFile.write(taken.resolve("below"), new byte[1], true))
        .isInstanceOf(WriteException.class).hasMessage(taken.resolve("below") + " cannot be written: " + taken
            + " is not a folder");
  }

  @Test
  void aFolderInPlaceOfTheFileStaysAndNothingIsLeftBeside() throws IOException {
    Path taken = Files.createDirectories(folder.resolve("table.ecsv"));
    Files.write(taken.resolve("precious"), new byte[] {1});
    assertThatThrownBy(() -> WholeFile.write(taken, new byte[1], true)).isInstanceOf(WriteException.class)
        .hasMessageStartingWith(taken + " cannot be written: ").hasMessageNotContaining(".part");
    assertThat(filesIn(folder)).containsExactly(taken.resolve("precious"));
  }

  /** A zip file stands for the disks of cameras and shares, which know no links. */
  @Test
  void disksWithoutLinksWillDo() throws IOException {
    try (FileSystem zip = FileSystems.newFileSystem(folder.resolve("disk.zip"), Map.of("create", "true"))) {
      Path file = zip.getPath("/out/table.ecsv");
      assertThatThrownBy(() -> Files.createLink(zip.getPath("/a"), zip.getPath("/b")))
          .isInstanceOf(UnsupportedOperationException.class);
      WholeFile.write(file, new byte[] {1, 2}, false);
      assertThat(Files.readAllBytes(file)).containsExactly(1, 2);
      assertThatThrownBy(() -> WholeFile.write(file, new byte[] {3}, false)).isInstanceOf(WriteException.class);
      WholeFile.write(file, new byte[] {3}, true);
      assertThat(Files.readAllBytes(file)).containsExactly(3);
      assertThat(filesIn(zip.getPath("/out"))).containsExactly(file);
    }
  }

  private static List<Path> filesIn(Path folder) throws IOException {
    try (Stream<Path> files = Files.walk(folder).filter(Files::isRegularFile)) {
      return files.toList();
    }
  }
}
