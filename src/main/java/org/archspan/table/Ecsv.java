package org.archspan.table;

import java.util.StringJoiner;

/**
 * Enhanced character-separated values 1.0 (Astropy Proposal for Enhancement 6): CSV with a commented YAML header that
 * carries units, data types and descriptions; readable as plain CSV too.
 */
public final class Ecsv {
  private Ecsv() {
  }

  /** The text of a table, with a final line end. */
  public static String text(Table table) {
    StringBuilder text = new StringBuilder("# %ECSV 1.0\n# ---\n# delimiter: ','\n# datatype:\n");
    for (Column column : table.columns()) {
      text.append("# - {name: ").append(column.name());
      if (!column.unit().isEmpty()) {
        text.append(", unit: ").append(quoted(column.unit()));
      }
      text.append(", datatype: ").append(column.type()).append(", description: ")
          .append(quoted(column.description())).append("}\n");
    }
    text.append("# meta: {title: ").append(quoted(table.title())).append("}\n# schema: astropy-2.0\n");
    StringJoiner names = new StringJoiner(",");
    table.columns().forEach(column -> names.add(column.name()));
    text.append(names).append('\n');
    for (int row = 0; row < table.rows(); row++) {
      StringJoiner line = new StringJoiner(",");
      for (Column column : table.columns()) {
        line.add(cell(column.values().get(row)));
      }
      text.append(line).append('\n');
    }
    return text.toString();
  }

  private static String quoted(String text) {
    return "'" + text.replace("'", "''").replaceAll("\\s+", " ") + "'";
  }

  private static String cell(String value) {
    return value.matches("[^,\"\\s]+") ? value : "\"" + value.replace("\"", "\"\"") + "\"";
  }
}
