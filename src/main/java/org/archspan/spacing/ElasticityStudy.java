package org.archspan.spacing;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.archspan.boundary.TopBoundary;
import org.archspan.disk.Disk;
import org.archspan.disk.RefusedModelException;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.EquilibriumBuilder;
import org.archspan.stability.ModeProblem;
import org.archspan.stability.PeakElasticity;
import org.archspan.stability.PeakSensitivity;
import org.archspan.stability.UnsolvedException;

/** Elasticities of the peak that sets the spacing, without rotation, with respect to the inputs of a model. */
public final class ElasticityStudy {
  private final Disk disk;
  private final SearchOptions options;
  private final SpacingResult result;

  /** Of a result that was solved for a disk. */
  public ElasticityStudy(Disk disk, SearchOptions options, SpacingResult result) {
    this.disk = disk;
    this.options = options;
    this.result = result.withoutRotation();
  }

  /** The elasticities; their cost is that of four base states for each input. */
  public Elasticities of(List<ModelInput> inputs) {
    Optional<BranchPeak> peak = result.spacingPeak();
    Optional<String> obstacle = obstacle(peak);
    if (obstacle.isPresent()) {
      return Elasticities.none(obstacle.get());
    }
    try {
      BranchPeak at = peak.orElseThrow();
      return PeakSensitivity.of(problem(disk, result.equilibrium(), options, at), at.order(), at.wavenumber(), at.growthRate())
          .map(sensitivity -> of(inputs, sensitivity, at))
          .orElse(Elasticities.none("The peak lies so near to the margin of its branch that its slopes are not known."));
    } catch (UnsolvedException missed) {
      return Elasticities.none("The peak could not be followed to either side: " + missed.getMessage() + ".");
    }
  }

  private Optional<String> obstacle(Optional<BranchPeak> peak) {
    if (peak.isEmpty()) {
      return Optional.of("Nothing grows.");
    }
    if (peak.get().continuum() || Double.isNaN(peak.get().wavelengthError())) {
      return Optional.of("The growth is that of a continuum, or ends in one.");
    }
    if (peak.get().wavenumber() == 0.0) {
      return Optional.of("Growth rises towards infinite wavelength.");
    }
    if (result.range().endsAt(peak.get().wavenumber())) {
      return Optional.of("The fastest wave is the shortest or longest that was searched, not a peak.");
    }
    return result.range().direction().isPresent()
        ? Optional.of("Where the field turns with height the direction of the wave would change too.") : Optional.empty();
  }

  private Elasticities of(List<ModelInput> inputs, PeakSensitivity sensitivity, BranchPeak peak) {
    List<Elasticities.Elasticity> list = new ArrayList<>();
    for (ModelInput input : inputs) {
      list.add(of(input, sensitivity, peak));
    }
    return new Elasticities(List.copyOf(list), disk.rotation().isPresent() ? "These are of the mode without rotation." : "");
  }

  private Elasticities.Elasticity of(ModelInput input, PeakSensitivity sensitivity, BranchPeak peak) {
    try {
      PeakElasticity value = sensitivity.to(factor -> scaled(input, factor, peak));
      return Double.isNaN(value.growthRate())
          ? new Elasticities.Elasticity(input.key(), Optional.empty(), "ends in the continuum above the top")
          : new Elasticities.Elasticity(input.key(), Optional.of(value), "");
    } catch (RefusedModelException | UnsolvedException refused) {
      return new Elasticities.Elasticity(input.key(), Optional.empty(), "cannot be changed both ways: "
          + refused.getMessage());
    }
  }

  private ModeProblem scaled(ModelInput input, double factor, BranchPeak peak) {
    ModelInput.Scaled other = input.scaled().apply(factor);
    Equilibrium equilibrium = EquilibriumBuilder.build(other.disk(), other.options().tolerance());
    return problem(other.disk(), smoothTop(equilibrium), other.options(), peak);
  }

  /** Where the top of an open domain is found automatically it may jump; there any top does as well. */
  private Equilibrium smoothTop(Equilibrium other) {
    Equilibrium base = result.equilibrium();
    if (disk.domain().top().isPresent() || base.topBoundary() != TopBoundary.OPEN) {
      return other;
    }
    double height = (base.top() - base.bottom()) * other.scaleHeight() / base.scaleHeight();
    return other.withTop(other.bottom() + height);
  }

  private static ModeProblem problem(Disk disk, Equilibrium equilibrium, SearchOptions options, BranchPeak peak) {
    return WaveRange.of(disk, equilibrium, options).problem(disk, equilibrium, peak.parity(), options.tolerance());
  }
}
