package org.archspan.report;

import org.archspan.inference.Inference;
import org.archspan.table.InferenceTable;
import org.archspan.units.OutputUnits;

/** What an observed spacing says about an input, as one JSON document. */
public final class InferenceJson {
  private InferenceJson() {
  }

  /**
   * The document.
   *
   * @param armWidth whether the arm has one, so that masses are whole
   */
  public static String text(ModelEcho model, Inference inference, OutputUnits units, boolean armWidth) {
    return new Json().put("model", model.json()).put("summary", InferenceText.sentence(inference, units))
        .put("observed", new Json().put("spacing", inference.observed().wavelength(), units.length())
            .put("error", inference.observed().error(), units.length()))
        .put("input", inference.input().key()).put("unit", inference.input().unit())
        .put("uncertain", inference.inputs().stream().map(EnsembleJson::input).toList())
        .put("intervals", ComparisonJson.rows(InferenceTable.intervals(inference)))
        .put("posterior", ComparisonJson.rows(InferenceTable.posterior(inference)))
        .put("reproducible", !inference.impossible())
        .put("nearest-draw-in-errors", inference.posterior().nearest())
        .put("draws", inference.posterior().draws()).put("effective-draws", inference.posterior().effectiveSize())
        .put("mean-likelihood", inference.posterior().foreseen()).put("failures", inference.failures())
        .put("relation", ComparisonJson.rows(InferenceTable.relation(inference, units, armWidth)))
        .put("warnings", InferenceText.warnings(inference)).text();
  }
}
