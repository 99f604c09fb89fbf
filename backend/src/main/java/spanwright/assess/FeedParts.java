package spanwright.assess;

import spanwright.feed.Line;
import spanwright.feed.MatchingNetwork;
import spanwright.plan.LineKind;
import spanwright.plan.MatchingUnit;

/** The catalogue's lines and matching units as the feed chain takes them. */
public final class FeedParts {
  private FeedParts() {}

  /** A feed line of the catalogue. */
  public static Line line(LineKind kind) {
    return Line.of(
            kind.impedance(), kind.velocityFactor(), kind.conductorLoss(), kind.dielectricLoss())
        .withPeakVolts(kind.peakVolts());
  }

  /** A matching unit of the catalogue or of a brief. */
  public static MatchingNetwork network(MatchingUnit unit) {
    if (unit.network() == MatchingUnit.Network.BALUN) {
      return MatchingNetwork.balun(unit.peakVolts());
    }
    return new MatchingNetwork(
        unit.network() == MatchingUnit.Network.T ? MatchingNetwork.Kind.T : MatchingNetwork.Kind.L,
        unit.inductance().get(0),
        unit.inductance().get(1),
        unit.capacitance().get(0),
        unit.capacitance().get(1),
        unit.coilQ(),
        unit.capacitorQ(),
        unit.peakVolts());
  }
}
