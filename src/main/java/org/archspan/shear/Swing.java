package org.archspan.shear;

import java.util.List;
import org.archspan.boundary.Parity;
import org.archspan.disk.Disk;
import org.archspan.disk.Rotation;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.mesh.Mesh;
import org.archspan.stability.ShortCrossWaves;

/** A wave of one parity and wavelength in a shearing disk over a span of time: what it can gain from a start. */
final class Swing {
  private static final double COARSE_STEP = 0.25;
  private static final double COARSE_STEP_RELAXING = 0.08;

  private final Disk disk;
  private final Equilibrium equilibrium;
  private final Parity parity;
  private final double wavenumber;
  private final double duration;

  /**
   * A wave.
   *
   * @param wavenumber along the field, cm^-1
   * @param duration   s
   */
  Swing(Disk disk, Equilibrium equilibrium, Parity parity, double wavenumber, double duration) {
    this.disk = disk;
    this.equilibrium = equilibrium;
    this.parity = parity;
    this.wavenumber = wavenumber;
    this.duration = duration;
  }

  Parity parity() {
    return parity;
  }

  ShearingColumn column(Mesh mesh) {
    return new ShearingColumn(equilibrium, disk.gasClosure(), disk.cosmicRays().closure(), mesh, wavenumber,
        parity != Parity.FLEXING);
  }

  /** dOmega/dlnR = (kappa^2 - 4 Omega^2)/(2 Omega), s^-1. */
  static double shear(Rotation rotation) {
    double kappa = rotation.kappa();
    double twice = 2.0 * rotation.angularSpeed();
    return (kappa - twice) * (kappa + twice) / twice;
  }

  WindingWave winding(ShearingColumn column) {
    Rotation rotation = disk.rotation().orElseThrow();
    return new WindingWave(column, new DiskFlow(rotation.angularSpeed() * column.time, shear(rotation) * column.time),
        column.relaxations.isEmpty() ? Composition.SIXTH_ORDER : Composition.MIDPOINT);
  }

  /** Steps that a first look needs. */
  int coarseSteps(ShearingColumn column) {
    double step = column.relaxations.isEmpty() ? COARSE_STEP : COARSE_STEP_RELAXING;
    return (int) Math.ceil(duration / column.time / step);
  }

  /** What seeks the best motion for a start, radial over azimuthal wavenumber, with so many steps. */
  BestKick kick(WindingWave winding, double start, int steps) {
    return new BestKick(winding, -start * winding.column().kx, step(winding, steps), steps);
  }

  /** The wave that a motion at the start makes. */
  Track track(WindingWave winding, double start, int steps, WaveState kick) {
    return new Track(winding, -start * winding.column().kx, step(winding, steps), steps, kick);
  }

  private double step(WindingWave winding, int steps) {
    return duration / winding.column().time / steps;
  }

  /** The answer that a track gives. */
  Amplification result(Track track, double error, List<StartGain> starts, List<String> warnings) {
    ShearingColumn column = track.winding().column();
    Rotation rotation = disk.rotation().orElseThrow();
    double rigid = RigidGrowth.of(column, rotation.angularSpeed() * column.time, 0.0) / column.time;
    double still = RigidGrowth.of(column, 0.0, 0.0) / column.time;
    double limit = new ShortCrossWaves(equilibrium, disk.gasClosure(), disk.cosmicRays().closure())
        .fastestAt(wavenumber).growthRate();
    return new Amplification(parity, wavenumber, shear(rotation), track.times(), track.windings(),
        track.amplification(), track.densityContrast(), error, starts, rigid, still, limit, warnings);
  }
}
