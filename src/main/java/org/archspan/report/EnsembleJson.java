package org.archspan.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.archspan.table.EnsembleTable;
import org.archspan.uncertainty.EnsembleSummary;
import org.archspan.uncertainty.LogHistogram;
import org.archspan.uncertainty.UncertainInput;
import org.archspan.uncertainty.Uncertainty;
import org.archspan.units.OutputUnits;

/** What an ensemble says, as one JSON document. */
public final class EnsembleJson {
  private EnsembleJson() {
  }

  /**
   * The document.
   *
   * @param armWidth whether the arm has one, so that masses are whole
   */
  public static String text(ModelEcho model, EnsembleSummary summary, OutputUnits units, boolean armWidth) {
    return new Json().put("model", model.json()).put("summary", EnsembleText.sentence(summary, units))
        .put("uncertain", summary.design().inputs().stream().map(EnsembleJson::input).toList())
        .put("seed", summary.design().seed()).put("first-draw", summary.firstDraw())
        .put("last-draw", summary.lastDraw())
        .put("draws", summary.draws()).put("unstable", summary.unstable()).put("stable", summary.stable())
        .put("failures", summary.failed()).put("held-by-disk", summary.heldBy("disk"))
        .put("held-by-lid", summary.heldBy("lid")).put("held-by-halo", summary.heldBy("halo"))
        .put("gathering", summary.gathering())
        .put("wavelength", range(summary.wavelength(), units.length()))
        .put("growth-time", range(summary.growthTime(), units.time()))
        .put(armWidth ? "mass" : "mass-per-width",
            range(summary.mass(), units.mass() + (armWidth ? "" : "/" + units.length())))
        .put("sensitivity-groups", summary.ofWavelength().groups())
        .put("sensitivities", ComparisonJson.rows(EnsembleTable.sensitivities(summary)))
        .put("reasons", reasons(summary)).text();
  }

  static Json input(UncertainInput input) {
    Uncertainty of = input.distribution();
    boolean factor = of.byFactors();
    return new Json().put("key", input.key()).put("unit", input.unit())
        .put("shape", of.shape().name().toLowerCase(Locale.ROOT).replace('_', '-'))
        .put("centre", of.centre() / input.unitSize())
        .put("spread", factor ? of.spread() : of.spread() / input.unitSize());
  }

  static Json range(LogHistogram values, String unit) {
    return new Json().put("unit", unit).put("median", values.quantile(0.5))
        .put("range-68", new double[] {values.quantile(0.16), values.quantile(0.84)})
        .put("range-95", new double[] {values.quantile(0.025), values.quantile(0.975)});
  }

  private static List<Json> reasons(EnsembleSummary summary) {
    List<Json> reasons = new ArrayList<>();
    summary.reasons().forEach((reason, count) -> reasons.add(new Json().put("reason", reason).put("draws", count)));
    return reasons;
  }
}
