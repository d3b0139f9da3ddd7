package org.archspan.equilibrium;

import java.util.ArrayList;
import java.util.List;
import org.archspan.disk.GasLayer;

/**
 * The square of the isothermal speed of an atmosphere of layers: from each layer to the one above it by
 * {@code (1/2) [1 + tanh((z - from)/blend)]} of their difference.
 */
record LayerBlend(List<GasLayer> layers) implements HeightProfile {
  @Override
  public double value(double height) {
    double square = layers.get(0).dispersionSquared();
    for (int i = 1; i < layers.size(); i++) {
      GasLayer layer = layers.get(i);
      square += 0.5 * step(i) * (1.0 + Math.tanh((height - layer.from()) / layer.blend()));
    }
    return square;
  }

  private double step(int i) {
    return layers.get(i).dispersionSquared() - layers.get(i - 1).dispersionSquared();
  }

  @Override
  public double slope(double height) {
    double slope = 0.0;
    for (int i = 1; i < layers.size(); i++) {
      GasLayer layer = layers.get(i);
      double sech = 1.0 / Math.cosh((height - layer.from()) / layer.blend());
      slope += 0.5 * step(i) * sech * sech / layer.blend();
    }
    return slope;
  }

  @Override
  public List<Bend> bends() {
    List<Bend> bends = new ArrayList<>();
    for (int i = 1; i < layers.size(); i++) {
      GasLayer layer = layers.get(i);
      bends.add(Bend.ofFactor(layer.from(), layer.blend(),
          layer.dispersionSquared() / layers.get(i - 1).dispersionSquared()));
    }
    return bends;
  }
}
