package org.archspan.spacing;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.archspan.equilibrium.Equilibrium;

/**
 * The answer of the main job, CGS.
 *
 * @param equilibrium             base state
 * @param forceBalanceResidual    greatest |dP/dz + rho g| / (rho g), dimensionless
 * @param range                   waves that were searched
 * @param branches                one entry for each unstable branch, fastest first; empty when stable
 * @param fastest                 the fastest of all: the first branch, or the halo continuum edge
 * @param spacing                 index into {@code branches} of the fastest that gathers the disk's own gas; empty when
 *                                none does
 * @param acrossLimit             limit of short waves across the field
 * @param longestStableWavelength shorter waves along the field than this are stable, cm; absent when all are
 * @param complex                 what one spacing gathers; empty when stable
 * @param certificate             proof that nothing faster was missed
 * @param gatheringHeight         greatest centroid height that counts as gathering the disk's own gas, cm
 * @param warnings                what a reader of the result must know, one sentence each
 * @param rotation                how modes were counted under rotation, and the result without it; empty without rotation
 * @param elasticities            how the spacing answers each input; empty where that was not asked
 */
public record SpacingResult(Equilibrium equilibrium, double forceBalanceResidual, WaveRange range, List<BranchPeak> branches,
    Optional<BranchPeak> fastest, Optional<Integer> spacing, AcrossLimit acrossLimit,
    OptionalDouble longestStableWavelength, Optional<CloudComplex> complex, Certificate certificate,
    double gatheringHeight, List<String> warnings, Optional<RotatingAnswer> rotation,
    Optional<Elasticities> elasticities) {
  /** Without elasticities. */
  public SpacingResult(Equilibrium equilibrium, double forceBalanceResidual, WaveRange range, List<BranchPeak> branches,
      Optional<BranchPeak> fastest, Optional<Integer> spacing, AcrossLimit acrossLimit,
      OptionalDouble longestStableWavelength, Optional<CloudComplex> complex, Certificate certificate,
      double gatheringHeight, List<String> warnings, Optional<RotatingAnswer> rotation) {
    this(equilibrium, forceBalanceResidual, range, branches, fastest, spacing, acrossLimit, longestStableWavelength,
        complex, certificate, gatheringHeight, warnings, rotation, Optional.empty());
  }

  /** The same result with one more warning. */
  public SpacingResult warned(String warning) {
    List<String> more = new ArrayList<>(warnings);
    more.add(warning);
    return new SpacingResult(equilibrium, forceBalanceResidual, range, branches, fastest, spacing, acrossLimit,
        longestStableWavelength, complex, certificate, gatheringHeight, List.copyOf(more), rotation,
        elasticities);
  }

  /** The same result with elasticities. */
  public SpacingResult with(Elasticities newElasticities) {
    return new SpacingResult(equilibrium, forceBalanceResidual, range, branches, fastest, spacing, acrossLimit,
        longestStableWavelength, complex, certificate, gatheringHeight, warnings, rotation, Optional.of(newElasticities));
  }

  /** Whether no wave grows. */
  public boolean stable() {
    return fastest.isEmpty();
  }

  /** The peak that sets the spacing: the fastest that gathers the disk's own gas, otherwise the fastest of all. */
  public Optional<BranchPeak> spacingPeak() {
    return spacing.map(branches::get).or(() -> fastest);
  }

  /** The same answer without rotation: itself where there is none. */
  public SpacingResult withoutRotation() {
    return rotation.map(RotatingAnswer::without).orElse(this);
  }
}
