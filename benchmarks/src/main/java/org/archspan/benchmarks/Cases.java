package org.archspan.benchmarks;

import java.io.IOException;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
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
import org.archspan.disk.SelfGravity;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.EquilibriumBuilder;
import org.archspan.gravity.TanhGravity;
import org.archspan.modelfile.ModelReader;
import org.archspan.modelfile.ShippedModels;
import org.archspan.stability.ModeProblem;
import org.archspan.units.Constants;

/** The models of the race, the same as in {@code peer/base_states.py}. */
final class Cases {
  static final double TOLERANCE = 1e-8;

  private Cases() {
  }

  /** g = g0 tanh(z/H), H = 3 c^2/g0, alpha = beta = 1, lid at 10 H; units c = H = 1. */
  static Disk tanh() {
    return new Disk(new Gas.Isothermal(1.0, OptionalDouble.of(1.0), OptionalDouble.empty()), new GasClosure(1.0),
        new MagneticField.ConstantRatio(1.0), new CosmicRays.PressureRatio(1.0, CosmicRayClosure.instantDiffusion()),
        List.of(new TanhGravity(3.0, 1.0)), Domain.aboutMidplane(Optional.of(Height.centimetres(10.0)), TopBoundary.LID));
  }

  /** The same with the gas's own gravity: 4 pi G rho = 1 at the midplane, in the base state and on the perturbations. */
  static Disk heavy() {
    Disk light = tanh();
    double density = 1.0 / (4.0 * Math.PI * Constants.GRAVITATIONAL_CONSTANT);
    return new Disk(new Gas.Isothermal(1.0, OptionalDouble.of(density), OptionalDouble.empty()), light.gasClosure(),
        SelfGravity.FULL, light.field(), light.cosmicRays(), light.gravity(), Optional.empty(), light.domain());
  }

  /** The thick disk near the Sun, lid at 5 kpc. */
  static Disk thick() {
    try {
      return ModelReader.read(ShippedModels.text("thick-disk-near-the-sun"), "shipped", java.nio.file.Path.of("."),
          List.of(), TOLERANCE).model().orElseThrow().disk();
    } catch (IOException impossible) {
      throw new IllegalStateException(impossible);
    }
  }

  static Disk disk(String model) {
    return switch (model) {
      case "tanh" -> tanh();
      case "heavy" -> heavy();
      default -> thick();
    };
  }

  /** The wavenumber along the field at which one growth rate is timed. */
  static double along(String model) {
    return !model.equals("thick") ? 0.4 : 2.0 * Math.PI / (3000.0 * Constants.PARSEC);
  }

  /** The wavenumber across: none, or oblique. */
  static double across(String model, boolean oblique) {
    return !oblique ? 0.0 : !model.equals("thick") ? 1.0 : along(model);
  }

  static ModeProblem problem(String model, boolean oblique, Parity parity) {
    return problem(disk(model), across(model, oblique), parity);
  }

  static ModeProblem problem(Disk disk, double across, Parity parity) {
    Equilibrium equilibrium = EquilibriumBuilder.build(disk, TOLERANCE);
    return ModeProblem.of(disk, equilibrium, parity, across, TOLERANCE);
  }
}
