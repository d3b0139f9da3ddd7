package org.archspan.report;

/** The report as one HTML file that needs no network. */
final class ReportPage {
  private ReportPage() {
  }

  static String html(ModelEcho model, String summary, String sentence, String... figures) {
    StringBuilder page = new StringBuilder("<!DOCTYPE html>\n<html lang=\"en\">\n<head>\n<meta charset=\"utf-8\">\n"
        + "<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\">\n<title>")
        .append(escaped(model.title())).append("</title>\n<style>\n")
        .append("body{font:16px/1.5 sans-serif;max-width:52rem;margin:2rem auto;padding:0 1rem;color:#1a1c20;"
            + "background:#fff}\n")
        .append("pre{white-space:pre-wrap;font:13px/1.45 monospace;background:#eef0f3;padding:1rem}\n")
        .append("figure{margin:1.5rem 0;break-inside:avoid;background:#fff}\nfigure svg{max-width:100%;height:auto}\n")
        .append("table{border-collapse:collapse;font-size:14px}td{border-bottom:1px solid #b4b9c0;padding:.2rem .8rem"
            + " .2rem 0;vertical-align:top}\n")
        .append("@media(prefers-color-scheme:dark){body{background:#15181d;color:#e6e8eb}pre{background:#262b33}}\n")
        .append("@media print{body{max-width:none;margin:0;color:#000;background:#fff}pre{background:none;padding:0}}\n")
        .append("</style>\n</head>\n<body>\n<h1>").append(escaped(model.title())).append("</h1>\n<p><strong>")
        .append(escaped(sentence)).append("</strong></p>\n");
    for (String figure : figures) {
      if (!figure.isEmpty()) {
        page.append("<figure>\n").append(figure.substring(figure.indexOf("<svg"))).append("\n</figure>\n");
      }
    }
    page.append("<h2>Summary</h2>\n<pre>").append(escaped(summary)).append("</pre>\n<h2>Inputs</h2>\n<table>\n");
    model.inputs().forEach((key, value) -> page.append("<tr><td>").append(escaped(key)).append("</td><td>")
        .append(escaped(value)).append("</td></tr>\n"));
    return page.append("</table>\n</body>\n</html>\n").toString();
  }

  private static String escaped(String text) {
    return text.replace("&", "&amp;").replace("<", "&lt;").replace(">", "&gt;").replace("\"", "&quot;");
  }
}
