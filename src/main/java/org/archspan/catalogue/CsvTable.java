package org.archspan.catalogue;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;

/**
 * Reads CSV with units in its header ({@code east [arcsec], north [arcsec]}), or ECSV, whose commented header carries
 * them ({@code # - {name: east, unit: arcsec, datatype: float64}}).
 */
final class CsvTable {
  private static final Pattern BRACKETED = Pattern.compile("([^\\[]*?)\\s*\\[([^\\]]*)\\]\\s*");
  private static final Pattern NAME = Pattern.compile("\\bname:\\s*([^,}]+)");
  private static final Pattern UNIT = Pattern.compile("\\bunit:\\s*([^,}]+)");
  private static final Pattern COMMA = Pattern.compile("(?m)^#\\s*delimiter:\\s*['\"],['\"]");

  private CsvTable() {
  }

  static RawTable read(String file, String text) {
    CSVFormat format = CSVFormat.DEFAULT.builder().setCommentMarker('#').setIgnoreEmptyLines(true).setTrim(true)
        .setDelimiter(text.startsWith("# %ECSV") && !COMMA.matcher(text).find() ? ' ' : ',').get();
    List<String> names = new ArrayList<>();
    List<String> units = new ArrayList<>();
    List<List<String>> rows = new ArrayList<>();
    List<Integer> places = new ArrayList<>();
    try (CSVParser parser = CSVParser.parse(text, format)) {
      for (CSVRecord record : parser) {
        int line = (int) parser.getCurrentLineNumber();
        if (names.isEmpty()) {
          header(record, commented(text), names, units);
        } else if (record.size() != names.size()) {
          throw new RefusedTableException(List.of(file + ":" + line + ": found " + record.size() + " values; the header"
              + " has " + names.size() + " columns"));
        } else {
          rows.add(record.toList());
          places.add(line);
        }
      }
    } catch (IOException | UncheckedIOException broken) {
      throw new RefusedTableException(List.of(file + ": not a CSV table: " + broken.getMessage()));
    }
    return new RawTable(file, "line", names, units, rows, places);
  }

  private static void header(CSVRecord record, Map<String, String> commented, List<String> names, List<String> units) {
    for (String cell : record) {
      Matcher matcher = BRACKETED.matcher(cell);
      boolean bracketed = matcher.matches();
      names.add(bracketed ? matcher.group(1) : cell);
      units.add(bracketed ? matcher.group(2) : commented.getOrDefault(cell, ""));
    }
  }

  /** Units by name of column in the commented header of ECSV. */
  private static Map<String, String> commented(String text) {
    Map<String, String> units = new HashMap<>();
    text.lines().filter(line -> line.startsWith("#")).forEach(line -> {
      Matcher name = NAME.matcher(line);
      Matcher unit = UNIT.matcher(line);
      if (name.find() && unit.find()) {
        units.put(unquoted(name.group(1)), unquoted(unit.group(1)));
      }
    });
    return units;
  }

  private static String unquoted(String text) {
    return text.strip().replaceAll("^['\"]|['\"]$", "");
  }
}
