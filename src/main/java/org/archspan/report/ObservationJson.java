package org.archspan.report;

import java.util.LinkedHashMap;
import java.util.Map;
import org.archspan.observe.ChanceProbability;
import org.archspan.observe.FittedArm;
import org.archspan.observe.MeasuredLength;
import org.archspan.observe.ObservedArm;
import org.archspan.observe.PeriodogramPeak;
import org.archspan.table.ComplexTable;
import org.archspan.units.OutputUnits;

/** The spacing along an arm as one JSON document; its "spacing" is what `infer` reads. */
public final class ObservationJson {
  private ObservationJson() {
  }

  /** The document. */
  public static String text(ObservationSource source, ObservedArm arm, OutputUnits units) {
    return new Json().put("table", source.file()).put("geometry", geometry(source)).put("seed", source.seed())
        .put("summary", ObservationText.sentence(arm, units))
        .put("spacing", length(arm.peak().wavelength(), units).put("method", "periodogram")
            .put("p-value", arm.chance().peak().value()))
        .put("arm", arm(arm, units)).put("periodogram", periodogram(arm, units))
        .put("nearest", length(arm.nearest(), units).put("chance", chance(arm.chance().regular())))
        .put("separation", length(arm.separation(), units))
        .put("complexes", ComparisonJson.rows(ComplexTable.complexes(arm, source.names(), units)))
        .put("warnings", ObservationText.warnings(arm)).text();
  }

  private static Json arm(ObservedArm observed, OutputUnits units) {
    FittedArm arm = observed.arm();
    return new Json().put("pitch-angle", new Json().put("value", Math.toDegrees(arm.spiral().pitchAngle()))
        .put("unit", "deg").put("error", Math.toDegrees(arm.pitchError())))
        .put("length", observed.chain().length() / units.centimetresPerLength(), units.length())
        .put("turns", ObservationText.turns(observed)).put("width-over-radius", arm.width())
        .put("complexes", observed.chain().complexes().size())
        .put("strays", observed.positions().size() - observed.chain().complexes().size())
        .put("log-likelihood", arm.logLikelihood()).put("lead-over-next-arm", observed.lead());
  }

  private static Json periodogram(ObservedArm arm, OutputUnits units) {
    PeriodogramPeak peak = arm.peak();
    return new Json().put("shortest", units.length(1.0 / peak.grid().frequency(peak.grid().size() - 1)), units.length())
        .put("longest", units.length(1.0 / peak.grid().frequency(0)), units.length()).put("power", peak.power())
        .put("power-exceeded-by-chance", new Json().put("0.05", arm.chance().level(0.05))
            .put("0.01", arm.chance().level(0.01)).put("0.001", arm.chance().level(0.001)))
        .put("chance", chance(arm.chance().peak())).put("bootstrap-samples-at-this-peak", peak.steadiness());
  }

  private static Json chance(ChanceProbability chance) {
    return new Json().put("p-value", chance.value()).put("lower", chance.lower()).put("upper", chance.upper())
        .put("exceeding", chance.exceeding()).put("trials", chance.trials());
  }

  private static Json length(MeasuredLength length, OutputUnits units) {
    return new Json().put("value", units.length(length.value())).put("unit", units.length())
        .put("error", units.length(length.error()));
  }

  /** The geometry with the keys of the options, where the summary shortens them. */
  private static Map<String, String> geometry(ObservationSource source) {
    Map<String, String> keys = new LinkedHashMap<>();
    source.geometry().forEach((key, value) -> keys.put(key.equals("pos. angle") ? "position-angle" : key, value));
    return keys;
  }
}
