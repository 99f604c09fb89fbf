package spanwright.assess;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import spanwright.moments.AntennaModel;
import spanwright.moments.Sheath;
import spanwright.moments.Vertex;
import spanwright.moments.WireSpec;
import spanwright.plan.Catalogue;
import spanwright.plan.GroundSurface;
import spanwright.plan.Place;
import spanwright.plan.WireKind;
import spanwright.rigging.Rigged;

/** Puts a hanging wire before the field solver: the calm shape over the plane of its ground. */
final class Antennas {
  private static final Pattern WIRE = Pattern.compile("wires\\[(\\d+)]");

  /**
   * Wire that hangs to the ground is solved this far over it [m]; it is foul, and a note says so.
   */
  private static final double LEAST_HEIGHT = 0.05;

  /** A gap's middle stays this far from where wires are joined [m]. */
  private static final double LEAST_FROM_JOINT = 0.1;

  private final Catalogue catalogue;
  private final GroundSurface surface;
  private final Metal metal;

  Antennas(Catalogue catalogue, GroundSurface surface, Metal metal) {
    this.catalogue = catalogue;
    this.surface = surface;
    this.metal = metal;
  }

  /** All the plan's metalwork. */
  Metal metal() {
    return metal;
  }

  /** The wire and this much of the metalwork, in the frame of the plane. */
  AntennaModel of(Rigged rigged, GroundPlane plane, Metal with) {
    List<WireSpec> wires = new ArrayList<>();
    for (Rigged.Conductor conductor : rigged.conductors()) {
      WireKind kind = catalogue.wire(conductor.wire());
      List<Vertex> points = new ArrayList<>();
      for (Place p : conductor.shapes().calm()) {
        Vertex over = plane.over(p);
        Vertex next = new Vertex(over.x(), over.y(), Math.max(LEAST_HEIGHT, over.z()));
        if (points.isEmpty() || points.get(points.size() - 1).distanceTo(next) > 1e-6) {
          points.add(next);
        }
      }
      Sheath sheath =
          kind.insulation() == null
              ? null
              : new Sheath(kind.insulation().radius(), kind.insulation().permittivity());
      wires.add(
          new WireSpec(points, kind.radius(), kind.conductivity(), kind.permeability(), sheath));
    }
    wires.addAll(with.over(plane));
    var feed = rigged.layout().feed();
    return AntennaModel.of(wires, feed.conductor(), fraction(rigged));
  }

  /** A feedpoint where return wires meet the wire's end is a gap in the wire just beside them. */
  private static double fraction(Rigged rigged) {
    double fraction = rigged.layout().feed().fraction();
    double length = rigged.conductors().get(rigged.layout().feed().conductor()).length();
    double least = LEAST_FROM_JOINT / length;
    boolean joined = rigged.conductors().size() > 1 && length > 4 * LEAST_FROM_JOINT;
    return joined ? Math.max(least, Math.min(1 - least, fraction)) : fraction;
  }

  /**
   * A sentence of the field solver, its numbered wires called by the names they have on the plan.
   */
  String named(String sentence, Rigged rigged, Metal with) {
    return WIRE.matcher(sentence)
        .replaceAll(
            match -> {
              int index = Integer.parseInt(match.group(1)) - rigged.conductors().size();
              String wire = match.start() == 0 ? "The wire" : "the wire";
              String name = index < 0 ? wire : with.names().get(index);
              return Matcher.quoteReplacement(name);
            });
  }

  /** The piece of metalwork that a sentence of the field solver is about, if it is about one. */
  Optional<String> blamed(String sentence, Rigged rigged, Metal with) {
    Optional<String> blamed = Optional.empty();
    Matcher numbered = WIRE.matcher(sentence);
    while (numbered.find()) {
      int index = Integer.parseInt(numbered.group(1)) - rigged.conductors().size();
      if (index >= 0) {
        blamed = Optional.of(with.names().get(index));
      }
    }
    return blamed;
  }

  /** The plane that stands for the ground under the wire. */
  GroundPlane plane(Rigged rigged) {
    return GroundPlane.under(
        rigged.conductors().stream().map(conductor -> conductor.shapes().calm()).toList(), surface);
  }

  /** Whether some of the wire hangs lower over that plane than it can be solved. */
  static boolean isDown(Rigged rigged, GroundPlane plane) {
    return rigged.conductors().stream()
        .flatMap(conductor -> conductor.shapes().calm().stream())
        .anyMatch(p -> plane.over(p).z() < LEAST_HEIGHT);
  }
}
