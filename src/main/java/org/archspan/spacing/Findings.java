package org.archspan.spacing;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.archspan.boundary.Parity;
import org.archspan.boundary.TopBoundary;
import org.archspan.disk.Disk;
import org.archspan.disk.SelfGravity;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.GasState;

/** What a reader of the result must know, one sentence each. */
final class Findings {
  /** Share of the gas above the top whose perturbed gravity goes without saying. */
  private static final double NEGLIGIBLE_ABOVE = 1e-3;
  private final List<String> sentences = new ArrayList<>();

  static List<String> of(Disk disk, Equilibrium equilibrium, List<BranchPeak> branches, Optional<BranchPeak> fastest,
      Optional<Integer> spacing, AcrossLimit acrossLimit, SearchOptions options, WaveRange range) {
    Findings findings = new Findings();
    if (range.limited() && acrossLimit.growthRate() > 0.0) {
      findings.aboutRange(fastest, range);
    }
    if (fastest.isEmpty() && acrossLimit.growthRate() > 0.0) {
      findings.sentences.add("Only waves with the given wavelength across the field were searched, and they are stable;"
          + " shorter waves across the field grow, up to the limit of infinitely short ones.");
    }
    fastest.ifPresent(peak -> {
      findings.aboutFastest(peak, equilibrium);
      findings.aboutSpacing(equilibrium, branches, peak, spacing, options);
      findings.aboutSpacingMode(spacing.map(branches::get).orElse(peak), equilibrium);
    });
    if (range.direction().isPresent() && options.direction().isEmpty()) {
      findings.sentences.add("The direction is the best of a scan in steps of 5 degrees, refined; within it the fastest"
          + " wavelength is proved, between the directions of the scan it is not.");
    }
    if (disk.selfGravity() == SelfGravity.FULL) {
      findings.aboutGasAbove(equilibrium);
    }
    return List.copyOf(findings.sentences);
  }

  /** The potential of the perturbation is continued upwards as in empty space. */
  private void aboutGasAbove(Equilibrium equilibrium) {
    GasState top = equilibrium.at(equilibrium.top());
    double share = 2.0 * top.density() * top.densityScaleHeight() / equilibrium.surfaceDensity();
    if (share > NEGLIGIBLE_ABOVE) {
      sentences.add(String.format(Locale.ROOT, "About %.2g per cent of the gas lies above the top of the domain; the gravity"
          + " of its perturbation is left out.", 100.0 * share));
    }
  }

  private void aboutFastest(BranchPeak peak, Equilibrium equilibrium) {
    if (peak.continuum()) {
      sentences.add("The fastest growth is the edge of the continuum of the uniform atmosphere above the disk: no"
          + " discrete mode of the disk grows faster, and the disk does not choose this wavelength.");
    }
    if (peak.heldBy() == HeldBy.HALO && !peak.continuum()) {
      sentences.add("The fastest mode is hardly held by the disk: its branch still rises where it merges with the continuum of"
          + " the atmosphere above, and its wavelength is that of the merger.");
    }
    if (peak.wavenumber() == 0.0) {
      sentences.add("Growth rises towards infinite wavelength along the field: the gas interchanges without bending the"
          + " field, and no spacing along the field follows.");
    }
    if (!peak.continuum() && peak.centroidHeight() > 0.8 * equilibrium.top()) {
      sentences.add("The fastest mode has its kinetic energy in the uppermost fifth of the domain.");
    }
  }

  private void aboutRange(Optional<BranchPeak> fastest, WaveRange range) {
    if (fastest.isEmpty()) {
      sentences.add("Only waves between waves.shortest and waves.longest were searched: the gas is stable there, and may"
          + " be unstable to others.");
    } else if (range.endsAt(fastest.get().wavenumber())) {
      sentences.add("The fastest wave lies at the end of the range of wavelengths that was searched (waves.shortest,"
          + " waves.longest): growth rises beyond it.");
    }
  }

  private void aboutSpacing(Equilibrium equilibrium, List<BranchPeak> branches, BranchPeak fastest,
      Optional<Integer> spacing, SearchOptions options) {
    String limit = options.gatheringHeight().inScaleHeights()
        ? String.format(Locale.ROOT, "%.3g scale heights", options.gatheringHeight().value()) : "the height asked for";
    if (spacing.isEmpty()) {
      sentences.add("No unstable branch has its kinetic-energy centroid within " + limit + " of the "
          + (equilibrium.aboutMidplane() ? "midplane" : "floor") + ": nothing gathers the disk's own gas,"
          + " and the spacing given is that of the fastest growth anywhere.");
    } else if (branches.get(spacing.get()) != fastest) {
      sentences.add("The fastest growth of all is not the one that gathers the disk's own gas; the spacing is that of"
          + " the fastest branch whose kinetic-energy centroid lies within " + limit + ".");
    }
  }

  private void aboutSpacingMode(BranchPeak peak, Equilibrium equilibrium) {
    if (peak.continuum()) {
      return;
    }
    if (peak.parity() == Parity.FLEXING) {
      sentences.add("The mode that sets the spacing flexes the midplane: to first order no column density changes, and gas"
          + " gathers above the midplane half a wavelength from where it gathers below.");
    }
    if (Double.isNaN(peak.tallerGrowthChange())) {
      sentences.add("The influence of the upper boundary could not be measured: no taller domain can be built, or none of its"
          + " modes has a similar shape.");
    } else if (peak.heldBy() == HeldBy.LID) {
      sentences.add(String.format(Locale.ROOT, "The %s decides this mode: in a domain 1.5 times as tall its wavelength"
          + " changes by %+.1f per cent and its growth rate by %+.1f per cent.",
          equilibrium.topBoundary() == TopBoundary.LID ? "lid" : "upper boundary",
          100.0 * peak.tallerWavelengthChange(), 100.0 * peak.tallerGrowthChange()));
    }
  }
}
