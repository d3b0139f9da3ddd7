package org.archspan.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.stream.IntStream;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.ForceBalance;
import org.archspan.spacing.PlaneResult;
import org.archspan.stability.EigenMode;
import org.archspan.stability.GrowthCurve;
import org.archspan.stability.WorkTerms;
import org.archspan.table.Column;
import org.archspan.table.Table;
import org.archspan.units.OutputUnits;

/** The answers of the smaller commands as JSON documents. */
public final class ResultJson {
  private ResultJson() {
  }

  /** The base state: its numbers, and its table by columns. */
  public static String equilibrium(ModelEcho model, Equilibrium equilibrium, Table table, OutputUnits units) {
    return new Json().put("model", model.json())
        .put("equilibrium", SpacingJson.equilibrium(equilibrium, ForceBalance.residual(equilibrium), units))
        .put("profile", columns(table)).text();
  }

  private static Json columns(Table table) {
    Json json = new Json();
    for (Column column : table.columns()) {
      json.put(column.name(), new Json().put("unit", column.unit()).put("values",
          IntStream.range(0, table.rows()).mapToDouble(column::number).toArray()));
    }
    return json;
  }

  /** Growth curves, one object each. */
  public static String dispersion(ModelEcho model, List<GrowthCurve> curves, OutputUnits units) {
    List<Json> list = new ArrayList<>();
    for (GrowthCurve curve : curves) {
      list.add(new Json().put("parity", curve.parity().name().toLowerCase(Locale.ROOT))
          .put("mode-order", curve.order())
          .put("cross-wavelength", units.length(2.0 * Math.PI / curve.crossWavenumber()), units.length())
          .put("length-unit", units.length()).put("rate-unit", "1/" + units.time())
          .put("wavelength", curve.points().stream().mapToDouble(p -> units.length(p.wavelength())).toArray())
          .put("growth-rate", curve.points().stream().mapToDouble(p -> units.rate(p.growthRate())).toArray())
          .put("relative-error", curve.points().stream().mapToDouble(p -> p.relativeError()).toArray())
          .put("unstable-modes", curve.points().stream().map(p -> p.unstableModes()).toList()));
    }
    return new Json().put("model", model.json()).put("curves", list).text();
  }

  /** One mode. */
  public static String mode(ModelEcho model, EigenMode mode, Table table, OutputUnits units) {
    return new Json().put("model", model.json())
        .put("parity", mode.parity().name().toLowerCase(Locale.ROOT)).put("mode-order", mode.order())
        .put("wavelength", units.length(2.0 * Math.PI / mode.wavenumber()), units.length())
        .put("growth-rate", units.rate(mode.growthRate()), "1/" + units.time())
        .put("centroid-height", units.length(mode.centroidHeight()), units.length())
        .put("column-contrast", mode.columnContrast()).put("work", work(mode.work(), units)).put("profile", columns(table)).text();
  }

  static Json work(WorkTerms work, OutputUnits units) {
    double square = units.secondsPerTime() * units.secondsPerTime();
    return new Json().put("unit", "1/" + units.time() + "^2")
        .put("weight", work.weight() * square).put("stratification", work.stratification() * square)
        .put("field-tension", work.fieldTension() * square).put("field-compression", work.fieldCompression() * square)
        .put("gas-compression", work.gasCompression() * square)
        .put("cosmic-ray-compression", work.cosmicRayCompression() * square)
        .put("self-gravity", work.selfGravity() * square)
        .put("top-surface", work.topSurface() * square).put("sum", work.sum() * square);
  }

  /** Growth over the plane of wavenumbers. */
  public static String plane(ModelEcho model, PlaneResult plane, OutputUnits units) {
    List<Object> rows = new ArrayList<>();
    for (double[] row : plane.growthRate()) {
      rows.add(java.util.Arrays.stream(row).map(units::rate).boxed().toList());
    }
    return new Json().put("model", model.json()).put("wavenumber-unit", "1/" + units.length())
        .put("rate-unit", "1/" + units.time())
        .put("along", java.util.Arrays.stream(plane.along()).map(units::wavenumber).toArray())
        .put("across", java.util.Arrays.stream(plane.across()).map(units::wavenumber).toArray())
        .put("growth-rate", rows)
        .put("limit-across", java.util.Arrays.stream(plane.limit()).map(units::rate).toArray()).text();
  }
}
