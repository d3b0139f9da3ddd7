package org.archspan.catalogue;

import java.util.List;

/**
 * A table as texts, whatever its format.
 *
 * @param file   where it stands
 * @param line   word for a row in messages: line or row
 * @param names  of the columns
 * @param units  of the columns, empty where there is none
 * @param rows   cells, one for each column
 * @param places number of each row in the file, from 1
 */
record RawTable(String file, String line, List<String> names, List<String> units, List<List<String>> rows,
    List<Integer> places) {
  /** Index of the first column of one of these names, -1 without. */
  int column(List<String> allowed) {
    for (int i = 0; i < names.size(); i++) {
      if (allowed.contains(names.get(i).toLowerCase(java.util.Locale.ROOT))) {
        return i;
      }
    }
    return -1;
  }

  /** The place of a row for a message. */
  String place(int row) {
    return line.equals("line") ? file + ":" + places.get(row) : file + ": row " + places.get(row);
  }
}
