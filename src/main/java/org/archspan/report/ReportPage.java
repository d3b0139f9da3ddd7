package org.archspan.report;

import java.util.LinkedHashMap;
import java.util.Map;
import org.archspan.table.Table;

/** The report as one HTML file that needs no network and prints on A4. */
final class ReportPage {
  private static final String STYLE = """
      body{font:16px/1.5 sans-serif;max-width:52rem;margin:2rem auto;padding:0 1rem;color:#1a1c20;background:#fff}
      pre{white-space:pre-wrap;font:13px/1.45 monospace;background:#eef0f3;padding:1rem}
      figure{margin:1.5rem 0;break-inside:avoid}
      figure svg{max-width:100%;height:auto;background:#fff}
      .wide{overflow-x:auto}
      table{border-collapse:collapse;font-size:14px}
      td,th{border-bottom:1px solid #b4b9c0;padding:.2rem .8rem .2rem 0;vertical-align:top;text-align:left}
      .number{text-align:right;font-variant-numeric:tabular-nums}
      td.number{white-space:nowrap}
      @media screen and (prefers-color-scheme:dark){body{background:#15181d;color:#e6e8eb}pre{background:#262b33}}
      @page{size:A4;margin:16mm}
      @media print{body{font-size:11pt;max-width:none;margin:0;padding:0}pre{background:none;padding:0;font-size:8pt}
      .wide{overflow:visible;break-inside:avoid}table{font-size:7pt;line-height:1.2}td,th{padding-right:.4rem}
      h2{break-after:avoid}}
      """;

  private final Map<String, String> figures = new LinkedHashMap<>();
  private final Map<String, Table> tables = new LinkedHashMap<>();

  /** Adds a drawing (an SVG document) under a caption. */
  ReportPage figure(String caption, String svg) {
    figures.put(caption, svg);
    return this;
  }

  ReportPage table(String heading, Table table) {
    tables.put(heading, table);
    return this;
  }

  String html(ModelEcho model, String sentence, String summary) {
    StringBuilder page = new StringBuilder("<!DOCTYPE html>\n<html lang=\"en\">\n<head>\n<meta charset=\"utf-8\">\n"
        + "<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\">\n<title>")
        .append(Html.escaped(model.title())).append("</title>\n<style>\n").append(STYLE)
        .append("</style>\n</head>\n<body>\n<h1>").append(Html.escaped(model.title())).append("</h1>\n<p><strong>")
        .append(Html.escaped(sentence)).append("</strong></p>\n<h2>Summary</h2>\n<pre>").append(Html.escaped(summary))
        .append("</pre>\n");
    figures.forEach((caption, svg) -> page.append("<figure>\n")
        .append(Html.inline(svg, caption.toLowerCase(java.util.Locale.ROOT).replaceAll("[^a-z]+", "-")))
        .append("\n<figcaption>").append(Html.escaped(caption)).append("</figcaption>\n</figure>\n"));
    tables.forEach((heading, table) -> page.append("<h2>").append(Html.escaped(heading)).append("</h2>\n")
        .append(Html.table(table)));
    page.append("<h2>Inputs</h2>\n<table>\n");
    model.inputs().forEach((key, value) -> page.append("<tr><td>").append(Html.escaped(key)).append("</td><td>")
        .append(Html.escaped(value)).append("</td></tr>\n"));
    return page.append("</table>\n</body>\n</html>\n").toString();
  }
}
