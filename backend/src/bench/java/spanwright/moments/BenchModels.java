package spanwright.moments;

import java.util.ArrayList;
import java.util.List;

/**
 * What a garden asks of the solver, in three sizes: a doublet of 2 × 14 m whose legs slope and bend
 * once, on a low, a middle and a high band; at the middle size with a gutter and its downpipe
 * beside it, at the largest with a fence wire too.
 */
final class BenchModels {
  /** Soil of middling kind. */
  static final Ground SOIL = Ground.real(13, 0.005);

  /** The sizes asked for: about so many unknowns. */
  static final List<Integer> SIZES = List.of(30, 60, 120);

  private BenchModels() {}

  /** The frequency of a size [MHz]. */
  static double frequencyMHz(int size) {
    return switch (size) {
      case 30 -> 6.6;
      case 60 -> 4.25;
      case 120 -> 19.0;
      default -> throw new IllegalArgumentException("sizes are " + SIZES);
    };
  }

  /** The wires of a size. */
  static AntennaModel model(int size) {
    List<WireSpec> wires = new ArrayList<>();
    List<Vertex> legs = new ArrayList<>();
    if (size >= 60) {
      legs.add(new Vertex(-13, 3, 4.5));
    }
    legs.add(new Vertex(-9, -0.5, 7.2));
    legs.add(new Vertex(0, 0, 9.4));
    legs.add(new Vertex(9.5, 0.7, 6.8));
    if (size >= 60) {
      legs.add(new Vertex(12.5, 4, 5.1));
    }
    wires.add(WireSpec.of(legs, 0.001, WireSpec.COPPER));
    if (size >= 60) {
      wires.add(
          WireSpec.of(
              List.of(new Vertex(-5, 6, 5.2), new Vertex(4.5, 6.4, 5.1), new Vertex(4.5, 6.4, 0.4)),
              0.04,
              3.5e7));
    }
    if (size >= 120) {
      wires.add(
          new WireSpec(
              List.of(new Vertex(-12, -6, 1.4), new Vertex(8, -7, 1.4)), 0.00125, 6e6, 100, null));
    }
    return new AntennaModel(wires, 0, 0.5, AntennaModel.USUAL_GAP);
  }
}
