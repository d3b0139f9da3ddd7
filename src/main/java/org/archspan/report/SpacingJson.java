package org.archspan.report;

import java.util.Locale;
import java.util.Optional;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.spacing.BranchPeak;
import org.archspan.spacing.Certificate;
import org.archspan.spacing.CloudComplex;
import org.archspan.spacing.RotatingAnswer;
import org.archspan.spacing.SpacingResult;
import org.archspan.units.OutputUnits;

/** The answer of the main job as one JSON document. */
public final class SpacingJson {
  private final SpacingResult result;
  private final OutputUnits units;

  private SpacingJson(SpacingResult result, OutputUnits units) {
    this.result = result;
    this.units = units;
  }

  /** The document. */
  public static String text(ModelEcho model, SpacingResult result, OutputUnits units) {
    return new SpacingJson(result, units).document(model).text();
  }

  private Json document(ModelEcho model) {
    Json json = new Json().put("model", model.json()).put("stable", result.stable());
    json.put("fastest", result.fastest().map(this::peak).orElse(null));
    json.put("branches", result.branches().stream().map(this::peak).toList());
    json.put("spacing", result.spacingPeak().map(this::spacing).orElse(null));
    if (result.range().direction().isPresent()) {
      double direction = Math.toDegrees(result.range().direction().getAsDouble());
      json.put("wave-direction", direction, "deg");
      json.put("crest-direction", direction > 0.0 ? direction - 90.0 : direction + 90.0, "deg");
    }
    json.put("limit-across", new Json()
        .put("growth-rate", units.rate(result.acrossLimit().growthRate()), "1/" + units.time())
        .put("wavelength", units.length(2.0 * Math.PI / result.acrossLimit().wavenumber()), units.length())
        .put("height", units.length(result.acrossLimit().height()), units.length()));
    json.put("longest-stable-wavelength", result.longestStableWavelength().isPresent()
        ? new Json().put("value", units.length(result.longestStableWavelength().getAsDouble()))
            .put("unit", units.length()) : null);
    json.put("complex", result.complex().map(this::complex).orElse(null));
    json.put("equilibrium", equilibrium(result.equilibrium(), result.forceBalanceResidual(), units));
    json.put("certificate", certificate(result.certificate()));
    result.rotation().ifPresent(rotation -> json.put("rotation", rotation(rotation))
        .put("without-rotation", without(rotation.without())));
    result.elasticities().ifPresent(answers -> json.put("elasticities", ElasticityWords.json(answers)));
    json.put("warnings", result.warnings());
    return json;
  }

  private Json peak(BranchPeak peak) {
    double scaleHeight = result.equilibrium().scaleHeight();
    double crossingTime = scaleHeight / result.equilibrium().dispersion();
    return new Json().put("wavelength", units.length(peak.wavelength()), units.length())
        .put("growth-rate", units.rate(peak.growthRate()), "1/" + units.time())
        .put("growth-time", units.time(peak.growthTime()), units.time())
        .put("wavenumber-times-scale-height", peak.wavenumber() * scaleHeight)
        .put("growth-rate-times-crossing-time", peak.growthRate() * crossingTime)
        .put("parity", peak.continuum() ? null : peak.parity().name().toLowerCase(Locale.ROOT))
        .put("mode-order", peak.order())
        .put("relative-error", peak.growthError())
        .put("wavelength-relative-error", peak.wavelengthError())
        .put("unstable-modes", peak.unstableModes())
        .put("oscillation-frequency", units.rate(peak.frequency()), "1/" + units.time())
        .put("centroid-height", units.length(peak.centroidHeight()), units.length())
        .put("column-contrast", peak.columnContrast())
        .put("held-by", peak.heldBy().name().toLowerCase(Locale.ROOT))
        .put("work", peak.work().map(work -> ResultJson.work(work, units)).orElse(null))
        .put("taller-domain", new Json().put("growth-rate-change", peak.tallerGrowthChange())
            .put("wavelength-change", peak.tallerWavelengthChange()));
  }

  private Json rotation(RotatingAnswer rotation) {
    return new Json().put("angular-speed", units.rate(rotation.angularSpeed()), "1/" + units.time())
        .put("modes-counted-by", "argument principle")
        .put("slowest-growth-counted", units.rate(rotation.slowestCounted()), "1/" + units.time())
        .put("contour-points", rotation.contourPoints())
        .put("checked-wavelengths", rotation.checkedWavelengths());
  }

  private Json without(SpacingResult still) {
    SpacingJson other = new SpacingJson(still, units);
    return new Json().put("fastest", still.fastest().map(other::peak).orElse(null))
        .put("branches", still.branches().stream().map(other::peak).toList())
        .put("spacing", still.spacingPeak().map(other::spacing).orElse(null));
  }

  private Json spacing(BranchPeak peak) {
    Optional<Integer> gathering = result.spacing();
    Optional<Integer> branch = gathering.or(() -> Optional.of(result.branches().indexOf(peak)).filter(i -> i >= 0));
    Json json = new Json().put("wavelength", units.length(peak.wavelength()), units.length())
        .put("growth-time", units.time(peak.growthTime()), units.time());
    if (branch.isPresent()) {
      json.put("branch", branch.get());
    } else {
      json.put("branch", (String) null);
    }
    return json.put("gathers-disk-gas", gathering.isPresent())
        .put("gathering-height", units.length(result.gatheringHeight()), units.length());
  }

  private Json complex(CloudComplex complex) {
    Json json = new Json();
    if (complex.mass().isPresent()) {
      json.put("mass", units.mass(complex.mass().getAsDouble()), units.mass());
    } else {
      json.put("mass", (Json) null);
    }
    json.put("mass-per-width", units.mass(complex.massPerWidth()) * units.centimetresPerLength(),
        units.mass() + "/" + units.length());
    return complex.eFoldings().isPresent() ? json.put("e-foldings-in-arm", complex.eFoldings().getAsDouble())
        : json.put("e-foldings-in-arm", (Json) null);
  }

  private Json certificate(Certificate certificate) {
    return new Json().put("growth-rate-bound", units.rate(certificate.bound()), "1/" + units.time())
        .put("shortest", units.length(certificate.shortest()), units.length())
        .put("longest", units.length(certificate.longest()), units.length())
        .put("intervals", certificate.intervals()).put("factorisations", certificate.factorisations());
  }

  /** The base state in numbers. */
  static Json equilibrium(Equilibrium equilibrium, double residual, OutputUnits units) {
    return new Json().put("scale-height", units.length(equilibrium.scaleHeight()), units.length())
        .put("surface-density", units.surfaceDensity(equilibrium.surfaceDensity()), units.surfaceDensity())
        .put("midplane-field", units.field(equilibrium.at(equilibrium.bottom()).fieldStrength()), units.field())
        .put("dispersion", equilibrium.dispersion() / 1e5, "km/s")
        .put("midplane-density", equilibrium.at(equilibrium.bottom()).density(), "g/cm^3")
        .put("top", units.length(equilibrium.top()), units.length())
        .put("top-boundary", equilibrium.topBoundary().name().toLowerCase(Locale.ROOT))
        .put("force-balance-residual", residual);
  }
}
