package org.archspan.report;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import org.archspan.figure.Figure;
import org.archspan.figure.FigureImage;
import org.archspan.table.Ecsv;
import org.archspan.table.Table;
import org.archspan.table.WholeFile;
import org.archspan.table.WriteException;

/** Files that are made together and written together: either none of them exists beforehand, or all may be replaced. */
final class OutputFolder {
  private final Map<String, byte[]> files = new LinkedHashMap<>();

  OutputFolder text(String name, String content) {
    files.put(name, content.getBytes(StandardCharsets.UTF_8));
    return this;
  }

  OutputFolder table(String name, Table table) {
    return text(name + ".ecsv", Ecsv.text(table));
  }

  OutputFolder figure(String name, Figure figure) {
    files.put(name + ".svg", FigureImage.svgBytes(figure));
    files.put(name + ".png", FigureImage.png(figure));
    return this;
  }

  /** The text of a file made before. */
  String content(String name) {
    return new String(files.get(name), StandardCharsets.UTF_8);
  }

  /** Writes all of them; refuses before the first if one exists and may not be replaced. */
  void write(Path folder, boolean overwrite) throws WriteException {
    if (Files.exists(folder) && !Files.isDirectory(folder)) {
      throw new WriteException(folder + " is a file; --out needs a folder");
    }
    for (String name : files.keySet()) {
      if (!overwrite && Files.exists(folder.resolve(name))) {
        throw new WriteException(folder.resolve(name) + " exists; nothing was changed (use --overwrite to replace it)");
      }
    }
    for (Map.Entry<String, byte[]> file : files.entrySet()) {
      WholeFile.write(folder.resolve(file.getKey()), file.getValue(), overwrite);
    }
  }
}
