package org.archspan.catalogue;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import nom.tam.fits.BasicHDU;
import nom.tam.fits.Fits;
import nom.tam.fits.TableHDU;

/** Reads the first table of a FITS file; units from TUNIT. */
final class FitsTable {
  private FitsTable() {
  }

  static RawTable read(String file, byte[] bytes) {
    try (Fits fits = new Fits(new ByteArrayInputStream(bytes))) {
      for (BasicHDU<?> unit = fits.readHDU(); unit != null; unit = fits.readHDU()) {
        if (unit instanceof TableHDU<?> table) {
          return table(file, table);
        }
      }
    } catch (IOException | RuntimeException broken) {
      // the library answers some broken headers with unchecked exceptions
      throw new RefusedTableException(List.of(file + ": not a readable FITS file: " + broken.getMessage()));
    }
    throw new RefusedTableException(List.of(file + ": no table found; a FITS binary or ASCII table is needed"));
  }

  private static RawTable table(String file, TableHDU<?> table) {
    List<String> names = new ArrayList<>();
    List<String> units = new ArrayList<>();
    for (int column = 0; column < table.getNCols(); column++) {
      String name = table.getColumnName(column);
      String unit = table.getHeader().getStringValue("TUNIT" + (column + 1));
      names.add(name == null ? "" : name.strip());
      units.add(unit == null ? "" : unit.strip());
    }
    List<List<String>> rows = new ArrayList<>();
    for (int row = 0; row < table.getNRows(); row++) {
      List<String> cells = new ArrayList<>();
      for (int column = 0; column < names.size(); column++) {
        cells.add(cell(table.getElement(row, column)));
      }
      rows.add(cells);
    }
    return new RawTable(file, "row", names, units, rows, IntStream.rangeClosed(1, rows.size()).boxed().toList());
  }

  /** A scalar as text; numbers come as arrays of one. */
  private static String cell(Object element) {
    Object value = element != null && element.getClass().isArray() && java.lang.reflect.Array.getLength(element) == 1
        ? java.lang.reflect.Array.get(element, 0) : element;
    return value instanceof Number || value instanceof String ? value.toString().strip() : "";
  }
}
