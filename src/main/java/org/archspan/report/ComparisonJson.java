package org.archspan.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.archspan.comparison.Comparison;
import org.archspan.comparison.GasAmount;
import org.archspan.comparison.VariedInput;
import org.archspan.table.Column;
import org.archspan.table.ComparisonTable;
import org.archspan.table.Table;
import org.archspan.units.OutputUnits;

/** The model under several assumptions as one JSON document. */
public final class ComparisonJson {
  private ComparisonJson() {
  }

  /** The document. */
  public static String text(ModelEcho model, Comparison comparison, GasAmount amount, OutputUnits units) {
    List<Json> varied = new ArrayList<>();
    for (VariedInput input : comparison.inputs()) {
      varied.add(new Json().put("key", input.key()).put("unit", input.unit()).put("values", input.values()));
    }
    Json held = new Json().put("amount", amount.held().name().toLowerCase(Locale.ROOT).replace('_', '-'))
        .put("surface-density", units.surfaceDensity(amount.surfaceDensity()), units.surfaceDensity())
        .put("midplane-density", amount.bottomDensity(), "g/cm^3");
    return new Json().put("model", model.json()).put("summary", ComparisonText.sentence(comparison, units))
        .put("varied", varied).put("held", held).put("failures", comparison.failures())
        .put("cases", rows(ComparisonTable.of(comparison, units))).text();
  }

  /** One object for each row; numbers with their units, empty words as null. */
  static List<Json> rows(Table table) {
    List<Json> rows = new ArrayList<>();
    for (int row = 0; row < table.rows(); row++) {
      Json json = new Json();
      for (Column column : table.columns()) {
        String key = column.name().replace('_', '-');
        if (column.type().equals("string")) {
          String word = column.values().get(row);
          json.put(key, word.isEmpty() ? null : word);
        } else if (column.unit().isEmpty()) {
          json.put(key, column.number(row));
        } else {
          json.put(key, column.number(row), column.unit());
        }
      }
      rows.add(json);
    }
    return rows;
  }
}
