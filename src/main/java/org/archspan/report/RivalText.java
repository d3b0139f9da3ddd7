package org.archspan.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.archspan.disk.Disk;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.rivals.InterfaceWaves;
import org.archspan.rivals.LayerInterface;
import org.archspan.rivals.Rival;
import org.archspan.rivals.RivalInputs;
import org.archspan.rivals.RivalResult;
import org.archspan.rivals.StellarDisk;
import org.archspan.units.OutputUnits;

/** Rival instabilities in words. */
public final class RivalText {

  private RivalText() {
  }

  /** The summary, wrapped to a width in characters. */
  public static String text(String title, Disk disk, Equilibrium equilibrium, RivalInputs inputs, RivalResult result,
      OutputUnits units, int width) {
    TextBlock block = Assumptions.block(title, disk, equilibrium, units, width);
    block.labelled("epicycles", rotation(disk, inputs)).labelled("stars", stars(inputs, units));
    assumed().forEach(block::bullet);
    block.heading("Instabilities of the same gas").table(rows(result, units)).gap();
    for (Rival rival : result.rivals()) {
      if (!rival.remark().isEmpty()) {
        block.bullet(rival.name() + ": " + rival.remark());
      }
    }
    if (!result.interfaces().isEmpty()) {
      block.heading("Interfaces, waves along the field").table(interfaces(result, units));
    }
    String sources = result.rivals().stream().map(Rival::source).flatMap(names -> Stream.of(names.split(", ")))
        .distinct().sorted().collect(Collectors.joining(", "));
    block.gap().sentence("Sources: " + sources + ".");
    return block.heading("Summary").sentence(sentence(result, units)).text();
  }

  /** What every answer rests on. */
  static List<String> assumed() {
    return List.of("Linear theory of each instability by itself; none of them knows of the others.",
        "In the plane: axisymmetric waves that cross the field; gas pressure averaged over the column; thickness"
            + " weakens gravity by 1/(1 + k h); stars are a fluid; cosmic rays are left out.",
        "Interfaces: two uniform incompressible layers, walls at their far sides, no thickness of the interface.");
  }

  private static String rotation(Disk disk, RivalInputs inputs) {
    return disk.rotation().map(rotation -> "frequency "
        + Numbers.galacticRate(rotation.kappa())
        + (rotation.epicyclicFrequency().isPresent() ? "" : ", twice the angular speed, as none is given"))
        .orElse("none")
        + (inputs.lag().isPresent() ? "; lags with height by "
            + Numbers.galacticRate(inputs.lag().getAsDouble()) : "");
  }

  private static String stars(RivalInputs inputs, OutputUnits units) {
    if (inputs.stars().isEmpty()) {
      return "none";
    }
    StellarDisk stars = inputs.stars().get();
    return Numbers.plain(units.surfaceDensity(stars.surfaceDensity())) + " " + units.surfaceDensity()
        + ", dispersion along the radius " + Numbers.plain(1e-5 * stars.dispersion()) + " km/s, height "
        + Numbers.length(stars.height(), units);
  }

  private static List<List<String>> rows(RivalResult result, OutputUnits units) {
    List<List<String>> rows = new ArrayList<>();
    rows.add(List.of("instability", "outcome", "wavelength", "e-folding", "/ buoyancy", "number", "waves that grow"));
    for (Rival rival : result.rivals()) {
      String time = Double.isNaN(rival.growthTime()) ? "-" : Numbers.time(rival.growthTime(), units);
      rows.add(List.of(rival.name(), rival.outcome().words(),
          Double.isNaN(rival.wavelength()) ? "-" : Numbers.length(rival.wavelength(), units),
          rival.outcome() == Rival.Outcome.BOUND && !time.equals("-") ? "> " + time : time,
          Numbers.plain(rival.growthTime() / result.buoyancy().growthTime()),
          rival.measure().isEmpty() ? "-" : rival.measure() + " = " + Numbers.plain(rival.value()),
          range(rival, units)));
    }
    return rows;
  }

  /** The waves that grow, from the shortest to the longest where they end. */
  private static String range(Rival rival, OutputUnits units) {
    String from = rival.shortest() > 0.0 ? "from " + Numbers.length(rival.shortest(), units) : "";
    String to = rival.longest() > 0.0 && Double.isFinite(rival.longest())
        ? (from.isEmpty() ? "to " : " to ") + Numbers.length(rival.longest(), units) : "";
    return from + to;
  }

  private static List<List<String>> interfaces(RivalResult result, OutputUnits units) {
    List<List<String>> rows = new ArrayList<>();
    rows.add(List.of("interface", "cutoff", "fastest", "deep cutoff", "deep fastest", "shallow cutoff"));
    for (LayerInterface layers : result.interfaces()) {
      InterfaceWaves waves = new InterfaceWaves(layers);
      List<String> row = new ArrayList<>(List.of(layers.name()));
      for (double length : new double[] {waves.cutoff(), waves.fastest(), waves.deepCutoff(), waves.deepFastest(),
          waves.shallowCutoff()}) {
        row.add(Double.isNaN(length) ? "-" : Numbers.length(length, units));
      }
      rows.add(row);
    }
    return rows;
  }

  /** Who wins, and by what factor. */
  public static String sentence(RivalResult result, OutputUnits units) {
    Optional<Rival> winner = result.winner();
    if (winner.isEmpty()) {
      return "None of the instabilities that could be judged chooses a wave that grows.";
    }
    Rival first = winner.get();
    String words = "Fastest is " + first.name() + ": " + Numbers.length(first.wavelength(), units) + " in "
        + Numbers.time(first.growthTime(), units);
    Rival buoyancy = result.buoyancy();
    Optional<Rival> next = result.contest().stream().filter(rival -> first == buoyancy ? rival != buoyancy
        : rival == buoyancy).findFirst();
    return words + next.map(other -> ", " + Numbers.plain(first.growthRate() / other.growthRate()) + " times as fast"
        + " as " + other.name() + " (" + Numbers.length(other.wavelength(), units) + " in "
        + Numbers.time(other.growthTime(), units) + ")").orElse(first == buoyancy
            ? "; no other that could be judged chooses a wave" : "; magnetic buoyancy chooses none") + ".";
  }
}
