package org.archspan.report;

import java.util.ArrayList;
import java.util.List;
import org.archspan.observe.ChanceProbability;
import org.archspan.observe.FittedArm;
import org.archspan.observe.MeasuredLength;
import org.archspan.observe.ObservedArm;
import org.archspan.observe.PeriodogramPeak;
import org.archspan.units.OutputUnits;

/** The spacing along an arm in words. */
public final class ObservationText {
  private static final double EVIDENCE = 0.05;
  private static final double CLOSE_RACE = 3.0;
  private static final double STEADY = 0.8;

  private ObservationText() {
  }

  /** The answer in one sentence. */
  static String sentence(ObservedArm arm, OutputUnits units) {
    ChanceProbability chance = arm.chance().peak();
    String peak = length(arm.peak().wavelength(), units);
    return chance.value() <= EVIDENCE
        ? "The complexes stand " + peak + " apart along the arm; complexes at random would show such a peak with a"
            + " probability of " + probability(chance) + "."
        : "No regular spacing is shown: the highest peak, at " + peak + ", is reached by complexes at random with a"
            + " probability of " + probability(chance) + ".";
  }

  /** The summary, wrapped to a width in characters. */
  public static String text(ObservationSource source, ObservedArm arm, OutputUnits units, int width) {
    TextBlock block = new TextBlock(width).heading("Complexes along an arm");
    block.labelled("table", source.file() + ", " + arm.positions().size() + " complexes");
    source.geometry().forEach(block::labelled);
    block.gap().sentence(sentence(arm, units));
    arm(block, arm, units);
    spacing(block, arm, units);
    block.heading("What this rests on");
    assumptions(source).forEach(block::bullet);
    warnings(arm).forEach(block::bullet);
    return block.text();
  }

  private static void arm(TextBlock block, ObservedArm observed, OutputUnits units) {
    FittedArm arm = observed.arm();
    block.heading("Arm");
    block.labelled("pitch angle", Numbers.plain(Math.abs(Math.toDegrees(arm.spiral().pitchAngle()))) + " +- "
        + Numbers.plain(Math.toDegrees(arm.pitchError()), 0.1) + " deg, radius "
        + (arm.spiral().pitchAngle() > 0.0 ? "grows" : "falls") + " with azimuth");
    block.labelled("length", Numbers.length(observed.chain().length(), units) + ", "
        + Numbers.plain(turns(observed), 0.01) + " turns");
    block.labelled("width", Numbers.plain(100.0 * arm.width(), 0.1) + " per cent of the radius (standard deviation)");
    block.labelled("complexes", observed.chain().complexes().size() + " on the arm, "
        + (observed.positions().size() - observed.chain().complexes().size()) + " off it");
  }

  /** Turns of the arm about the centre, dimensionless. */
  static double turns(ObservedArm observed) {
    var complexes = observed.chain().complexes();
    return Math.abs(complexes.get(complexes.size() - 1).azimuth() - complexes.get(0).azimuth()) / (2.0 * Math.PI);
  }

  private static void spacing(TextBlock block, ObservedArm arm, OutputUnits units) {
    PeriodogramPeak peak = arm.peak();
    block.heading("Spacing");
    block.table(List.of(List.of("measure", "spacing", "chance does as well"),
        List.of("periodogram, highest peak", length(peak.wavelength(), units), probability(arm.chance().peak())),
        List.of("nearest complex, median", length(arm.nearest(), units), probability(arm.chance().regular())),
        List.of("next complex outward, median", length(arm.separation(), units), "-")));
    block.sentence("The peak has a Rayleigh power of " + Numbers.plain(peak.power(), 0.001) + " of at most "
        + arm.chain().complexes().size() + "; chance exceeds " + Numbers.plain(arm.chance().level(0.05), 0.001)
        + " somewhere in the range in 5 per cent and " + Numbers.plain(arm.chance().level(0.01), 0.001)
        + " in 1 per cent of the trials. Searched are "
        + Numbers.length(1.0 / peak.grid().frequency(peak.grid().size() - 1), units) + " to "
        + Numbers.length(1.0 / peak.grid().frequency(0), units) + ".");
  }

  private static String length(MeasuredLength length, OutputUnits units) {
    boolean large = units.length().equals("pc") && units.length(length.value()) >= 999.95;
    double scale = large ? 1e-3 : 1.0;
    return Numbers.plain(scale * units.length(length.value())) + " +- "
        + Numbers.plain(scale * units.length(length.error()), 0.1) + " " + (large ? "kpc" : units.length());
  }

  private static String probability(ChanceProbability chance) {
    return chance.exceeding() == 0 ? "less than " + Numbers.plain(chance.upper(), 0.1)
        : Numbers.plain(chance.value(), 0.01) + " (" + Numbers.plain(chance.lower(), 0.01) + " to "
            + Numbers.plain(chance.upper(), 0.01) + ")";
  }

  private static List<String> assumptions(ObservationSource source) {
    List<String> words = new ArrayList<>();
    words.add(source.geometry().isEmpty()
        ? "Positions were given in the plane of the disk; the error has no part of their deprojection."
        : "A thin disk; inclination, position angle and distance are taken as exact. All lengths go with the"
            + " distance.");
    words.add("One arm, a logarithmic spiral; a complex belongs to the turn that is closest.");
    words.add("Chance: as many complexes, uniform along the same arm between its first and last one, searched over the"
        + " same wavelengths. The probability counts every place where a peak might have been; a density that changes"
        + " along the arm is not in it.");
    words.add("Missing complexes hide a spacing: the distances between neighbours become multiples of it, and where"
        + " every second one is missing its double is all that can be seen. Clusters of complexes that were counted one"
        + " by one do the opposite.");
    words.add("Errors: bootstrap of the complexes and of the fitted arm. Giant complexes along arms are known 1 to 4"
        + " kpc apart (Elmegreen and Elmegreen 1983, MNRAS 203, 31).");
    return words;
  }

  /** What limits this answer. */
  static List<String> warnings(ObservedArm arm) {
    List<String> warnings = new ArrayList<>();
    if (arm.lead() < CLOSE_RACE) {
      warnings.add("Warning: an arm of "
          + Numbers.plain(Math.toDegrees(arm.rival().orElseThrow().spiral().pitchAngle()))
          + " deg fits nearly as well (logarithm of the likelihood " + Numbers.plain(arm.lead()) + " lower).");
    }
    if (arm.peak().steadiness() < STEADY) {
      warnings.add("Warning: only " + Numbers.plain(100.0 * arm.peak().steadiness(), 0.01) + " per cent of the"
          + " bootstrap samples have their highest peak here; the error is that of this peak alone.");
    }
    if (arm.chance().peak().value() > EVIDENCE) {
      warnings.add("Warning: this is no evidence of a regular spacing; do not infer field strengths from it.");
    }
    return warnings;
  }
}
