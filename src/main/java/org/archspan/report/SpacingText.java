package org.archspan.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.archspan.boundary.Parity;
import org.archspan.disk.Disk;
import org.archspan.disk.SelfGravity;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.spacing.BranchPeak;
import org.archspan.spacing.CloudComplex;
import org.archspan.spacing.HeldBy;
import org.archspan.spacing.RotatingAnswer;
import org.archspan.spacing.SpacingResult;
import org.archspan.units.OutputUnits;

/** The answer of the main job in words: what was assumed, what was found, how sure, and what limits it. */
public final class SpacingText {
  private final Disk disk;
  private final SpacingResult result;
  private final OutputUnits units;
  private final TextBlock block;

  private SpacingText(Disk disk, SpacingResult result, OutputUnits units, int width) {
    this.disk = disk;
    this.result = result;
    this.units = units;
    this.block = new TextBlock(width);
  }

  /** The whole summary, wrapped to a width in characters. */
  public static String text(String title, Disk disk, SpacingResult result, OutputUnits units, int width) {
    SpacingText text = new SpacingText(disk, result, units, width);
    text.block.heading(title);
    text.block.heading("Assumed");
    Assumptions.of(disk, result.equilibrium(), result.range(), units).forEach(text.block::labelled);
    text.baseState();
    text.found();
    result.elasticities().filter(answers -> !result.stable()).ifPresent(answers -> ElasticityWords.write(answers, text.block));
    text.sure();
    text.limits();
    return text.block.text();
  }

  private void baseState() {
    Equilibrium equilibrium = result.equilibrium();
    block.labelled("base state", "scale height " + Numbers.length(equilibrium.scaleHeight(), units)
        + ", surface density " + Numbers.plain(units.surfaceDensity(equilibrium.surfaceDensity())) + " "
        + units.surfaceDensity() + "; force balance holds to better than 1e-10 of the weight");
  }

  private void found() {
    block.heading("Found");
    if (result.stable()) {
      stable();
      return;
    }
    if (!result.branches().isEmpty()) {
      block.table(branches()).sentence("column: relative change of the surface density when the midplane layer moves by"
          + " one scale height" + (result.spacing().isPresent() ? "; >: sets the spacing" : "")).gap();
    }
    block.sentence(sentence(result, units));
    result.complex().ifPresent(this::complex);
    result.rotation().ifPresent(this::rotation);
    result.withoutRotation().spacingPeak().flatMap(BranchPeak::work).ifPresent(work -> block.sentence(
        (result.rotation().isPresent() ? "What drives it without rotation. " : "") + Drivers.sentence(work)));
    BranchPeak peak = result.spacingPeak().orElseThrow();
    if (peak.heldBy() == HeldBy.DISK) {
      block.sentence("In a domain 1.5 times as tall its wavelength changes by "
          + Numbers.change(peak.tallerWavelengthChange()) + " and its growth rate by "
          + Numbers.change(peak.tallerGrowthChange()) + ".");
    }
    shortAcross();
    result.longestStableWavelength().ifPresent(shortest -> block.sentence("Waves "
        + (directed() ? "in that direction" : "along the field") + " shorter than " + Numbers.length(shortest, units)
        + " are stable."));
  }

  private void shortAcross() {
    if (result.acrossLimit().growthRate() == 0.0) {
      block.sentence("Infinitely short waves across the field do not grow.");
      return;
    }
    block.sentence("Infinitely short waves across the field would grow in "
        + Numbers.time(1.0 / result.acrossLimit().growthRate(), units) + " at a height of "
        + Numbers.length(result.acrossLimit().height(), units) + (disk.selfGravity() == SelfGravity.FULL
            ? "; they do not feel the gas's own gravity, and long waves may be faster."
            : ": no ideal wave of this gas is faster."));
  }

  private void stable() {
    if (result.rotation().isPresent()) {
      block.sentence("Stable, as far as was searched, by its rotation.");
      result.rotation().ifPresent(this::rotation);
      return;
    }
    block.sentence("Stable: no wave " + whose() + " grows" + range() + ".");
    if (result.acrossLimit().growthRate() > 0.0) {
      block.sentence("Shorter waves across the field do grow: infinitely short ones in "
          + Numbers.time(1.0 / result.acrossLimit().growthRate(), units) + " at a height of "
          + Numbers.length(result.acrossLimit().height(), units) + ". Give waves.cross-wavelength to solve waves of finite"
          + " length across the field.");
    } else {
      block.sentence("Infinitely short waves across the field, which no ideal wave outgrows, do not grow at any height"
          + " either.");
    }
  }

  private List<List<String>> branches() {
    List<List<String>> rows = new ArrayList<>();
    rows.add(List.of("", "parity", "order", "wavelength", "growth time", "centroid", "column", "held by"));
    for (int i = 0; i < result.branches().size(); i++) {
      BranchPeak peak = result.branches().get(i);
      boolean chosen = result.spacing().isPresent() && result.spacing().get() == i;
      rows.add(List.of(chosen ? ">" : "", parity(peak.parity()), Integer.toString(peak.order()),
          Numbers.length(peak.wavelength(), peak.wavelengthError(), units),
          Numbers.time(peak.growthTime(), peak.growthError(), units),
          Numbers.length(peak.centroidHeight(), peak.wavelengthError(), units),
          Numbers.plain(peak.columnContrast(), peak.wavelengthError()),
          peak.heldBy().name().toLowerCase(Locale.ROOT)));
    }
    return rows;
  }

  private static String parity(Parity parity) {
    return switch (parity) {
      case MIRROR -> "mirror";
      case FLEXING -> "flexing";
      case FLOOR -> "floor";
    };
  }

  /** One sentence that can be quoted. */
  public static String sentence(SpacingResult result, OutputUnits units) {
    if (result.stable()) {
      return result.acrossLimit().growthRate() > 0.0
          ? "No wave with the given wavelength across the field grows; shorter ones across it do."
          : "The gas is stable against magnetic buoyancy.";
    }
    BranchPeak peak = result.spacingPeak().orElseThrow();
    if (peak.wavenumber() == 0.0) {
      return "The gas is unstable; growth rises towards infinite wavelength along the field, up to one e-folding in "
          + Numbers.time(peak.growthTime(), units) + ".";
    }
    String who = result.spacing().isPresent() && result.equilibrium().aboutMidplane() ? "The fastest mode that gathers the disk's own gas"
        : peak.continuum() ? "The continuum edge of the atmosphere above the disk" : "The fastest mode";
    String parity = peak.continuum() || peak.parity() == Parity.FLOOR ? ""
        : peak.parity() == Parity.MIRROR ? " (mirror-symmetric about the midplane)" : " (flexing the midplane)";
    return who + parity + " has a wavelength of "
        + Numbers.length(peak.wavelength(), peak.wavelengthError(), units) + whither(result, peak, units) + "; its growth time is "
        + Numbers.time(peak.growthTime(), peak.growthError(), units) + ".";
  }

  /** Along what the wavelength is measured. */
  private static String whither(SpacingResult result, BranchPeak peak, OutputUnits units) {
    if (result.range().direction().isEmpty()) {
      return " along the field";
    }
    double direction = result.range().direction().getAsDouble();
    String lower = result.equilibrium().aboutMidplane() ? "the field at the midplane" : "the field on the floor";
    return " at " + Numbers.plain(Math.toDegrees(direction)) + " degrees from " + lower + ", along which its crests are "
        + Numbers.length(result.range().crestSpacing(peak.wavelength()), units) + " apart";
  }

  private void rotation(RotatingAnswer rotation) {
    String spin = " (" + Numbers.galacticRate(rotation.angularSpeed()) + ")";
    result.spacingPeak().filter(peak -> peak.frequency() > 0.0).ifPresent(peak -> block.sentence(
        "It oscillates while it grows, with a period of " + Numbers.time(2.0 * Math.PI / peak.frequency(), units) + "."));
    rotation.without().spacingPeak().ifPresent(still -> block.sentence(
        (result.stable() ? "That is with rotation" : "All this is with rotation") + spin
            + "; without it the wavelength would be " + Numbers.length(still.wavelength(), still.wavelengthError(), units)
            + " and the growth time " + Numbers.time(still.growthTime(), still.growthError(), units) + "."));
  }

  private void complex(CloudComplex complex) {
    if (complex.mass().isPresent()) {
      block.sentence("Along an arm of the given width one wavelength holds "
          + Numbers.mass(complex.mass().getAsDouble(), units) + ".");
    } else {
      block.sentence("One wavelength holds "
          + Numbers.mass(complex.massPerWidth() * units.centimetresPerLength(), units) + " for each " + units.length()
          + (disk.domain().aboutMidplane() ? " of arm width (no arm is given)." : " across the field."));
    }
    if (complex.eFoldings().isPresent()) {
      block.sentence("While the gas crosses the arm the mode grows by "
          + Numbers.plain(complex.eFoldings().getAsDouble()) + " e-foldings.");
    }
  }

  private void sure() {
    block.heading("How sure");
    if (result.stable() && result.rotation().isPresent()) {
      block.sentence("Without rotation the gas is unstable. With it the argument principle counts no mode that grows faster than"
          + " a twentieth of the fastest without, at " + result.rotation().get().checkedWavelengths()
          + " wavelengths over the range; slower growth, and waves between those, are not excluded.");
      return;
    }
    if (result.stable()) {
      block.sentence("Proved by counting: the number of growing modes, which cannot rise towards shorter waves along the"
          + " field, is zero already for the longest.");
      return;
    }
    block.sentence("Proved by counting the modes on " + result.certificate().intervals() + " intervals of wavenumber"
        + " that leave no gap: no wave " + whose() + " grows faster than "
        + Numbers.rateBound(result.certificate().bound(), units) + range() + ".");
    result.rotation().ifPresent(this::rotatingProof);
    BranchPeak peak = result.spacingPeak().orElseThrow();
    block.sentence("Estimated relative errors: growth rate below " + Numbers.error(peak.growthError())
        + ", wavelength below " + Numbers.error(peak.wavelengthError()) + (peak.unstableModes() < 0 ? "."
        : "; at that wavelength exactly " + modes(peak.unstableModes()) + " of this parity grow"
        + (peak.unstableModes() == 1 ? "s." : ".")));
  }

  private void rotatingProof(RotatingAnswer rotation) {
    block.sentence("That bound is without rotation, which never makes growth faster. With it, the argument principle finds"
        + " nothing faster than the fastest branch of each symmetry at " + rotation.checkedWavelengths()
        + " wavelengths over the range, and counts the modes at the wavelength of the answer on a contour of "
        + rotation.contourPoints() + " points around all growth faster than one e-folding in "
        + Numbers.time(1.0 / rotation.slowestCounted(), units) + ".");
  }

  private static String modes(int count) {
    return count == 1 ? "one mode" : count + " modes";
  }

  private String along() {
    return directed() ? "" : " along it";
  }

  private boolean directed() {
    return result.range().direction().isPresent();
  }

  private String whose() {
    return directed() ? "in that direction" : "with the given wavelength across the field";
  }

  private String range() {
    boolean all = result.certificate().shortest() == 0.0 && Double.isInfinite(result.certificate().longest());
    return all ? ", at any wavelength" + along() : ", at wavelengths" + along() + " from "
        + Numbers.length(result.certificate().shortest(), units) + " to "
        + Numbers.length(result.certificate().longest(), units);
  }

  private void limits() {
    block.heading("What limits it");
    result.warnings().forEach(block::bullet);
    block.bullet("Linear theory: growth while the gas moves by much less than a wavelength.");
    block.bullet("A static base state that varies with height alone; " + leftOut() + " not in it.");
  }

  private String leftOut() {
    String motion = result.rotation().isPresent() ? "shear" : "rotation, shear";
    return switch (disk.selfGravity()) {
      case OFF -> motion + " and the gas's own gravity are";
      case EQUILIBRIUM -> motion + " and the gravity of the perturbation itself are";
      case FULL -> result.rotation().isPresent() ? "shear is" : "rotation and shear are";
    };
  }
}
