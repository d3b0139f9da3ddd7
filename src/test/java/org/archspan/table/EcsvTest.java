package org.archspan.table;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class EcsvTest {
  @TempDir
  Path folder;

  /** The header of Astropy Proposal for Enhancement 6; nan and inf as Astropy writes them. */
  @Test
  void carriesUnitsAndAllDigits() {
    Table table = new Table("it's a test", List.of(
        Column.of("z", "pc", "height", new double[] {0.1, Double.NaN, Double.POSITIVE_INFINITY}),
        Column.of("order", "of the mode", new int[] {0, 1, 2}),
        Column.of("name", "a word, or two", List.of("mirror", "two words", "a,\"b"))));
    assertThat(Ecsv.text(table)).isEqualTo("""
        # %ECSV 1.0
        # ---
        # delimiter: ','
        # datatype:
        # - {name: z, unit: 'pc', datatype: float64, description: 'height'}
        # - {name: order, datatype: int64, description: 'of the mode'}
        # - {name: name, datatype: string, description: 'a word, or two'}
        # meta: {title: 'it''s a test'}
        # schema: astropy-2.0
        z,order,name
        0.1,0,mirror
        nan,1,"two words"
        inf,2,"a,""b"
        """);
  }

  @Test
  void refusesColumnsOfDifferentLength() {
    assertThatThrownBy(() -> new Table("t", List.of(Column.of("a", "", "", new double[2]),
        Column.of("b", "", "", new double[3])))).hasMessageContaining("column b has 3 rows");
  }

  @Test
  void filesAreWholeOrAbsent() throws IOException {
    Path file = folder.resolve("deep/er/table.ecsv");
    WholeFile.write(file, new byte[] {1, 2}, false);
    assertThatThrownBy(() -> WholeFile.write(file, new byte[] {3}, false)).isInstanceOf(WriteException.class)
        .hasMessageContaining("exists");
    assertThat(Files.readAllBytes(file)).containsExactly(1, 2);
    WholeFile.write(file, new byte[] {3}, true);
    assertThat(Files.readAllBytes(file)).containsExactly(3);
    Path blocked = folder.resolve("deep/er/table.ecsv/below");
    assertThatThrownBy(() -> WholeFile.write(blocked, new byte[] {1}, false)).isInstanceOf(WriteException.class);
    try (Stream<Path> left = Files.walk(folder).filter(Files::isRegularFile)) {
      assertThat(left).containsExactly(file);
    }
  }
}
