package spanwright.moments;

import java.util.List;

/**
 * What is to be solved: wires, and where one of them is fed. Metal that only stands near (a gutter,
 * a fence) is simply another wire.
 *
 * @param wires all conductors
 * @param feedWire index of the fed wire, from 0
 * @param feedFraction where along its arc length the middle of the feed gap is, between 0 and 1
 * @param gap width of the feed gap [m]: the feed keeps half of it from ends and junctions, and the
 *     mesh there is no finer; the charge of the gap's own length is not counted as input
 */
public record AntennaModel(List<WireSpec> wires, int feedWire, double feedFraction, double gap) {
  /** Ends of wires nearer than this are one point [m]. */
  public static final double JOIN_DISTANCE = 0.001;

  /** About what a centre insulator is [m]. */
  public static final double USUAL_GAP = 0.10;

  public AntennaModel {
    wires = List.copyOf(wires);
  }

  /** A model with the usual feed gap. */
  public static AntennaModel of(List<WireSpec> wires, int feedWire, double feedFraction) {
    return new AntennaModel(wires, feedWire, feedFraction, USUAL_GAP);
  }
}
