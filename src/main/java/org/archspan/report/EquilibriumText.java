package org.archspan.report;

import java.util.ArrayList;
import java.util.List;
import org.archspan.disk.Disk;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.GasState;
import org.archspan.units.OutputUnits;

/** The base state in words and a short table. */
public final class EquilibriumText {
  private static final int ROWS = 11;

  private EquilibriumText() {
  }

  /** The summary, wrapped to a width in characters. */
  public static String text(String title, Disk disk, Equilibrium equilibrium, OutputUnits units, int width) {
    TextBlock block = Assumptions.stillBlock(title, disk, equilibrium, units, width);
    block.heading("Base state")
        .labelled("scale height", Numbers.length(equilibrium.scaleHeight(), units))
        .labelled("column", Numbers.plain(units.surfaceDensity(equilibrium.surfaceDensity())) + " "
            + units.surfaceDensity())
        .labelled("residual", "force balance holds to better than 1e-10 of the weight over slabs that fill the domain");
    block.heading("Profile").table(2, rows(equilibrium, units));
    return block.text();
  }

  private static List<List<String>> rows(Equilibrium equilibrium, OutputUnits units) {
    List<List<String>> rows = new ArrayList<>();
    rows.add(List.of("height", "density", "p_gas", "p_field", "p_cr", "field", "Alfven", "beta", "gravity"));
    rows.add(List.of(units.length(), "g/cm^3", "erg/cm^3", "erg/cm^3", "erg/cm^3", units.field(), "km/s", "",
        "cm/s^2"));
    for (int i = 0; i < ROWS; i++) {
      double z = equilibrium.bottom() + (equilibrium.top() - equilibrium.bottom()) * i / (ROWS - 1);
      GasState state = equilibrium.at(z);
      rows.add(List.of(Numbers.plain(units.length(z)), Numbers.plain(state.density()),
          Numbers.plain(state.gasPressure()), Numbers.plain(state.magneticPressure()),
          Numbers.plain(state.cosmicRayPressure()), Numbers.plain(units.field(state.fieldStrength())),
          Numbers.plain(state.alfvenSpeed() / 1e5), Numbers.plain(state.plasmaBeta()),
          Numbers.plain(state.gravity())));
    }
    return rows;
  }
}
