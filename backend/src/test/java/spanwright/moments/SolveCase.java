package spanwright.moments;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.complex.Complex;

/** One case of a file of cases with what is expected of it. */
record SolveCase(
    String id,
    AntennaModel model,
    Ground ground,
    double frequencyMHz,
    JsonNode asked,
    JsonNode expected) {

  /** All cases of solve-cases.json, in its order. */
  static List<SolveCase> all() {
    return all("solve-cases.json");
  }

  /** All cases of a file beside this class, in its order. */
  static List<SolveCase> all(String resource) {
    try (InputStream in = SolveCase.class.getResourceAsStream(resource)) {
      List<SolveCase> cases = new ArrayList<>();
      for (JsonNode node : new ObjectMapper().readTree(in).get("cases")) {
        JsonNode asked = node.get("case");
        cases.add(
            new SolveCase(
                node.get("id").asText(),
                model(asked),
                ground(asked.get("ground")),
                asked.get("frequencies").get(0).asDouble(),
                asked,
                node.get("expected")));
      }
      return cases;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static AntennaModel model(JsonNode asked) {
    List<WireSpec> wires = new ArrayList<>();
    for (JsonNode wire : asked.get("wires")) {
      WireSpec spec =
          WireSpec.of(
              points(wire.get("points")),
              wire.get("radius").asDouble(),
              wire.get("material").get("conductivity").asDouble());
      JsonNode sheath = wire.get("insulation");
      if (sheath != null) {
        spec =
            spec.withSheath(
                new Sheath(sheath.get("radius").asDouble(), sheath.get("permittivity").asDouble()));
      }
      wires.add(spec);
    }
    JsonNode feed = asked.get("feed");
    return AntennaModel.of(wires, feed.get("wire").asInt(), feed.get("fraction").asDouble());
  }

  static List<Vertex> points(JsonNode list) {
    List<Vertex> points = new ArrayList<>();
    for (JsonNode p : list) {
      points.add(new Vertex(p.get(0).asDouble(), p.get(1).asDouble(), p.get(2).asDouble()));
    }
    return points;
  }

  private static Ground ground(JsonNode node) {
    return switch (node.get("kind").asText()) {
      case "none" -> Ground.none();
      case "perfect" -> Ground.perfect();
      default ->
          Ground.real(node.get("permittivity").asDouble(), node.get("conductivity").asDouble());
    };
  }

  Complex impedance() {
    return pair(expected.get("impedance"));
  }

  Complex uncertainty() {
    return pair(expected.get("impedanceUncertainty"));
  }

  private static Complex pair(JsonNode node) {
    return new Complex(node.get(0).asDouble(), node.get(1).asDouble());
  }

  /** Reflection coefficient on 400 ohm. */
  static Complex reflection(Complex z) {
    return z.subtract(400).divide(z.add(400));
  }
}
