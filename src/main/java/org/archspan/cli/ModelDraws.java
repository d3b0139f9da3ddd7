package org.archspan.cli;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.archspan.disk.RefusedModelException;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.modelfile.DrawnModel;
import org.archspan.modelfile.Model;
import org.archspan.spacing.QuickSpacing;
import org.archspan.spacing.QuickStudy;
import org.archspan.stability.UnsolvedException;
import org.archspan.uncertainty.DrawRow;
import org.archspan.uncertainty.DrawSolver;
import org.archspan.uncertainty.UncertainInput;

/** Solves a model for the values of a draw. Safe for several threads. */
final class ModelDraws implements DrawSolver {
  private final Model model;
  private final List<UncertainInput> inputs;
  private final boolean testLid;

  ModelDraws(Model model, boolean testLid) {
    this.model = model;
    this.inputs = model.uncertain().inputs();
    this.testLid = testLid;
  }

  @Override
  public DrawRow solve(long draw, double[] values) {
    List<Double> written = new ArrayList<>(values.length);
    for (int i = 0; i < values.length; i++) {
      written.add(values[i] / inputs.get(i).unitSize());
    }
    try {
      return solved(draw, List.copyOf(written), model.uncertain().with(values));
    } catch (RefusedModelException | UnsolvedException fault) {
      return without(draw, written, DrawRow.Outcome.FAILED, fault.getMessage());
    } catch (RuntimeException bug) {
      // one draw among millions must not end them all; it counts as failed and the exit status tells
      return without(draw, written, DrawRow.Outcome.FAILED, "fault of the program: " + bug);
    }
  }

  private DrawRow solved(long draw, List<Double> written, DrawnModel drawn) {
    QuickStudy study = new QuickStudy(drawn.options(), testLid);
    Equilibrium equilibrium = study.equilibrium(drawn.disk());
    Optional<QuickSpacing> answer = study.solve(drawn.disk(), equilibrium);
    if (answer.isEmpty()) {
      return without(draw, written, DrawRow.Outcome.STABLE, "");
    }
    QuickSpacing spacing = answer.get();
    double mass = equilibrium.surfaceDensity() * spacing.crestSpacing()
        * drawn.arm().width().orElse(model.units().centimetresPerLength());
    return new DrawRow(draw, written, DrawRow.Outcome.UNSTABLE, model.units().length(spacing.wavelength()),
        model.units().time(1.0 / spacing.growthRate()), model.units().mass(mass),
        spacing.heldBy().map(held -> held.name().toLowerCase(Locale.ROOT)).orElse(""), spacing.gathers(), "");
  }

  private static DrawRow without(long draw, List<Double> written, DrawRow.Outcome outcome, String reason) {
    return new DrawRow(draw, List.copyOf(written), outcome, Double.NaN, Double.NaN, Double.NaN, "", false, reason);
  }
}
