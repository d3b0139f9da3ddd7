package org.archspan.shear;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.archspan.boundary.Parity;
import org.archspan.boundary.TopBoundary;
import org.archspan.disk.Disk;
import org.archspan.disk.RefusedModelException;
import org.archspan.disk.SelfGravity;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.spacing.QuickSpacing;
import org.archspan.spacing.QuickStudy;
import org.archspan.spacing.SearchOptions;
import org.archspan.stability.MeshGrading;

/**
 * How far differential rotation lets a wave grow (Goldreich and Lynden-Bell 1965, MNRAS 130, 125; for the magnetic buoyancy
 * of disks Foglizzo and Tagger 1994, A&A 287, 297): the field lies along the azimuth, the azimuthal wavenumber stands and the
 * radial one is wound up. Optimised are the winding at the start, among all waves that pass through zero radial wavenumber
 * within the span, and for each the motion at all heights at the start.
 */
public final class AmplifyStudy {
  private static final int DEGREE = 10;
  /** A symmetry is preferred to the other where it gains more by this factor: waves above the midplane know none. */
  private static final double CLEARLY = 1.001;
  private static final double OPEN_HEIGHTS = 2.0;

  private final Disk disk;
  private final SearchOptions search;
  private final AmplifyOptions options;

  /** A question to a disk; {@code search} serves to find the wavelength where none is given. */
  public AmplifyStudy(Disk disk, SearchOptions search, AmplifyOptions options) {
    this.disk = disk;
    this.search = search;
    this.options = options;
  }

  /**
   * The amplification. Some seconds.
   *
   * @throws RefusedModelException                    where the disk does not rotate, or holds what this does not treat
   * @throws org.archspan.stability.UnsolvedException when the tolerance is missed
   */
  public Amplification solve(Equilibrium equilibrium) {
    requireTreatable();
    double wavenumber = 2.0 * Math.PI / options.wavelength().orElseGet(() -> spacingWavelength(equilibrium));
    double turn = 2.0 * Math.PI / disk.rotation().orElseThrow().angularSpeed();
    double duration = options.duration().orElse(turn);
    List<String> warnings = new ArrayList<>();
    Equilibrium bounded = bounded(equilibrium, warnings);
    List<Swing> swings = parities(bounded).stream()
        .map(parity -> new Swing(disk, bounded, parity, wavenumber, duration)).toList();
    List<StartGain> gains = new ArrayList<>();
    StartGain best = null;
    for (Swing swing : swings) {
      StartSearch starts = new StartSearch(swing, MeshGrading.initial(bounded, DEGREE));
      StartGain found = search(starts, duration);
      best = best == null || found.eFoldings() > CLEARLY * best.eFoldings() ? found : best;
      gains.addAll(starts.gains());
    }
    gains.sort(Comparator.comparing(StartGain::parity).thenComparingDouble(StartGain::winding));
    Swing swing = swings.get(parities(bounded).indexOf(best.parity()));
    return new CheckedSwing(swing, best.winding(), options.tolerance())
        .solve(MeshGrading.initial(bounded, DEGREE), gains, warnings);
  }

  /** Of all waves that are open, with crests along the radius, at some moment of the span; or the one that is asked for. */
  private StartGain search(StartSearch starts, double duration) {
    if (options.start().isPresent()) {
      return starts.at(options.start().getAsDouble());
    }
    double wound = Math.abs(Swing.shear(disk.rotation().orElseThrow())) * duration;
    return wound == 0.0 ? starts.at(0.0) : starts.best(-wound, 0.0);
  }

  private void requireTreatable() {
    if (disk.rotation().isEmpty() || disk.rotation().get().angularSpeed() == 0.0) {
      throw new RefusedModelException("amplify needs a disk that rotates: give [rotation] angular-speed, and"
          + " epicyclic-frequency for its shear");
    }
    if (disk.selfGravity() == SelfGravity.FULL) {
      throw new RefusedModelException("amplify does not treat gas.self-gravity = \"full\": allowed are \"off\" and"
          + " \"equilibrium\", which leaves the gravity of the perturbation out (--set gas.self-gravity=equilibrium)");
    }
    if (disk.fieldTurn() != 0.0) {
      throw new RefusedModelException("amplify needs a field along the azimuth at all heights: remove field.turn");
    }
  }

  private double spacingWavelength(Equilibrium equilibrium) {
    return new QuickStudy(search, false).solve(disk.withoutRotation(), equilibrium)
        .map(QuickSpacing::wavelength).filter(Double::isFinite)
        .orElseThrow(() -> new RefusedModelException("without rotation no wave of a finite wavelength grows in this disk,"
            + " so there is none to take for granted: give --wavelength"));
  }

  private static Equilibrium bounded(Equilibrium equilibrium, List<String> warnings) {
    if (equilibrium.topBoundary() != TopBoundary.OPEN) {
      return equilibrium;
    }
    Equilibrium taller = equilibrium.withTop(
        equilibrium.bottom() + OPEN_HEIGHTS * (equilibrium.top() - equilibrium.bottom()));
    warnings.add("An open top has no closed form in time: a lid stands at twice its height instead.");
    return taller;
  }

  private static List<Parity> parities(Equilibrium equilibrium) {
    return equilibrium.aboutMidplane() ? List.of(Parity.MIRROR, Parity.FLEXING) : List.of(Parity.FLOOR);
  }
}
