package spanwright.plan;

import java.util.List;
import java.util.stream.Stream;
import spanwright.published.Check;
import spanwright.published.PublishedChecks;

/** The wires of the catalogue against the wire tables of ASTM. */
public class AstmWireTablesTest extends PublishedChecks {
  private static final double NEWTONS_PER_POUND = 4.4482216;

  @Override
  public String heading() {
    return "Catalogue: wires";
  }

  @Override
  public String about() {
    return "Diameters by the gauge formula, mass by density, minimum breaking loads by the tables"
        + " of hard-drawn copper and copper-clad steel. The catalogue rounds to three or"
        + " four figures.";
  }

  @Override
  public List<Check> checks() {
    return Stream.of(
            diameter("copper-1.0", 18, 1.024),
            diameter("copper-1.6", 14, 1.628),
            diameter("copper-2.05", 12, 2.053),
            diameter("copper-2.6", 10, 2.588),
            mass("copper-1.0", 7.32),
            mass("copper-1.6", 18.5),
            mass("copper-2.05", 29.4),
            load("copper-1.6", 213.5, "ASTM B1, table 1, 14 AWG (from memory)"),
            load("copper-2.05", 337, "ASTM B1, table 1, 12 AWG (from memory)"),
            load("copper-2.6", 529, "ASTM B1, table 1, 10 AWG (from memory)"),
            load("copper-clad-40-1.6", 402, "ASTM B227-04, table 1, 0.0640 in, 125 ksi"),
            load("copper-clad-40-2.05", 590, "ASTM B227-04, table 1, 0.0808 in, 115 ksi"),
            load("copper-clad-30-1.6", 418, "ASTM B227-04, table 1, 0.0640 in, 130 ksi"),
            load("aluminium-1.6", 215, "fence wire, 14 gauge, read in a list discussion"),
            load("aluminium-clad-2.05", 1100, "12 AWG solid, read in a list discussion"),
            load("stainless-strand-1.6", 480, "steel-cable guide, 1/16 in, 7 × 7 of 304"),
            conductivity())
        .toList();
  }

  private static WireKind wire(String id) {
    return Catalogues.standard().wire(id);
  }

  private static Check diameter(String id, int gauge, double millimetres) {
    return Check.within(
        "diameter of " + id + ", " + gauge + " AWG",
        millimetres,
        2000 * wire(id).radius(),
        0.002,
        3,
        "mm",
        "ASTM B258: 0.127·92^((36 − n)/39) mm");
  }

  private static Check mass(String id, double kilogramsPerKilometre) {
    return Check.within(
        "mass of " + id,
        kilogramsPerKilometre,
        1000 * wire(id).weight(),
        0.005 * kilogramsPerKilometre,
        2,
        "kg/km",
        "ASTM B1: density 8.89 g/cm³ (from memory) times area");
  }

  private static Check load(String id, double pounds, String source) {
    return Check.within(
        "breaking load of " + id,
        pounds,
        wire(id).breaking() / NEWTONS_PER_POUND,
        0.01 * pounds,
        1,
        "lbf",
        source);
  }

  private static Check conductivity() {
    return Check.within(
        "conductivity of hard-drawn copper over annealed",
        96.2,
        100 * wire("copper-2.05").conductivity() / 5.8e7,
        0.1,
        1,
        "%",
        "ASTM B1-01, section 5: 910.15 ohm·lb/mile²");
  }
}
