package org.archspan.report;

import org.archspan.rivals.RivalInputs;
import org.archspan.rivals.RivalResult;
import org.archspan.table.RivalTable;
import org.archspan.units.OutputUnits;

/** Rival instabilities as one JSON document. */
public final class RivalJson {
  private RivalJson() {
  }

  /** The document. */
  public static String text(ModelEcho model, RivalResult result, RivalInputs inputs, OutputUnits units) {
    return new Json().put("model", model.json()).put("summary", RivalText.sentence(result, units))
        .put("winner", result.winner().map(rival -> rival.name()).orElse(null)).put("failed", result.failed())
        .put("stars", inputs.stars().map(stars -> new Json()
            .put("surface-density", units.surfaceDensity(stars.surfaceDensity()), units.surfaceDensity())
            .put("dispersion", 1e-5 * stars.dispersion(), "km/s")
            .put("height", units.length(stars.height()), units.length())).orElse(null))
        .put("instabilities", ComparisonJson.rows(RivalTable.of(result, units)))
        .put("interfaces", ComparisonJson.rows(RivalTable.limits(result.interfaces(), units)))
        .put("assumed", RivalText.assumed()).text();
  }
}
