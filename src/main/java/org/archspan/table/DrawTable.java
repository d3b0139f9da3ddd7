package org.archspan.table;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import org.archspan.uncertainty.DrawRow;
import org.archspan.uncertainty.UncertainInput;
import org.archspan.units.OutputUnits;

/** Draws of an ensemble as a table, and back. */
public final class DrawTable {
  private static final int ANSWERS = 7;
  private final String title;
  private final List<UncertainInput> inputs;
  private final OutputUnits units;
  private final boolean width;

  /**
   * Tables of one ensemble.
   *
   * @param title what tells it from every other: it is looked for when tables are read again
   * @param width whether the arm has one, so that masses are whole
   */
  public DrawTable(String title, List<UncertainInput> inputs, OutputUnits units, boolean width) {
    this.title = title;
    this.inputs = List.copyOf(inputs);
    this.units = units;
    this.width = width;
  }

  /** The table of some rows. */
  Table of(List<DrawRow> rows) {
    List<Column> columns = new ArrayList<>();
    columns.add(new Column("draw", "", "index of the draw", "int64",
        rows.stream().map(row -> Long.toString(row.draw())).toList()));
    for (int i = 0; i < inputs.size(); i++) {
      int input = i;
      columns.add(numbers(inputs.get(i).key().replace('.', '_').replace('-', '_'), inputs.get(i).unit(), "drawn", rows,
          row -> row.values().get(input)));
    }
    columns.add(words("outcome", "unstable, stable, or failed", rows,
        row -> row.outcome().name().toLowerCase(Locale.ROOT)));
    columns.add(numbers("wavelength", units.length(), "of the mode that sets the spacing", rows, DrawRow::wavelength));
    columns.add(numbers("growth_time", units.time(), "one e-folding", rows, DrawRow::growthTime));
    columns.add(numbers(width ? "mass" : "mass_per_width", units.mass() + (width ? "" : "/" + units.length()),
        "gas that one wavelength holds", rows, DrawRow::mass));
    columns.add(words("held_by", "what confines the mode", rows, DrawRow::heldBy));
    columns.add(words("gathers", "whether the mode gathers the disk's own gas", rows,
        row -> row.gathers() ? "yes" : "no"));
    columns.add(words("reason", "why there is no answer", rows, DrawRow::reason));
    return new Table(title, columns);
  }

  private static Column numbers(String name, String unit, String description, List<DrawRow> rows,
      ToDoubleFunction<DrawRow> value) {
    return Column.of(name, unit, description, rows.stream().mapToDouble(value).toArray());
  }

  private static Column words(String name, String description, List<DrawRow> rows, Function<DrawRow, String> value) {
    return Column.of(name, description, rows.stream().map(value).toList());
  }

  /** A row from the cells of a table that {@link #of} made. */
  DrawRow row(List<String> cells) {
    int answers = 1 + inputs.size();
    if (cells.size() != answers + ANSWERS) {
      throw new IllegalArgumentException("a row of " + cells.size() + " cells; " + (answers + ANSWERS)
          + " are expected");
    }
    List<Double> values = cells.subList(1, answers).stream().map(DrawTable::number).toList();
    return new DrawRow(Long.parseLong(cells.get(0)), values,
        DrawRow.Outcome.valueOf(cells.get(answers).toUpperCase(Locale.ROOT)), number(cells.get(answers + 1)),
        number(cells.get(answers + 2)), number(cells.get(answers + 3)), cells.get(answers + 4),
        cells.get(answers + 5).equals("yes"), cells.get(answers + 6));
  }

  private static double number(String cell) {
    return switch (cell) {
      case "nan" -> Double.NaN;
      case "inf" -> Double.POSITIVE_INFINITY;
      case "-inf" -> Double.NEGATIVE_INFINITY;
      default -> Double.parseDouble(cell);
    };
  }
}
