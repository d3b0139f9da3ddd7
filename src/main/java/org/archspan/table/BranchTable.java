package org.archspan.table;

import java.util.List;
import java.util.Locale;
import java.util.function.ToDoubleFunction;
import org.archspan.spacing.BranchPeak;
import org.archspan.units.OutputUnits;

/** The fastest mode of each unstable branch. */
public final class BranchTable {
  private BranchTable() {
  }

  /** One row for each branch, fastest first. */
  public static Table of(List<BranchPeak> branches, OutputUnits units) {
    return new Table("unstable branches", List.of(
        Column.of("parity", "symmetry about the midplane",
            branches.stream().map(peak -> peak.parity().name().toLowerCase(Locale.ROOT)).toList()),
        Column.of("mode_order", "0 for the fastest at its wavelength",
            branches.stream().mapToInt(BranchPeak::order).toArray()),
        column(branches, "wavelength", units.length(), "fastest wavelength", p -> units.length(p.wavelength())),
        column(branches, "growth_rate", "1/" + units.time(), "of the fastest", p -> units.rate(p.growthRate())),
        column(branches, "growth_time", units.time(), "e-folding time", p -> units.time(p.growthTime())),
        column(branches, "growth_rate_error", "", "estimated relative error", BranchPeak::growthError),
        column(branches, "wavelength_error", "", "estimated relative error", BranchPeak::wavelengthError),
        Column.of("unstable_modes", "modes of this parity that grow at this wavelength; -1 for infinitely many",
            branches.stream().mapToInt(BranchPeak::unstableModes).toArray()),
        column(branches, "centroid_height", units.length(), "of the kinetic energy",
            p -> units.length(p.centroidHeight())),
        column(branches, "column_contrast", "", "when the midplane layer moves by one scale height",
            BranchPeak::columnContrast),
        Column.of("held_by", "what confines the mode",
            branches.stream().map(peak -> peak.heldBy().name().toLowerCase(Locale.ROOT)).toList()),
        column(branches, "taller_growth_change", "", "relative change in a domain 1.5 times as tall",
            BranchPeak::tallerGrowthChange),
        column(branches, "taller_wavelength_change", "", "relative change in a domain 1.5 times as tall",
            BranchPeak::tallerWavelengthChange)));
  }

  private static Column column(List<BranchPeak> branches, String name, String unit, String description,
      ToDoubleFunction<BranchPeak> value) {
    return Column.of(name, unit, description, branches.stream().mapToDouble(value).toArray());
  }
}
