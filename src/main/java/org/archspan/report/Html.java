package org.archspan.report;

import org.archspan.table.Column;
import org.archspan.table.Table;

/** Pieces of a page: texts made harmless, tables, and drawings that do not disturb each other. */
final class Html {
  private Html() {
  }

  static String escaped(String text) {
    return text.replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;").replace("\"", "&quot;");
  }

  /** A drawing for a page that holds several: each names its clips from 1, and on one page the first would clip all. */
  static String inline(String svg, String name) {
    return svg.substring(svg.indexOf("<svg")).replaceAll("\\bid=\"", "id=\"" + name + "-")
        .replace("url(#", "url(#" + name + "-").replace("href=\"#", "href=\"#" + name + "-");
  }

  /** A table with few digits; the description of a column shows where the pointer rests. */
  static String table(Table table) {
    StringBuilder html = new StringBuilder("<div class=\"wide\"><table>\n<tr>");
    for (Column column : table.columns()) {
      html.append("<th").append(alignment(column)).append(" title=\"").append(escaped(column.description()))
          .append("\">").append(escaped(column.name().replace('_', ' ')))
          .append(column.unit().isEmpty() ? "" : "<br>" + escaped(column.unit())).append("</th>");
    }
    html.append("</tr>\n");
    for (int row = 0; row < table.rows(); row++) {
      html.append("<tr>");
      for (Column column : table.columns()) {
        String value = column.type().equals("float64") ? Numbers.plain(column.number(row)) : column.values().get(row);
        html.append("<td").append(alignment(column)).append('>').append(escaped(value)).append("</td>");
      }
      html.append("</tr>\n");
    }
    return html.append("</table></div>\n").toString();
  }

  private static String alignment(Column column) {
    return column.type().equals("string") ? "" : " class=\"number\"";
  }
}
