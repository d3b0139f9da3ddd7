package org.archspan.report;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import org.archspan.shear.Amplification;
import org.archspan.units.OutputUnits;

/** A wave in a shearing disk as one JSON document. */
public final class AmplificationJson {
  private AmplificationJson() {
  }

  /** The document. */
  public static String text(ModelEcho model, Amplification wave, OutputUnits units) {
    int last = wave.time().length - 1;
    String rate = "1/" + units.time();
    List<Json> starts = wave.starts().stream().map(start -> new Json()
        .put("parity", start.parity().name().toLowerCase(Locale.ROOT)).put("winding", start.winding())
        .put("e-foldings", start.eFoldings())).toList();
    return new Json().put("model", model.json())
        .put("wavelength", units.length(2.0 * Math.PI / wave.wavenumber()), units.length())
        .put("parity", wave.parity().name().toLowerCase(Locale.ROOT))
        .put("shear", units.rate(wave.shear()), rate)
        .put("duration", units.time(wave.duration()), units.time())
        .put("winding", new Json().put("start", wave.winding()[0]).put("end", wave.winding()[last]))
        .put("e-foldings", wave.eFoldings()).put("amplification", wave.amplification()[last])
        .put("relative-error", wave.error()).put("density-contrast-per-mach", wave.densityContrast()[last])
        .put("peak-time", units.time(wave.time()[wave.peak()]), units.time())
        .put("peak-amplification", wave.amplification()[wave.peak()])
        .put("grows-at-the-end", wave.growsAtTheEnd())
        .put("late-growth-rate", units.rate(wave.lateGrowth()), rate)
        .put("rigid-growth-rate", units.rate(wave.rigidGrowth()), rate)
        .put("static-growth-rate", units.rate(wave.staticGrowth()), rate)
        .put("limit-growth-rate", units.rate(wave.limitGrowth()), rate)
        .put("starts", starts)
        .put("time-unit", units.time()).put("time", Arrays.stream(wave.time()).map(units::time).toArray())
        .put("winding-in-time", wave.winding()).put("amplification-in-time", wave.amplification())
        .put("density-contrast-in-time", wave.densityContrast())
        .put("warnings", wave.warnings()).text();
  }
}
