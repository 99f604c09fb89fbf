package spanwright.cli;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import spanwright.moments.AntennaModel;
import spanwright.moments.Gain;
import spanwright.moments.Ground;
import spanwright.moments.NearField;
import spanwright.moments.Peak;
import spanwright.moments.Sheath;
import spanwright.moments.Solution;
import spanwright.moments.Vertex;
import spanwright.moments.WireSpec;
import spanwright.plan.Fault;
import spanwright.plan.Place;
import spanwright.web.Form;

/** Reads the case of {@code solve} and writes its answer. Angles in the file are degrees. */
final class SolveCases {
  private static final int MOST_WIRES = 200;
  private static final int MOST_POINTS = 500;
  private static final int MOST_FREQUENCIES = 200;
  private static final int MOST_DIRECTIONS = 20_000;
  private static final double SMALLEST = 1e-6;
  private static final double USUAL_POWER = 100;

  /** Round figures at 20 °C: the usual ones of handbooks, common practice, no source. */
  private static final Map<String, Double> MATERIALS =
      Map.of(
          "perfect",
          Double.POSITIVE_INFINITY,
          "copper",
          WireSpec.COPPER,
          "aluminium",
          3.5e7,
          "steel",
          5e6);

  private SolveCases() {}

  /**
   * What the file says.
   *
   * @param model wires and feed
   * @param ground below them
   * @param frequenciesMHz to solve at
   * @param directions for gains
   * @param fieldPoints for near fields
   * @param power watts, for the near fields
   * @param faults when there are any, the rest is not to be used
   */
  record Read(
      AntennaModel model,
      Ground ground,
      List<Double> frequenciesMHz,
      List<Direction> directions,
      List<Vertex> fieldPoints,
      double power,
      List<Fault> faults) {}

  /** Radians. */
  record Direction(double azimuth, double elevation) {}

  static Read read(JsonNode tree) {
    List<Fault> faults = new ArrayList<>();
    Form form = Form.of(tree, faults);
    List<WireSpec> wires = form.forms("wires", 1, MOST_WIRES, SolveCases::wire);
    Ground ground = ground(form.form("ground"));
    Form feed = form.form("feed");
    int feedWire = feed.index("wire", Math.max(0, wires.size() - 1));
    double fraction = feed.number("fraction", 0, 1, "");
    feed.finish();
    double[] frequencies = form.numbers("frequencies", 1, MOST_FREQUENCIES, 0.1, 60, "MHz");
    List<Direction> directions =
        form.forms("directions", 0, MOST_DIRECTIONS, SolveCases::direction);
    List<Vertex> points =
        form.places("fieldPoints", 0, MOST_DIRECTIONS).stream().map(SolveCases::vertex).toList();
    double power = form.number("power", 0, 1e5, "W", USUAL_POWER);
    form.finish();
    return new Read(
        AntennaModel.of(wires, feedWire, fraction),
        ground,
        Arrays.stream(frequencies).boxed().toList(),
        directions,
        points,
        power,
        faults);
  }

  private static WireSpec wire(Form form) {
    List<Vertex> points =
        form.places("points", 2, MOST_POINTS).stream().map(SolveCases::vertex).toList();
    double radius = form.number("radius", SMALLEST, 0.5, "m");
    double conductivity = material(form);
    Sheath sheath = form.has("insulation") ? sheath(form.form("insulation"), radius) : null;
    form.finish();
    return new WireSpec(points, radius, conductivity, 1, sheath);
  }

  private static double material(Form form) {
    if (!form.has("material") || form.isText("material")) {
      Double known = form.word("material", MATERIALS, WireSpec.COPPER);
      return known == null ? WireSpec.COPPER : known;
    }
    Form given = form.form("material");
    double conductivity = given.number("conductivity", SMALLEST, 1e9, "S/m");
    given.finish();
    return conductivity;
  }

  private static Sheath sheath(Form form, double wireRadius) {
    double radius = form.number("radius", SMALLEST, 0.5, "m");
    if (radius < wireRadius) {
      form.note("radius", "this is the outer radius and must be more than the wire's.");
    }
    double permittivity = form.number("permittivity", 1, 100, "");
    form.finish();
    return new Sheath(radius, permittivity);
  }

  private static Ground ground(Form form) {
    Ground.Kind kind =
        form.word(
            "kind",
            Map.of(
                "none", Ground.Kind.NONE,
                "perfect", Ground.Kind.PERFECT,
                "real", Ground.Kind.REAL),
            null);
    boolean real = kind == Ground.Kind.REAL;
    double permittivity = soil(form, "permittivity", 1, 1e4, "", real);
    double conductivity = soil(form, "conductivity", 0, 1e9, "S/m", real);
    form.finish();
    return real
        ? Ground.real(permittivity, conductivity)
        : kind == Ground.Kind.PERFECT ? Ground.perfect() : Ground.none();
  }

  private static double soil(
      Form form, String name, double least, double most, String unit, boolean needed) {
    return needed
        ? form.number(name, least, most, unit)
        : form.number(name, least, most, unit, least);
  }

  private static Direction direction(Form form) {
    double azimuth = form.number("azimuth", -360, 360, "degrees");
    double elevation = form.number("elevation", -90, 90, "degrees");
    form.finish();
    return new Direction(Math.toRadians(azimuth), Math.toRadians(elevation));
  }

  private static Vertex vertex(Place place) {
    return new Vertex(place.x(), place.y(), place.z());
  }

  /** One row of the answer. */
  static ObjectNode row(Read read, Solution solution) {
    ObjectNode row = JsonNodeFactory.instance.objectNode();
    row.put("frequency", solution.frequencyMHz());
    row.putArray("impedance")
        .add(solution.impedance().getReal())
        .add(solution.impedance().getImaginary());
    row.put("unknowns", solution.unknowns());
    if (solution.powerBalance().isPresent()) {
      row.put("powerBalance", solution.powerBalance().getAsDouble());
    } else {
      row.putNull("powerBalance");
    }
    row.put("efficiency", solution.efficiency());
    row.put("wireLoss", solution.wireLossShare());
    row.put("groundLoss", solution.groundLossShare());
    row.put("residual", solution.residual());
    solution.refinementChange().ifPresent(change -> row.put("refinementChange", change));
    ArrayNode gains = row.putArray("gains");
    for (Direction direction : read.directions()) {
      Gain gain = solution.gain(direction.azimuth(), direction.elevation());
      gains
          .addObject()
          .put("totalDbi", gain.totalDbi())
          .put("horizontalDbi", gain.horizontalDbi())
          .put("verticalDbi", gain.verticalDbi());
    }
    Peak peak = solution.peak();
    row.putObject("peak")
        .put("dbi", peak.dbi())
        .put("azimuth", Math.toDegrees(peak.azimuth()))
        .put("elevation", Math.toDegrees(peak.elevation()));
    ArrayNode fields = row.putArray("fields");
    if (!read.fieldPoints().isEmpty()) {
      for (NearField field : solution.fields(read.fieldPoints(), read.power())) {
        fields.addObject().put("electric", field.electric()).put("magnetic", field.magnetic());
      }
    }
    row.put("trusted", solution.trusted());
    ArrayNode warnings = row.putArray("warnings");
    solution.warnings().forEach(warnings::add);
    return row;
  }
}
