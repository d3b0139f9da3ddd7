package org.archspan.table;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import org.junit.jupiter.api.Test;

class EcsvTest {
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
}
