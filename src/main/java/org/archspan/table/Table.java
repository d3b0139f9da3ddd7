package org.archspan.table;

import java.util.List;

/**
 * Columns of equal length.
 *
 * @param title   what the table holds, for its header
 * @param columns at least one
 */
public record Table(String title, List<Column> columns) {
  /** Refuses columns of different length. */
  public Table {
    columns = List.copyOf(columns);
    int rows = columns.get(0).values().size();
    for (Column column : columns) {
      if (column.values().size() != rows) {
        throw new IllegalArgumentException("column " + column.name() + " has " + column.values().size()
            + " rows, the first has " + rows);
      }
    }
  }

  /** Number of rows. */
  public int rows() {
    return columns.get(0).values().size();
  }
}
