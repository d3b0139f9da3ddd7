package org.archspan.catalogue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.archspan.units.Dimension;
import org.archspan.units.Unit;
import org.archspan.units.UnitException;
import org.archspan.units.UnitParser;

/** Reads a table of complexes: CSV, ECSV or FITS, told apart by what stands in the file. */
public final class ComplexesReader {
  private static final int LARGEST = 16 * 1024 * 1024;
  private static final int MOST_FAULTS = 20;
  private static final int MOST_ROWS = 2000;
  private static final Dimension LENGTH = new Dimension(2, 0, 0, 0);

  private final RawTable table;
  private final List<String> faults = new ArrayList<>();

  private ComplexesReader(RawTable table) {
    this.table = table;
  }

  /**
   * The complexes of a file.
   *
   * @throws UnreadableTableException when the file cannot be read
   * @throws RefusedTableException    when it is wrong, with every fault
   */
  public static Complexes read(Path file) throws UnreadableTableException {
    if (Files.isDirectory(file)) {
      throw new UnreadableTableException(file + " is a directory; give a table");
    }
    if (!Files.exists(file)) {
      throw new UnreadableTableException(file + " does not exist");
    }
    try (var stream = Files.newInputStream(file)) {
      byte[] bytes = stream.readNBytes(LARGEST + 1);
      if (bytes.length > LARGEST) {
        throw new RefusedTableException(List.of(file + ": larger than 16 MB; at most " + MOST_ROWS + " complexes are"
            + " read"));
      }
      return new ComplexesReader(raw(file.toString(), bytes)).complexes();
    } catch (IOException reason) {
      throw new UnreadableTableException(file + " cannot be read: " + reason.getMessage());
    }
  }

  private static RawTable raw(String file, byte[] bytes) {
    String start = new String(bytes, 0, Math.min(9, bytes.length), StandardCharsets.US_ASCII);
    String text = new String(bytes, StandardCharsets.UTF_8);
    return start.startsWith("SIMPLE  =") ? FitsTable.read(file, bytes)
        : CsvTable.read(file, text.startsWith("\ufeff") ? text.substring(1) : text);
  }

  private Complexes complexes() {
    Complexes.Kind kind = kind();
    if (table.rows().size() > MOST_ROWS) {
      throw new RefusedTableException(List.of(table.file() + ": " + table.rows().size() + " complexes; at most "
          + MOST_ROWS + " are allowed"));
    }
    double[] first = column(table.column(List.of(kind.columns().get(0))), kind, false);
    double[] second = column(table.column(List.of(kind.columns().get(1))), kind, false);
    int errorColumn = table.column(List.of("error"));
    double[] error = errorColumn < 0 ? new double[first.length] : column(errorColumn, kind, true);
    duplicates(first, second);
    if (!faults.isEmpty()) {
      throw new RefusedTableException(faults);
    }
    return new Complexes(kind, names(), first, second, error);
  }

  private Complexes.Kind kind() {
    for (Complexes.Kind kind : Complexes.Kind.values()) {
      if (kind.columns().stream().allMatch(name -> table.column(List.of(name)) >= 0)) {
        return kind;
      }
    }
    throw new RefusedTableException(List.of(table.file() + ": found the columns " + String.join(", ", table.names())
        + "; needed are east and north, or ra and dec, or x and y (in the plane), with units: east [arcsec], north"
        + " [arcsec]"));
  }

  private List<String> names() {
    int column = table.column(List.of("name", "id"));
    List<String> names = new ArrayList<>();
    for (int row = 0; row < table.rows().size(); row++) {
      names.add(column < 0 ? Integer.toString(row + 1) : table.rows().get(row).get(column));
    }
    return names;
  }

  private double[] column(int column, Complexes.Kind kind, boolean error) {
    double factor = factor(column, kind);
    double[] values = new double[table.rows().size()];
    for (int row = 0; row < values.length; row++) {
      String cell = table.rows().get(row).get(column);
      try {
        values[row] = Double.parseDouble(cell) * factor;
      } catch (NumberFormatException notANumber) {
        values[row] = Double.NaN;
      }
      if (!Double.isFinite(values[row]) || error && values[row] < 0.0) {
        fault(row, table.names().get(column) + ": " + (cell.isBlank() ? "found a gap" : "found \"" + cell + "\"")
            + "; allowed is a finite number" + (error ? ", 0 or more" : ""));
      }
    }
    return values;
  }

  private double factor(int column, Complexes.Kind kind) {
    String name = table.names().get(column);
    boolean plane = kind == Complexes.Kind.PLANE;
    String needed = plane ? "a length such as kpc" : "an angle such as arcsec or deg";
    try {
      String written = table.units().get(column);
      if (written.isEmpty()) {
        throw new UnitException("the unit is missing");
      }
      Unit unit = UnitParser.parse(written);
      if (!unit.dimension().equals(plane ? LENGTH : Dimension.NONE)) {
        throw new UnitException("found the unit " + written);
      }
      return unit.factor();
    } catch (UnitException fault) {
      faults.add(table.file() + ": column " + name + ": " + fault.getMessage() + "; needed is " + needed + ","
          + " written as "
          + name + (plane ? " [kpc]" : " [arcsec]"));
      return 1.0;
    }
  }

  private void duplicates(double[] first, double[] second) {
    Map<List<Double>, Integer> seen = new HashMap<>();
    for (int row = 0; row < first.length; row++) {
      Integer before = seen.putIfAbsent(List.of(first[row], second[row]), row);
      if (before != null && Double.isFinite(first[row]) && Double.isFinite(second[row])) {
        fault(row, "the same position as in " + table.line() + " " + table.places().get(before)
            + "; each complex may stand in the table once");
      }
    }
  }

  private void fault(int row, String words) {
    if (faults.size() < MOST_FAULTS) {
      faults.add(table.place(row) + ": " + words);
    }
  }
}
