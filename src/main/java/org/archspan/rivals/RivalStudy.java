package org.archspan.rivals;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;
import org.archspan.disk.Disk;
import org.archspan.disk.RefusedModelException;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.rivals.Rival.Outcome;
import org.archspan.spacing.BranchPeak;
import org.archspan.spacing.SpacingResult;
import org.archspan.stability.UnsolvedException;

/** Judges the same gas by every instability that could set the scale; a row that cannot be judged says why. */
public final class RivalStudy {
  private final Disk disk;
  private final Equilibrium equilibrium;
  private final RivalInputs inputs;
  private final LayerMeans layer;

  /** A study of a disk and its base state. */
  public RivalStudy(Disk disk, Equilibrium equilibrium, RivalInputs inputs) {
    this.disk = disk;
    this.equilibrium = equilibrium;
    this.inputs = inputs;
    layer = LayerMeans.of(equilibrium, disk.gasClosure().adiabaticIndex());
  }

  /** All rows. The supplier solves magnetic buoyancy; what it throws becomes the reason of its own row. */
  public RivalResult solve(Supplier<SpacingResult> spacing) {
    List<Rival> rivals = new ArrayList<>();
    rivals.add(buoyancy(spacing));
    rivals.add(thin());
    rivals.add(plane("gravity in the plane: gas", "Toomre 1964, Romeo 1992", List.of(layer.gas())));
    rivals.add(plane("gravity in the plane: gas and field", "Lynden-Bell 1966", List.of(layer.gasWithField())));
    rivals.add(stars("gravity in the plane: gas and stars", layer.gas()));
    rivals.add(stars("gravity in the plane: gas, field and stars", layer.gasWithField()));
    rivals.add(approximate());
    rivals.add(swing(rivals.get(0)));
    rivals.add(new Rival("midplane Jeans length", "Jeans 1902", Outcome.BOUND, Double.NaN,
        JeansScale.fastestGrowth(layer.midplaneDensity()),
        JeansScale.length(Math.sqrt(layer.soundSquared()), layer.midplaneDensity()), Double.POSITIVE_INFINITY, "",
        Double.NaN, "uniform gas as dense as the midplane: longer waves alone grow, and none faster than this"));
    rivals.add(lag());
    for (LayerInterface layers : inputs.interfaces()) {
      rivals.add(overturning(layers.name() + ", along the field", layers));
      rivals.add(overturning(layers.name() + ", across the field", layers.acrossField()));
    }
    if (inputs.interfaces().isEmpty()) {
      rivals.add(Rival.without("overturning of an interface", "Chandrasekhar 1961", Outcome.NOT_JUDGED,
          "needs [[interface]]"));
    }
    return new RivalResult(List.copyOf(rivals), layer, inputs.interfaces());
  }

  private static Rival buoyancy(Supplier<SpacingResult> spacing) {
    String name = "magnetic buoyancy";
    String source = "Parker 1966";
    try {
      SpacingResult result = spacing.get();
      Optional<BranchPeak> peak = result.spacingPeak();
      double shortest = result.longestStableWavelength().orElse(Double.NaN);
      if (peak.isEmpty()) {
        return Rival.without(name, source, Outcome.STABLE, "");
      }
      return new Rival(name, source, Outcome.GROWS, peak.get().wavelength(), peak.get().growthRate(), shortest,
          Double.NaN, "", Double.NaN, result.spacing().isPresent() ? ""
              : "no mode gathers the disk's own gas; this is the fastest anywhere");
    } catch (RefusedModelException | UnsolvedException fault) {
      return Rival.without(name, source, Outcome.FAILED, fault.getMessage());
    }
  }

  /** What a judgement in the plane of the disk lacks; empty when nothing. */
  private String lacking() {
    if (!equilibrium.aboutMidplane()) {
      return "needs a disk about its midplane";
    }
    return disk.rotation().isEmpty() ? "needs [rotation]" : "";
  }

  private double kappa() {
    return disk.rotation().orElseThrow().kappa();
  }

  private Rival plane(String name, String source, List<PlaneFluid> fluids) {
    if (!lacking().isEmpty()) {
      return Rival.without(name, source, Outcome.NOT_JUDGED, lacking());
    }
    DiskGravityWaves waves = new DiskGravityWaves(fluids, kappa());
    double parameter = waves.stabilityParameter();
    double fastest = waves.fastestWavenumber();
    boolean grows = parameter < 1.0;
    return new Rival(name, source, grows ? Outcome.GROWS : Outcome.STABLE, grows ? 2.0 * Math.PI / fastest : Double.NaN,
        grows ? Math.sqrt(waves.growthRateSquared(fastest)) : Double.NaN, waves.shortestUnstable(),
        waves.longestUnstable(), "Q", parameter, "");
  }

  /** Without thickness; the row below it is the same gas as it is, so this one does not compete. */
  private Rival thin() {
    Rival thin = plane("gravity in the plane: gas, thin", "Toomre 1964", List.of(layer.gas().thin()));
    return thin.outcome() != Outcome.GROWS ? thin : new Rival(thin.name(), thin.source(), Outcome.BOUND,
        thin.wavelength(), thin.growthRate(), thin.shortest(), thin.longest(), thin.measure(), thin.value(),
        "as if it had no thickness, which overstates its growth");
  }

  private Rival stars(String name, PlaneFluid gas) {
    String source = "Jog and Solomon 1984, Rafikov 2001";
    String missing = !lacking().isEmpty() ? lacking()
        : inputs.stars().isEmpty() ? "needs [stars] or the gravity law isothermal-sheet" : "";
    return missing.isEmpty() ? plane(name, source, List.of(gas, inputs.stars().orElseThrow().fluid()))
        : Rival.without(name, source, Outcome.NOT_JUDGED, missing);
  }

  private Rival approximate() {
    Rival exact = stars("gas and stars, approximate Q", layer.gas());
    String source = "Romeo and Wiegert 2011";
    if (exact.outcome() == Outcome.NOT_JUDGED) {
      return Rival.without(exact.name(), source, Outcome.NOT_JUDGED, exact.remark());
    }
    return new Rival(exact.name(), source, Outcome.BOUND, Double.NaN, Double.NaN, Double.NaN, Double.NaN, "Q",
        TwoComponentParameter.thick(layer.gas(), inputs.stars().orElseThrow().fluid(), kappa()),
        "beside the exact relation above; it chooses no wave");
  }

  private Rival swing(Rival buoyancy) {
    String name = "swing amplification of the spacing";
    String source = "Julian and Toomre 1966, Toomre 1981";
    if (!lacking().isEmpty() || kappa() == 0.0) {
      return Rival.without(name, source, Outcome.NOT_JUDGED, lacking().isEmpty()
          ? "needs rotation.angular-speed above 0" : lacking());
    }
    double column = layer.surfaceDensity() + inputs.stars().map(StellarDisk::surfaceDensity).orElse(0.0);
    double critical = SwingAmplification.criticalWavelength(column, kappa());
    return new Rival(name, source, Outcome.BOUND, Double.NaN, Double.NaN, critical, 3.0 * critical, "X",
        buoyancy.wavelength() / critical, "of gas" + (inputs.stars().isPresent() ? " and stars" : " alone")
            + ", at the wavelength of magnetic buoyancy; strong for X from 1 to 3 where Q is below 2, and not"
            + " exponential");
  }

  private Rival lag() {
    String name = "shear of a lagging rotation";
    String source = "Miles 1961, Howard 1961";
    if (inputs.lag().isEmpty()) {
      return Rival.without(name, source, Outcome.NOT_JUDGED, "needs rotation.lag");
    }
    ShearRichardson shear = new ShearRichardson(equilibrium, disk.gasClosure().adiabaticIndex(),
        inputs.lag().getAsDouble());
    double least = shear.least();
    boolean stable = least >= ShearRichardson.STABLE;
    return new Rival(name, source, stable ? Outcome.STABLE : Outcome.BOUND, Double.NaN,
        stable ? Double.NaN : shear.growthBound(), Double.NaN, Double.NaN, "Ri", least, stable ? ""
            : "least at any height; below 1/4 it may grow, never faster than this, and tension of the field may hold it"
                + (least < 0.0 ? "; below 0 gas that field or cosmic rays bear overturns without any shear" : ""));
  }

  private static Rival overturning(String name, LayerInterface layers) {
    String source = "Chandrasekhar 1961";
    InterfaceWaves waves = new InterfaceWaves(layers);
    double cutoff = waves.cutoff();
    if (waves.unbounded()) {
      return new Rival(name, source, Outcome.UNBOUNDED, Double.NaN, Double.NaN, Double.NaN, cutoff, "", Double.NaN,
          "growth rises towards short waves until the thickness of the interface ends it");
    }
    double fastest = waves.fastest();
    if (Double.isNaN(fastest)) {
      return Rival.without(name, source, Outcome.STABLE, "");
    }
    return new Rival(name, source, Outcome.GROWS, fastest, waves.growthRate(2.0 * Math.PI / fastest), cutoff,
        Double.POSITIVE_INFINITY, "", Double.NaN, "");
  }
}
