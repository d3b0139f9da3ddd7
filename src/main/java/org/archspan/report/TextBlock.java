package org.archspan.report;

import java.util.ArrayList;
import java.util.List;

/** Plain text with wrapped sentences, labelled lines and aligned tables. */
final class TextBlock {
  private static final int LABEL = 13;

  private final StringBuilder text = new StringBuilder();
  private final int width;

  TextBlock(int width) {
    this.width = Math.max(40, width);
  }

  TextBlock heading(String words) {
    text.append(text.length() == 0 ? "" : "\n").append(words).append('\n');
    return this;
  }

  TextBlock gap() {
    text.append('\n');
    return this;
  }

  TextBlock sentence(String words) {
    wrap(words, "  ", "  ");
    return this;
  }

  TextBlock bullet(String words) {
    wrap(words, "  - ", "    ");
    return this;
  }

  TextBlock labelled(String label, String words) {
    wrap(words, "  " + label + " ".repeat(Math.max(1, LABEL - label.length())), " ".repeat(LABEL + 2));
    return this;
  }

  private void wrap(String words, String first, String rest) {
    StringBuilder line = new StringBuilder(first);
    boolean empty = true;
    for (String word : words.split(" ")) {
      if (!empty && line.length() + 1 + word.length() > width) {
        text.append(line).append('\n');
        line = new StringBuilder(rest);
        empty = true;
      }
      line.append(empty ? "" : " ").append(word);
      empty = false;
    }
    text.append(line).append('\n');
  }

  /** A table with one row of headings. */
  TextBlock table(List<List<String>> rows) {
    return table(1, rows);
  }

  /** Rows of equal length, the first of them headings. Numbers are set flush right, words flush left. */
  TextBlock table(int headings, List<List<String>> rows) {
    int columns = rows.get(0).size();
    List<Integer> widths = new ArrayList<>();
    List<Boolean> numeric = new ArrayList<>();
    for (int c = 0; c < columns; c++) {
      int column = c;
      widths.add(rows.stream().mapToInt(row -> row.get(column).length()).max().orElse(0));
      numeric.add(rows.stream().skip(headings).allMatch(row -> row.get(column).matches("[-+0-9].*|-|infinite|many")));
    }
    for (List<String> row : rows) {
      StringBuilder line = new StringBuilder(" ");
      for (int c = 0; c < columns; c++) {
        String pad = " ".repeat(widths.get(c) - row.get(c).length());
        line.append(' ').append(numeric.get(c) ? pad + row.get(c) : row.get(c) + pad).append(' ');
      }
      text.append(line.toString().stripTrailing()).append('\n');
    }
    return this;
  }

  String text() {
    return text.toString();
  }
}
