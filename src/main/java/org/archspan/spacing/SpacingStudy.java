package org.archspan.spacing;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.archspan.disk.Disk;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.EquilibriumBuilder;
import org.archspan.equilibrium.ForceBalance;
import org.archspan.stability.GrowthPoint;
import org.archspan.stability.ShortCrossWaves;

/** The main job: from a disk to its fastest mode and its spacing. Immutable. */
public final class SpacingStudy {
  private final Disk disk;
  private final SearchOptions options;
  private final Arm arm;

  /** A study of a disk. */
  public SpacingStudy(Disk disk, SearchOptions options, Arm arm) {
    this.disk = disk;
    this.options = options;
    this.arm = arm;
  }

  /**
   * Solves.
   *
   * @throws org.archspan.disk.RefusedModelException  when the equilibrium does not exist or the range is empty
   * @throws org.archspan.stability.UnsolvedException when the tolerance is missed
   */
  public SpacingResult solve() {
    SpacingResult still = still();
    return disk.rotation().filter(rotation -> rotation.angularSpeed() > 0.0).isEmpty() ? still : rotating(still);
  }

  /** The answer with rotation; nothing grows with it that does not grow without. */
  private SpacingResult rotating(SpacingResult still) {
    if (still.stable()) {
      return still;
    }
    if (still.fastest().filter(BranchPeak::continuum).isPresent()) {
      return still.warned("Rotation is given but left out: the fastest growth is that of the continuum above the open top,"
          + " for which it is not solved; with domain.top-boundary = \"lid\" it is.");
    }
    RotatingStudy study = new RotatingStudy(disk, options, still);
    RotatingStudy.Branches found = study.branches();
    List<BranchPeak> branches = found.peaks();
    Equilibrium equilibrium = still.equilibrium();
    Optional<BranchPeak> fastest = branches.stream().findFirst();
    Optional<Integer> spacing = gathering(branches, equilibrium.bottom() + still.gatheringHeight());
    Optional<BranchPeak> peak = spacing.map(branches::get).or(() -> fastest);
    return new SpacingResult(equilibrium, still.forceBalanceResidual(), still.range(), branches, fastest, spacing,
        still.acrossLimit(), still.longestStableWavelength(),
        peak.map(at -> complex(equilibrium, at, still.range())), still.certificate(), still.gatheringHeight(),
        Findings.of(disk, equilibrium, branches, fastest, spacing, still.acrossLimit(), options, still.range()),
        Optional.of(study.answer(peak.map(found.counts()::get))))
        .warned("Growth curves and the shape of the mode are those without rotation.");
  }

  private SpacingResult still() {
    Equilibrium equilibrium = EquilibriumBuilder.build(disk, options.tolerance());
    double residual = ForceBalance.required(equilibrium);
    WaveRange range = WaveRange.of(disk, equilibrium, options);
    BranchSearch search = new BranchSearch(disk, equilibrium, options, range, options.branches());
    DomainInfluence influence = new DomainInfluence(disk, equilibrium, options, range);
    List<BranchPeak> branches = influence.judge(search.found()).stream()
        .sorted(Comparator.comparingDouble(BranchPeak::growthRate).reversed()).toList();
    Optional<BranchPeak> fastest = fastest(branches, search, influence, range);
    double gatheringHeight = options.gatheringHeight().resolve(equilibrium.scaleHeight());
    Optional<Integer> spacing = gathering(branches, equilibrium.bottom() + gatheringHeight);
    Optional<CloudComplex> complex = spacing.map(branches::get).or(() -> fastest)
        .filter(peak -> peak.wavenumber() > 0.0).map(peak -> complex(equilibrium, peak, range));
    AcrossLimit acrossLimit = acrossLimit(equilibrium);
    return new SpacingResult(equilibrium, residual, range, branches, fastest, spacing,
        acrossLimit, longestStable(search), complex, search.certificate(), gatheringHeight,
        Findings.of(disk, equilibrium, branches, fastest, spacing, acrossLimit, options, range), Optional.empty());
  }

  /** The fastest branch, or the continuum of the atmosphere above where that is faster. */
  private static Optional<BranchPeak> fastest(List<BranchPeak> branches, BranchSearch search,
      DomainInfluence influence, WaveRange range) {
    Optional<BranchPeak> discrete = branches.stream().findFirst();
    Optional<GrowthPoint> halo = search.halo()
        .filter(edge -> edge.growthRate() >= discrete.map(BranchPeak::growthRate).orElse(0.0));
    return halo.map(edge -> influence.judgeHalo(edge, search.solvers().get(0).problem().parity(),
        range.crossWavenumber())).or(() -> discrete);
  }

  private static Optional<Integer> gathering(List<BranchPeak> branches, double highestCentroid) {
    for (int i = 0; i < branches.size(); i++) {
      if (branches.get(i).centroidHeight() <= highestCentroid && branches.get(i).wavenumber() > 0.0) {
        return Optional.of(i);
      }
    }
    return Optional.empty();
  }

  private AcrossLimit acrossLimit(Equilibrium equilibrium) {
    ShortCrossWaves.Fastest fastest =
        new ShortCrossWaves(equilibrium, disk.gasClosure(), disk.cosmicRays().closure()).fastest();
    return new AcrossLimit(fastest.growthRate(), fastest.wavenumber(), fastest.height());
  }

  private static OptionalDouble longestStable(BranchSearch search) {
    double marginal = search.marginalWavenumber();
    return marginal > 0.0 && Double.isFinite(marginal) ? OptionalDouble.of(2.0 * Math.PI / marginal)
        : OptionalDouble.empty();
  }

  private CloudComplex complex(Equilibrium equilibrium, BranchPeak peak, WaveRange range) {
    double perWidth = equilibrium.surfaceDensity() * range.crestSpacing(peak.wavelength());
    OptionalDouble mass = arm.width().isPresent() ? OptionalDouble.of(perWidth * arm.width().getAsDouble())
        : OptionalDouble.empty();
    OptionalDouble eFoldings = arm.crossingTime().isPresent()
        ? OptionalDouble.of(arm.crossingTime().getAsDouble() * peak.growthRate()) : OptionalDouble.empty();
    return new CloudComplex(perWidth, mass, eFoldings);
  }
}
