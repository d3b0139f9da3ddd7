package org.archspan.table;

import java.util.List;
import java.util.function.ToDoubleFunction;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.GasState;
import org.archspan.units.OutputUnits;

/** The base state against height. */
public final class EquilibriumTable {
  private EquilibriumTable() {
  }

  /** A table of so many equidistant heights from the bottom to the top of the domain. */
  public static Table of(Equilibrium equilibrium, int rows, OutputUnits units) {
    double[] heights = new double[rows];
    GasState[] states = new GasState[rows];
    double step = (equilibrium.top() - equilibrium.bottom()) / (rows - 1);
    for (int i = 0; i < rows; i++) {
      double z = equilibrium.bottom() + i * step;
      heights[i] = units.length(z);
      states[i] = equilibrium.at(z);
    }
    return new Table("equilibrium", List.of(
        Column.of("height", units.length(), "height z", heights),
        column("density", "g/cm^3", "mass density", states, GasState::density),
        column("gas_pressure", "erg/cm^3", "gas pressure", states, GasState::gasPressure),
        column("magnetic_pressure", "erg/cm^3", "B^2/8 pi", states, GasState::magneticPressure),
        column("cosmic_ray_pressure", "erg/cm^3", "cosmic-ray pressure", states, GasState::cosmicRayPressure),
        column("total_pressure", "erg/cm^3", "sum of the three", states, GasState::totalPressure),
        column("field", units.field(), "field strength", states, state -> units.field(state.fieldStrength())),
        column("alfven_speed", "km/s", "Alfven speed", states, state -> state.alfvenSpeed() / 1e5),
        column("plasma_beta", "", "gas over magnetic pressure", states, GasState::plasmaBeta),
        column("dispersion", "km/s", "isothermal speed", states, state -> Math.sqrt(state.gasPerMass()) / 1e5),
        column("gravity", "cm/s^2", "downward acceleration", states, GasState::gravity),
        column("scale_height", units.length(), "-dz/d ln(density)", states,
            state -> units.length(state.densityScaleHeight()))));
  }

  private static Column column(String name, String unit, String description, GasState[] states,
      ToDoubleFunction<GasState> value) {
    double[] values = new double[states.length];
    for (int i = 0; i < values.length; i++) {
      values[i] = value.applyAsDouble(states[i]);
    }
    return Column.of(name, unit, description, values);
  }
}
