package org.archspan.stability;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.archspan.boundary.Parity;
import org.archspan.boundary.TopBoundary;
import org.archspan.closure.CosmicRayClosure;
import org.archspan.closure.GasClosure;
import org.archspan.disk.CosmicRays;
import org.archspan.disk.Disk;
import org.archspan.disk.Domain;
import org.archspan.disk.Gas;
import org.archspan.disk.Height;
import org.archspan.disk.MagneticField;
import org.archspan.gravity.TanhGravity;
import org.archspan.reference.UniformAtmosphere;
import org.archspan.spacing.Arm;
import org.archspan.spacing.BranchPeak;
import org.archspan.spacing.HeldBy;
import org.archspan.spacing.SearchOptions;
import org.archspan.spacing.SpacingStudy;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** With g = g0 tanh(z/H), constant ratios and an open top the answer is the kz = 0 branch of Parker (1966), maximised. */
class HaloHonestyTest {
  @ParameterizedTest
  @ValueSource(doubles = {1e-2, 1e-4, 1e-6, 1e-8, 1e-10, 1e-12})
  void theErrorCountsWhereTheTopStands(double tolerance) {
    Disk disk = new Disk(new Gas.Isothermal(1.0, OptionalDouble.of(1.0), OptionalDouble.empty()), new GasClosure(1.0),
        new MagneticField.ConstantRatio(1.0), new CosmicRays.PressureRatio(1.0, CosmicRayClosure.instantDiffusion()),
        List.of(new TanhGravity(3.0, 1.0)), Domain.aboutMidplane(Optional.empty(), TopBoundary.OPEN));
    SearchOptions options = new SearchOptions(Optional.empty(), Set.of(Parity.MIRROR, Parity.FLEXING), Optional.empty(),
        Optional.empty(), Height.scaleHeights(2.0), tolerance, 2);
    BranchPeak halo = new SpacingStudy(disk, options, Arm.unknown()).solve().fastest().orElseThrow();
    assertThat(halo.heldBy()).isEqualTo(HeldBy.HALO);
    UniformAtmosphere above = new UniformAtmosphere(1.0, 1.0, 1.0, 4.0 / 3.0, Double.POSITIVE_INFINITY);
    double exact = above.growthRate(halo.wavenumber(), 0.0, 0.0);
    assertThat(Math.abs(halo.growthRate() / exact - 1.0)).isLessThanOrEqualTo(3.0 * halo.growthError());
    assertThat(halo.growthError()).isLessThan(30.0 * tolerance);
  }
}
