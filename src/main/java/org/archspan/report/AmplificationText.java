package org.archspan.report;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Stream;
import org.archspan.boundary.Parity;
import org.archspan.disk.Disk;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.shear.Amplification;
import org.archspan.shear.StartGain;
import org.archspan.units.OutputUnits;

/** A wave in a shearing disk in words. */
public final class AmplificationText {
  private static final double SMALL_MOTION = 0.01;

  private final Amplification wave;
  private final OutputUnits units;

  private AmplificationText(Amplification wave, OutputUnits units) {
    this.wave = wave;
    this.units = units;
  }

  /** The summary, wrapped to a width in characters. */
  public static String text(String title, Disk disk, Equilibrium equilibrium, Amplification wave, OutputUnits units,
      int width) {
    TextBlock block = Assumptions.block(title, disk.withoutRotation(), equilibrium, units, width);
    disk.rotation().ifPresent(rotation -> block.labelled("rotation", Numbers.galacticRate(rotation.angularSpeed())
        + ", epicyclic frequency " + Numbers.galacticRate(rotation.kappa())));
    return new AmplificationText(wave, units).fill(block).text();
  }

  private TextBlock fill(TextBlock block) {
    int last = wave.time().length - 1;
    block.heading("Wave")
        .labelled("wavelength", Numbers.length(2.0 * Math.PI / wave.wavenumber(), units)
            + " along the field, which lies along the azimuth")
        .labelled("symmetry", symmetry(wave.parity()))
        .labelled("shear", "dOmega/dlnR = " + Numbers.rate(wave.shear(), units))
        .labelled("winding", "radial over azimuthal wavenumber from " + Numbers.plain(wave.winding()[0]) + " to "
            + Numbers.plain(wave.winding()[last]) + " in " + Numbers.time(wave.duration(), units)
            + " (negative: leading, positive: trailing)")
        .labelled("optimised", optimised());
    block.heading("Amplification").sentence(gain()).sentence(contrast()).gap().table(rates());
    if (wave.starts().size() > 1) {
      block.heading("E-foldings by the winding at the start").table(starts());
    }
    block.heading("What it means").sentence(meaning());
    block.heading("What limits it");
    wave.warnings().forEach(block::bullet);
    block.bullet("Linear theory in a frame that follows the disk: background shear is uniform, the field azimuthal and not"
        + " stretched, and neither viscosity nor resistivity damps short radial waves.");
    block.bullet("The motion at the start is the best there is; any other gains less.");
    return block;
  }

  private String optimised() {
    return wave.starts().size() > 1
        ? "the winding at the start, among all waves that are open (zero radial wavenumber) at some moment of this span, and"
            + " the motion at all heights at the start; nothing is displaced before"
        : "the motion at all heights at the start; nothing is displaced before";
  }

  private static String symmetry(Parity parity) {
    return switch (parity) {
      case MIRROR -> "mirror-symmetric about the midplane";
      case FLEXING -> "flexing the midplane";
      case FLOOR -> "above a rigid floor";
    };
  }

  private String gain() {
    int last = wave.time().length - 1;
    String end = "The velocity grows by a factor of " + Numbers.plain(wave.amplification()[last]) + ", "
        + Numbers.plain(wave.eFoldings()) + " e-foldings, by the end (relative error " + Numbers.error(wave.error())
        + "); the kinetic energy by its square.";
    return wave.growsAtTheEnd() ? end + " It still grows when the time ends."
        : end + " The peak, a factor of " + Numbers.plain(wave.amplification()[wave.peak()]) + ", comes after "
            + Numbers.time(wave.time()[wave.peak()], units) + ".";
  }

  private String contrast() {
    double time = wave.timeToUnitContrast(SMALL_MOTION);
    return "A motion at the start of one per cent of the dispersion, averaged by mass, " + (Double.isNaN(time)
        ? "does not bring the density contrast to one in this span."
        : "brings the density contrast to one, where linear theory ends, after " + Numbers.time(time, units) + ".");
  }

  private List<List<String>> rates() {
    List<List<String>> rows = new ArrayList<>();
    rows.add(List.of("growth", "rate (1/" + units.time() + ")", "e-foldings in this span"));
    rows.add(row("wound-up wave, at the end of the span", wave.lateGrowth(), wave.eFoldings()));
    rows.add(row("rigid rotation, fastest mode, open wave", wave.rigidGrowth()));
    rows.add(row("no rotation, fastest mode, open wave", wave.staticGrowth()));
    rows.add(row("no rotation, infinitely short radial waves", wave.limitGrowth()));
    return rows;
  }

  private List<String> row(String name, double rate) {
    return row(name, rate, rate * wave.duration());
  }

  private List<String> row(String name, double rate, double eFoldings) {
    return List.of(name, Numbers.plain(units.rate(rate)), Numbers.plain(eFoldings));
  }

  /** One row for each start, one column for each symmetry; starts that print alike once. */
  private List<List<String>> starts() {
    List<Parity> parities = wave.starts().stream().map(StartGain::parity).distinct().toList();
    Map<String, Map<Parity, String>> byStart = new LinkedHashMap<>();
    wave.starts().stream().sorted(Comparator.comparingDouble(StartGain::winding)).forEach(start ->
        byStart.computeIfAbsent(twoDecimals(start.winding()), key -> new EnumMap<>(Parity.class))
            .put(start.parity(), twoDecimals(start.eFoldings())));
    List<List<String>> rows = new ArrayList<>();
    rows.add(Stream.concat(Stream.of("start"), parities.stream().map(parity -> parity.name().toLowerCase(Locale.ROOT)))
        .toList());
    byStart.forEach((start, gains) -> rows.add(Stream.concat(Stream.of(start),
        parities.stream().map(parity -> gains.getOrDefault(parity, "-"))).toList()));
    return rows;
  }

  private static String twoDecimals(double value) {
    return String.format(Locale.ROOT, "%.2f", value == 0.0 ? 0.0 : value);
  }

  private String meaning() {
    String general = "A shearing disk has no modes: every wave is wound up, and what counts is how far it grows meanwhile. ";
    if (!wave.growsAtTheEnd() && wave.limitGrowth() == 0.0) {
      return general + "Here winding ends the growth, because short radial waves do not grow.";
    }
    if (wave.limitGrowth() == 0.0) {
      return general + "Short radial waves do not grow here, so winding will end the growth after this span; a longer"
          + " --duration shows when.";
    }
    return general + "Here winding does not end the growth: ideal waves grow however short they are radially. What is wound"
        + " up is then the shape: the wave ends as fine radial filaments rather than as broad clouds,"
        + " unless its contrast has reached one before.";
  }
}
