package org.archspan.table;

import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;
import org.archspan.rivals.InterfaceWaves;
import org.archspan.rivals.LayerInterface;
import org.archspan.rivals.Rival;
import org.archspan.rivals.RivalResult;
import org.archspan.units.OutputUnits;

/** The instabilities of one gas side by side. */
public final class RivalTable {
  private static final int WAVES = 200;

  private RivalTable() {
  }

  /** One row for each instability, magnetic buoyancy first. */
  public static Table of(RivalResult result, OutputUnits units) {
    List<Rival> rivals = result.rivals();
    double buoyancy = result.buoyancy().growthRate();
    return new Table("instabilities of the same gas", List.of(
        Column.of("instability", "name", rivals.stream().map(Rival::name).toList()),
        Column.of("outcome", "what came out", rivals.stream().map(rival -> rival.outcome().words()).toList()),
        column(rivals, "wavelength", units.length(), "fastest wavelength", r -> units.length(r.wavelength())),
        column(rivals, "growth_time", units.time(), "e-folding time; of a bound: none is shorter",
            r -> units.time(r.growthTime())),
        column(rivals, "growth_over_buoyancy", "", "growth rate over that of magnetic buoyancy",
            r -> r.growthRate() / buoyancy),
        column(rivals, "shortest", units.length(), "unstable wavelength; swing: X = 1",
            r -> units.length(r.shortest())),
        column(rivals, "longest", units.length(), "unstable wavelength; swing: X = 3",
            r -> units.length(r.longest())),
        Column.of("measure", "name of the number that decides", rivals.stream().map(Rival::measure).toList()),
        column(rivals, "value", "", "of that number", Rival::value),
        Column.of("source", "of the formula", rivals.stream().map(Rival::source).toList()),
        Column.of("remark", "or why it is not judged", rivals.stream().map(Rival::remark).toList())));
  }

  /** Growth of each interface along the field against wavelength, a row for each of 200 waves about its scales. */
  public static Table interfaces(List<LayerInterface> interfaces, OutputUnits units) {
    List<String> names = new ArrayList<>();
    List<Double> wavelengths = new ArrayList<>();
    List<Double> rates = new ArrayList<>();
    for (LayerInterface layers : interfaces) {
      InterfaceWaves waves = new InterfaceWaves(layers);
      double[] range = waves.tellingRange();
      for (int i = 0; i < WAVES; i++) {
        double wavelength = range[0] * Math.pow(range[1] / range[0], i / (WAVES - 1.0));
        names.add(layers.name());
        wavelengths.add(units.length(wavelength));
        rates.add(units.rate(waves.growthRate(2.0 * Math.PI / wavelength)));
      }
    }
    return new Table("growth of interfaces along the field", List.of(Column.of("interface", "name", names),
        Column.of("wavelength", units.length(), "along the field",
            wavelengths.stream().mapToDouble(Double::doubleValue).toArray()),
        Column.of("growth_rate", "1/" + units.time(), "0 where the wave oscillates",
            rates.stream().mapToDouble(Double::doubleValue).toArray())));
  }

  /** Cutoff and fastest wavelength of each interface, with their limits in deep and shallow layers. */
  public static Table limits(List<LayerInterface> interfaces, OutputUnits units) {
    List<InterfaceWaves> waves = interfaces.stream().map(InterfaceWaves::new).toList();
    return new Table("scales of interfaces along the field", List.of(
        Column.of("interface", "name", interfaces.stream().map(LayerInterface::name).toList()),
        limit(waves, "cutoff", units, "neither grows nor falls", InterfaceWaves::cutoff),
        limit(waves, "fastest", units, "fastest; nan where short waves grow without limit", InterfaceWaves::fastest),
        limit(waves, "deep_cutoff", units, "cutoff in deep layers", InterfaceWaves::deepCutoff),
        limit(waves, "deep_fastest", units, "fastest in deep layers", InterfaceWaves::deepFastest),
        limit(waves, "shallow_cutoff", units, "cutoff in shallow layers without shear", InterfaceWaves::shallowCutoff),
        Column.of("shallow_growth_speed", "km/s", "growth rate over wavenumber of waves far longer than the depths",
            waves.stream().mapToDouble(w -> 1e-5 * w.shallowGrowthSpeed()).toArray())));
  }

  private static Column limit(List<InterfaceWaves> waves, String name, OutputUnits units, String description,
      ToDoubleFunction<InterfaceWaves> value) {
    return Column.of(name, units.length(), description,
        waves.stream().mapToDouble(w -> units.length(value.applyAsDouble(w))).toArray());
  }

  private static Column column(List<Rival> rivals, String name, String unit, String description,
      ToDoubleFunction<Rival> value) {
    return Column.of(name, unit, description, rivals.stream().mapToDouble(value).toArray());
  }
}
