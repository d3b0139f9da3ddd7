package org.archspan.table;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import org.archspan.shear.Amplification;
import org.archspan.shear.StartGain;
import org.archspan.units.OutputUnits;

/** A wave in a shearing disk against time, and what other starts would have gained. */
public final class AmplificationTable {
  private AmplificationTable() {
  }

  /** One row for each time. */
  public static Table of(Amplification wave, OutputUnits units) {
    double[] time = Arrays.stream(wave.time()).map(units::time).toArray();
    double[] energy = Arrays.stream(wave.amplification()).map(gain -> gain * gain).toArray();
    return new Table("amplification of a wave wound up by differential rotation", List.of(
        Column.of("time", units.time(), "since the start", time),
        Column.of("winding", "", "radial over azimuthal wavenumber; positive: trailing", wave.winding()),
        Column.of("velocity_gain", "", "root of the kinetic energy over that at the start", wave.amplification()),
        Column.of("energy_gain", "", "kinetic energy over that at the start", energy),
        Column.of("density_contrast", "", "root mean square by mass, for a start at the isothermal speed",
            wave.densityContrast())));
  }

  /** One row for each start that was tried. */
  public static Table starts(Amplification wave) {
    return new Table("e-foldings that the best motion gains from each start", List.of(
        Column.of("parity", "symmetry about the midplane",
            wave.starts().stream().map(start -> start.parity().name().toLowerCase(Locale.ROOT)).toList()),
        Column.of("winding", "", "radial over azimuthal wavenumber at the start; negative: leading",
            wave.starts().stream().mapToDouble(StartGain::winding).toArray()),
        Column.of("e_foldings", "", "of the velocity by the end, good to a per cent or so",
            wave.starts().stream().mapToDouble(StartGain::eFoldings).toArray())));
  }
}
