package org.archspan.figure;

import java.awt.BasicStroke;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.function.ToDoubleFunction;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.equilibrium.GasState;
import org.archspan.units.OutputUnits;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.CombinedDomainXYPlot;
import org.jfree.chart.plot.XYPlot;

/** The base state against height: pressures and density, field and Alfven speed, gravity or temperature. */
public final class EquilibriumFigure implements Figure {
  private static final int POINTS = 400;
  private static final double DEEPEST = 1e-6;

  private final Equilibrium equilibrium;
  private final OutputUnits units;
  private final FigureStyle style;
  private final double[] height = new double[POINTS];
  private final GasState[] states = new GasState[POINTS];

  /** The figure of an equilibrium. */
  public EquilibriumFigure(Equilibrium equilibrium, OutputUnits units, FigureStyle style) {
    this.equilibrium = equilibrium;
    this.units = units.suiting(equilibrium.top());
    this.style = style;
    for (int i = 0; i < POINTS; i++) {
      double z = equilibrium.bottom() + (equilibrium.top() - equilibrium.bottom()) * i / (POINTS - 1);
      height[i] = this.units.length(z);
      states[i] = equilibrium.at(z);
    }
  }

  @Override
  public Page page() {
    return new Page(FigureStyle.COLUMN, 1.45 * FigureStyle.COLUMN, style.background());
  }

  @Override
  public String description() {
    return "Base state against height: density and pressures relative to their values at the lower end, field strength"
        + " and Alfven speed, gravity";
  }

  @Override
  public void draw(Graphics2D graphics, Rectangle2D area) {
    NumberAxis heightAxis = Plots.axis("height z (" + units.length() + ")", style);
    heightAxis.setRange(height[0], height[POINTS - 1]);
    CombinedDomainXYPlot plot = new CombinedDomainXYPlot(heightAxis);
    plot.setGap(5.0);
    plot.setOutlineVisible(false);
    plot.add(pressures(), 5);
    plot.add(field(), 4);
    plot.add(layered() ? speed() : gravity(), 3);
    for (Object panel : plot.getSubplots()) {
      ((XYPlot) panel).setDomainGridlinesVisible(true);
      ((XYPlot) panel).setDomainGridlinePaint(style.faint());
      ((XYPlot) panel).setDomainGridlineStroke(new BasicStroke(0.3f));
    }
    Plots.chart(plot, true, style).draw(graphics, area);
  }

  private XYPlot pressures() {
    double total = states[0].totalPressure();
    double density = states[0].density();
    DecadeAxis axis = Plots.logAxis("density, pressure", style);
    XYPlot panel = Plots.plot(null, axis, style);
    add(panel, "density/\u03c1(0)", 0, state -> state.density() / density);
    add(panel, "gas pressure/P(0)", 1, state -> state.gasPressure() / total);
    double lowest = lowest(state -> state.gasPressure() / total);
    if (states[POINTS - 1].magneticPerMass() > 0.0 || states[0].magneticPerMass() > 0.0) {
      add(panel, "magnetic/P(0)", 2, state -> state.magneticPressure() / total);
      lowest = Math.min(lowest, lowest(state -> state.magneticPressure() / total));
    }
    if (states[0].cosmicRayPerMass() > 0.0) {
      add(panel, "cosmic-ray/P(0)", 3, state -> state.cosmicRayPressure() / total);
      lowest = Math.min(lowest, lowest(state -> state.cosmicRayPressure() / total));
    }
    axis.setRange(Math.max(DEEPEST, 0.7 * lowest), 1.6);
    return panel;
  }

  private double lowest(ToDoubleFunction<GasState> value) {
    double lowest = 1.0;
    for (GasState state : states) {
      double v = value.applyAsDouble(state);
      lowest = v > 0.0 ? Math.min(lowest, v) : lowest;
    }
    return lowest;
  }

  private XYPlot field() {
    ValueAxis strength = Plots.axis("field (" + Plots.printed(units.field()) + ")", style);
    XYPlot panel = Plots.plot(null, strength, style);
    add(panel, "field strength", 5, state -> units.field(state.fieldStrength()));
    NumberAxis speed = Plots.axis("Alfv\u00e9n speed (km/s)", style);
    panel.setRangeAxis(1, speed);
    int last = panel.getDatasetCount();
    panel.setDataset(last, Plots.curve("Alfv\u00e9n speed", height, values(state -> state.alfvenSpeed() / 1e5)));
    panel.setRenderer(last, new CurveRenderer(style, 4, 1.2));
    panel.mapDatasetToRangeAxis(last, 1);
    fromZero(strength, values(state -> units.field(state.fieldStrength())));
    fromZero(speed, values(state -> state.alfvenSpeed() / 1e5));
    return panel;
  }

  private static void fromZero(ValueAxis axis, double[] values) {
    double greatest = java.util.Arrays.stream(values).filter(Double::isFinite).max().orElse(0.0);
    axis.setRange(0.0, greatest > 0.0 ? 1.12 * greatest : 1.0);
  }

  /** Whether the gas has more than one temperature: then that is drawn in place of gravity, which varies little. */
  private boolean layered() {
    double first = states[0].gasPerMass();
    return java.util.Arrays.stream(states).anyMatch(state -> Math.abs(state.gasPerMass() / first - 1.0) > 0.01);
  }

  private XYPlot speed() {
    ToDoubleFunction<GasState> speed = state -> Math.sqrt(state.gasPerMass()) / 1e5;
    double greatest = java.util.Arrays.stream(values(speed)).max().orElse(1.0);
    double lowest = java.util.Arrays.stream(values(speed)).min().orElse(1.0);
    boolean decades = greatest > 5.0 * lowest;
    ValueAxis axis = decades ? Plots.logAxis("c (km/s)", style) : Plots.axis("c (km/s)", style);
    XYPlot panel = Plots.plot(null, axis, style);
    panel.setDataset(0, Plots.curve("isothermal speed", height, values(speed)));
    panel.setRenderer(0, new CurveRenderer(style, 0, 1.2).thin(style.ink()));
    axis.setRange(decades ? 0.7 * lowest : 0.0, (decades ? 1.4 : 1.12) * greatest);
    return panel;
  }

  private XYPlot gravity() {
    double[] values = values(GasState::gravity);
    double greatest = java.util.Arrays.stream(values).filter(Double::isFinite).max().orElse(1.0);
    int decade = (int) Math.floor(Math.log10(greatest));
    double scale = Math.pow(10.0, decade);
    ValueAxis axis = Plots.axis("g (10" + DecadeAxis.superscript(decade) + " cm s\u207b\u00b2)", style);
    XYPlot panel = Plots.plot(null, axis, style);
    panel.setDataset(0, Plots.curve("gravity", height, values(state -> state.gravity() / scale)));
    CurveRenderer renderer = new CurveRenderer(style, 0, 1.2).thin(style.ink());
    renderer.setDefaultSeriesVisibleInLegend(false);
    panel.setRenderer(0, renderer);
    axis.setRange(0.0, 1.12 * greatest / scale);
    return panel;
  }

  private void add(XYPlot panel, String name, int look, ToDoubleFunction<GasState> value) {
    int index = panel.getDataset(0) == null ? 0 : panel.getDatasetCount();
    panel.setDataset(index, Plots.curve(name, height, values(value)));
    panel.setRenderer(index, new CurveRenderer(style, look, 1.2));
  }

  private double[] values(ToDoubleFunction<GasState> value) {
    double[] values = new double[POINTS];
    for (int i = 0; i < POINTS; i++) {
      double v = value.applyAsDouble(states[i]);
      values[i] = v > 0.0 ? v : Double.NaN;
    }
    return values;
  }
}
