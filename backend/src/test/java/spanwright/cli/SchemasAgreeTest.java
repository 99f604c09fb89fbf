package spanwright.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.function.Function;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import spanwright.plan.Catalogues;
import spanwright.plan.Fault;

/**
 * The schemas in shared/ are for programs outside, the readers here for people: both must accept
 * and refuse the same. Sound cases are broken at random, one place at a time.
 */
class SchemasAgreeTest {
  private static final ObjectMapper JSON = new ObjectMapper();
  private static final int TRIALS = 1500;

  private static final Map<String, String> SOUND =
      Map.of(
          "feed",
          """
          { "load": [35, -410], "frequency": 7.1, "length": 12.4, "power": 100,
            "line": { "impedance": 400, "velocityFactor": 0.91, "lossDbPer100m": 0.3 },
            "matching": { "network": "L", "inductance": [1e-7, 3e-5], "capacitance": [1e-11, 5e-10],
                          "coilQ": 150, "capacitorQ": 1000, "peakVolts": 3000 } }
          """,
          "hang",
          """
          { "from": [0,0,8], "to": [20,0,7], "pull": 80, "held": "weight", "wind": 25, "drag": 1.2,
            "air": 1.25, "wire": { "weight": 0.0286, "diameter": 0.0016, "stiffness": 240000 },
            "load": { "fraction": 0.5, "weight": 0.35 } }
          """,
          "solve",
          """
          { "wires": [ { "points": [[0,0,8],[10,0,8]], "radius": 0.001, "material": "copper",
                         "insulation": { "radius": 0.002, "permittivity": 2.3 } },
                       { "points": [[0,5,8],[10,5,8]], "radius": 0.001,
                         "material": { "conductivity": 1e7 } } ],
            "ground": { "kind": "real", "permittivity": 13, "conductivity": 0.005 },
            "feed": { "wire": 0, "fraction": 0.5 }, "frequencies": [14.1, 7.1],
            "directions": [ { "azimuth": 0, "elevation": 30 } ], "fieldPoints": [[0,0,2]],
            "power": 100 }
          """);

  private static List<Fault> read(String kind, JsonNode tree) {
    Function<JsonNode, List<Fault>> reader =
        switch (kind) {
          case "feed" -> node -> FeedCases.read(node, Catalogues.standard()).faults();
          case "hang" -> node -> HangCases.read(node).faults();
          default -> node -> SolveCases.read(node).faults();
        };
    return reader.apply(tree);
  }

  private static Schema schema(String kind) throws IOException {
    String place = "/spanwright/shared/schema/" + kind + "-case.schema.json";
    try (InputStream in = SchemasAgreeTest.class.getResourceAsStream(place)) {
      return SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
          .getSchema(new String(in.readAllBytes(), StandardCharsets.UTF_8), InputFormat.JSON);
    }
  }

  private static boolean accepts(Schema schema, JsonNode tree) {
    return schema.validate(tree.toString(), InputFormat.JSON).isEmpty();
  }

  /** Every object and list in the tree. */
  private static void containers(JsonNode node, List<JsonNode> all) {
    if (node.isContainerNode()) {
      all.add(node);
      node.forEach(child -> containers(child, all));
    }
  }

  private static JsonNode stranger(Random random) {
    String[] strangers = {
      "-1",
      "0",
      "1",
      "2.5",
      "1e-7",
      "1e5",
      "1e8",
      "1e300",
      "-1e300",
      "\"x\"",
      "true",
      "[]",
      "{}",
      "[1,2,3]",
      "\"L\"",
      "\"balun\"",
      "\"none\"",
      "\"perfect\"",
      "\"tied\"",
      "90",
      "361"
    };
    try {
      return JSON.readTree(strangers[random.nextInt(strangers.length)]);
    } catch (IOException e) {
      throw new AssertionError(e);
    }
  }

  private static void breakOnePlace(JsonNode root, Random random) {
    List<JsonNode> all = new ArrayList<>();
    containers(root, all);
    JsonNode place = all.get(random.nextInt(all.size()));
    if (place instanceof ObjectNode object) {
      List<String> names = new ArrayList<>();
      object.fieldNames().forEachRemaining(names::add);
      String name = names.isEmpty() ? "x" : names.get(random.nextInt(names.size()));
      switch (random.nextInt(4)) {
        case 0 -> object.remove(name);
        case 1 -> object.set(name + "x", stranger(random));
        default -> object.set(name, stranger(random));
      }
    } else if (place instanceof ArrayNode list) {
      switch (random.nextInt(3)) {
        case 0 -> list.add(stranger(random));
        case 1 -> list.removeAll();
        default -> list.set(random.nextInt(Math.max(1, list.size())), stranger(random));
      }
    }
  }

  /** What a schema cannot say: comparisons within a case, and what the catalogue holds. */
  private static boolean isBeyondSchemas(Fault fault) {
    return fault.message().contains("swap them")
        || fault.message().contains("catalogue")
        || fault.message().contains("takes power")
        || fault.message().contains("more than the wire's")
        || fault.path().equals("feed.wire");
  }

  @ParameterizedTest
  @ValueSource(strings = {"feed", "hang", "solve"})
  void schema_and_reader_accept_and_refuse_the_same(String kind) throws IOException {
    Schema schema = schema(kind);
    JsonNode sound = JSON.readTree(SOUND.get(kind));
    assertTrue(
        accepts(schema, sound), schema.validate(sound.toString(), InputFormat.JSON)::toString);
    assertEquals(List.of(), read(kind, sound));
    Random random = new Random(7);
    int refused = 0;
    for (int i = 0; i < TRIALS; i++) {
      JsonNode tree = sound.deepCopy();
      breakOnePlace(tree, random);
      List<Fault> faults = read(kind, tree);
      if (!faults.isEmpty() && faults.stream().allMatch(SchemasAgreeTest::isBeyondSchemas)) {
        continue;
      }
      boolean accepted = accepts(schema, tree);
      assertEquals(
          accepted,
          faults.isEmpty(),
          () ->
              tree
                  + "\nschema: "
                  + schema.validate(tree.toString(), InputFormat.JSON)
                  + "\nreader: "
                  + faults);
      refused += accepted ? 0 : 1;
    }
    assertTrue(refused > TRIALS / 3, "refused " + refused);
  }
}
