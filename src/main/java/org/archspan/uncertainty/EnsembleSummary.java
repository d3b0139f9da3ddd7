package org.archspan.uncertainty;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.TreeMap;

/** What an ensemble says, gathered row by row in memory that does not grow with their number. */
public final class EnsembleSummary {
  /** Reasons that are told apart. */
  private static final int MOST_REASONS = 10;
  /** Bins of the joint distribution in an e-folding. */
  private static final double JOINT_BINS = 25.0;

  private final DrawDesign design;
  private final LogHistogram wavelength = new LogHistogram();
  private final LogHistogram growthTime = new LogHistogram();
  private final LogHistogram mass = new LogHistogram();
  private final SobolIndices ofWavelength;
  private final SobolIndices ofGrowthRate;
  private final Map<String, Long> counts = new TreeMap<>();
  private final Map<String, Long> reasons = new LinkedHashMap<>();
  private final Map<String, String> examples = new TreeMap<>();
  private final TreeMap<JointBin, Long> joint = new TreeMap<>();
  private long first = -1;
  private long last = -1;

  /**
   * A cell of the joint distribution.
   *
   * @param wavelength index on a logarithmic scale
   * @param growthTime index on a logarithmic scale
   */
  public record JointBin(int wavelength, int growthTime) implements Comparable<JointBin> {
    /** Lower end of a bin, in the unit of the quantity. */
    public static double lower(int index) {
      return Math.exp(index / JOINT_BINS);
    }

    private static int index(double value) {
      return (int) Math.floor(JOINT_BINS * Math.log(value));
    }

    @Override
    public int compareTo(JointBin other) {
      return wavelength != other.wavelength ? Integer.compare(wavelength, other.wavelength)
          : Integer.compare(growthTime, other.growthTime);
    }
  }

  /** A summary of draws of a design. */
  public EnsembleSummary(DrawDesign design) {
    this.design = design;
    ofWavelength = new SobolIndices(design.inputs().size());
    ofGrowthRate = new SobolIndices(design.inputs().size());
  }

  /** Adds the next row; rows come in the order of their draws. */
  public void add(DrawRow row) {
    first = first < 0 ? row.draw() : first;
    last = row.draw();
    count(row.outcome().name());
    if (row.outcome() == DrawRow.Outcome.UNSTABLE) {
      count("held by " + row.heldBy());
      count(row.gathers() ? "gathers" : "gathers not");
    } else if (row.outcome() == DrawRow.Outcome.FAILED) {
      reason(row.reason());
    }
    boolean spacing = row.hasSpacing();
    if (spacing) {
      wavelength.add(row.wavelength(), 1.0);
      growthTime.add(row.growthTime(), 1.0);
      mass.add(row.mass(), 1.0);
      joint.merge(new JointBin(JointBin.index(row.wavelength()), JointBin.index(row.growthTime())), 1L, Long::sum);
    }
    if (design.sensitivities()) {
      int role = (int) (row.draw() % design.groupSize());
      ofWavelength.add(role, spacing ? Math.log(row.wavelength()) : Double.NaN);
      ofGrowthRate.add(role, growthRate(row));
    }
  }

  private static double growthRate(DrawRow row) {
    return switch (row.outcome()) {
      case UNSTABLE -> 1.0 / row.growthTime();
      case STABLE -> 0.0;
      case FAILED -> Double.NaN;
    };
  }

  /** Reasons that differ in their numbers alone count as one, and are shown as they were first given. */
  private void reason(String reason) {
    String kind = reason.replaceAll("[-+]?[0-9][-+.0-9eE]*", "#");
    if (examples.containsKey(kind) || examples.size() < MOST_REASONS) {
      reasons.merge(examples.computeIfAbsent(kind, first -> reason), 1L, Long::sum);
    }
  }

  private void count(String what) {
    counts.merge(what, 1L, Long::sum);
  }

  /** The design of the draws. */
  public DrawDesign design() {
    return design;
  }

  /** Index of the first draw; -1 for none. */
  public long firstDraw() {
    return first;
  }

  /** Index of the last draw; -1 for none. */
  public long lastDraw() {
    return last;
  }

  /** How many draws there are. */
  public long draws() {
    return unstable() + stable() + failed();
  }

  /** How many are unstable. */
  public long unstable() {
    return counts.getOrDefault("UNSTABLE", 0L);
  }

  /** How many are stable. */
  public long stable() {
    return counts.getOrDefault("STABLE", 0L);
  }

  /** How many have no answer. */
  public long failed() {
    return counts.getOrDefault("FAILED", 0L);
  }

  /** How many are held by "disk", "lid" or "halo". */
  public long heldBy(String what) {
    return counts.getOrDefault("held by " + what, 0L);
  }

  /** How many have a mode that gathers the disk's own gas. */
  public long gathering() {
    return counts.getOrDefault("gathers", 0L);
  }

  /** The first reasons for which draws have no answer, with their counts. */
  public Map<String, Long> reasons() {
    return java.util.Collections.unmodifiableMap(reasons);
  }

  /** Wavelengths, in the unit of length of the output. */
  public LogHistogram wavelength() {
    return wavelength;
  }

  /** Growth times, in the unit of time of the output. */
  public LogHistogram growthTime() {
    return growthTime;
  }

  /** Masses, in the unit of mass of the output. */
  public LogHistogram mass() {
    return mass;
  }

  /** Wavelength and growth time together, counts by cell. */
  public Map<JointBin, Long> joint() {
    return java.util.Collections.unmodifiableMap(joint);
  }

  /** Shares of the inputs in the variance of the logarithm of the wavelength. */
  public SobolIndices ofWavelength() {
    return ofWavelength;
  }

  /** Shares of the inputs in the variance of the growth rate; that of stable draws is 0. */
  public SobolIndices ofGrowthRate() {
    return ofGrowthRate;
  }
}
