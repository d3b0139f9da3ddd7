package org.archspan.modelfile;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVParser;
import org.apache.commons.csv.CSVRecord;
import org.archspan.gravity.GravityLaw;
import org.archspan.gravity.TableGravity;
import org.archspan.units.Dimension;
import org.archspan.units.Unit;
import org.archspan.units.UnitException;
import org.archspan.units.UnitParser;

/**
 * Reads a table of height and acceleration: CSV with units in its header ({@code z [pc], g [cm/s^2]}), or ECSV, whose
 * commented header carries them ({@code # - {name: z, unit: pc, datatype: float64}}).
 */
final class GravityTable {
  private static final Pattern BRACKETED = Pattern.compile("[^\\[]*\\[([^\\]]+)\\]\\s*");
  private static final Pattern ECSV_COLUMN = Pattern.compile("#\\s*-\\s*\\{.*\\bunit:\\s*([^,}]+?)\\s*[,}].*");
  private static final Pattern ECSV_COMMA = Pattern.compile("(?m)^#\\s*delimiter:\\s*['\"],['\"]");
  private static final int MOST_FAULTS = 20;
  private static final int MOST_ROWS = 2000;

  private final List<Diagnostic> faults;

  GravityTable(List<Diagnostic> faults) {
    this.faults = faults;
  }

  Optional<GravityLaw> read(Path file) throws UnreadableFileException {
    Optional<byte[]> bytes = SourceText.bytes(file, SourceText.LARGEST_TABLE);
    Optional<String> text = bytes.flatMap(SourceText::text);
    if (text.isEmpty()) {
      faults.add(new Diagnostic(file.toString(), 0, "", bytes.isEmpty() ? "larger than 16 MB" : "not UTF-8 text",
          "a table of height and acceleration is needed"));
      return Optional.empty();
    }
    int before = faults.size();
    List<double[]> rows = rows(file.toString(), text.get());
    if (rows.size() > MOST_ROWS) {
      faults.add(new Diagnostic(file.toString(), 0, "", rows.size() + " rows", "at most " + MOST_ROWS
          + " are allowed, for every row is an edge of the mesh; thin the table"));
    }
    if (faults.size() > before) {
      return Optional.empty();
    }
    try {
      return Optional.of(new TableGravity(rows.stream().mapToDouble(row -> row[0]).toArray(),
          rows.stream().mapToDouble(row -> row[1]).toArray()));
    } catch (IllegalArgumentException fault) {
      faults.add(new Diagnostic(file.toString(), 0, "", fault.getMessage(), ""));
      return Optional.empty();
    }
  }

  private List<double[]> rows(String file, String text) {
    List<String> ecsvUnits = text.lines().filter(line -> line.startsWith("#")).map(ECSV_COLUMN::matcher)
        .filter(Matcher::matches).map(matcher -> matcher.group(1).replace("'", "").replace("\"", "")).toList();
    List<double[]> rows = new ArrayList<>();
    double[] factors = null;
    CSVFormat format = CSVFormat.DEFAULT.builder().setCommentMarker('#').setIgnoreEmptyLines(true).setTrim(true)
        .setDelimiter(text.startsWith("# %ECSV") && !ECSV_COMMA.matcher(text).find() ? ' ' : ',').get();
    try (CSVParser parser = CSVParser.parse(text, format)) {
      for (CSVRecord row : parser) {
        if (factors == null) {
          factors = factors(file, (int) parser.getCurrentLineNumber(), row, ecsvUnits);
          if (factors == null) {
            return rows;
          }
        } else if (faults.size() < MOST_FAULTS) {
          double above = rows.isEmpty() ? Double.NEGATIVE_INFINITY : rows.get(rows.size() - 1)[0];
          row(file, (int) parser.getCurrentLineNumber(), row, factors, above).ifPresent(rows::add);
        }
      }
    } catch (IOException | UncheckedIOException broken) {
      faults.add(new Diagnostic(file, 0, "", "not a CSV table: " + broken.getMessage(), ""));
    }
    if (factors == null) {
      faults.add(new Diagnostic(file, 0, "", "the table is empty", "a header and at least two rows are needed"));
    }
    return rows;
  }

  private double[] factors(String file, int line, CSVRecord header, List<String> ecsvUnits) {
    if (header.size() != 2) {
      faults.add(new Diagnostic(file, line, "", "found " + header.size() + " columns", "two are needed: height and"
          + " acceleration, separated by a comma"));
      return null;
    }
    double[] factors = new double[2];
    Dimension[] dimensions = {new Dimension(2, 0, 0, 0), new Dimension(2, 0, -4, 0)};
    for (int i = 0; i < 2; i++) {
      Matcher bracketed = BRACKETED.matcher(header.get(i));
      String unit = bracketed.matches() ? bracketed.group(1) : ecsvUnits.size() == 2 ? ecsvUnits.get(i) : "";
      try {
        Unit parsed = UnitParser.parse(unit);
        factors[i] = parsed.factor();
        if (!parsed.dimension().equals(dimensions[i])) {
          throw new UnitException("the unit " + unit + " of column " + (i + 1) + " has the wrong dimension");
        }
      } catch (UnitException fault) {
        faults.add(new Diagnostic(file, line, "", fault.getMessage(),
            "write the units in the header: z [pc], g [cm/s^2]"));
        return null;
      }
    }
    return factors;
  }

  private Optional<double[]> row(String file, int line, CSVRecord row, double[] factors, double above) {
    if (row.size() != 2) {
      faults.add(new Diagnostic(file, line, "", "found " + row.size() + " values", "each row needs two"));
      return Optional.empty();
    }
    double[] values = new double[2];
    for (int i = 0; i < 2; i++) {
      try {
        values[i] = Double.parseDouble(row.get(i)) * factors[i];
      } catch (NumberFormatException notANumber) {
        values[i] = Double.NaN;
      }
      if (!Double.isFinite(values[i])) {
        faults.add(new Diagnostic(file, line, "", row.get(i).isEmpty() ? "a gap in column " + (i + 1)
            : "\"" + row.get(i) + "\" is not a finite number", "fill it or remove the row"));
        return Optional.empty();
      }
    }
    if (values[0] < 0.0 || values[0] <= above) {
      faults.add(new Diagnostic(file, line, "", "the height \"" + row.get(0) + "\" "
          + (values[0] < 0.0 ? "is negative" : "does not exceed the one before"), "heights must ascend from 0 or above"));
      return Optional.empty();
    }
    return Optional.of(values);
  }
}
