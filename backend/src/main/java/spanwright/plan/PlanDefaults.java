package spanwright.plan;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.Iterator;
import java.util.List;

/** Fills in what a plan file leaves out, so that the records hold a value wherever one is due. */
final class PlanDefaults {
  static final String FORMAT = "spanwright-plan/1";
  static final double ACCURACY = 0.3;
  static final double POWER = 100;
  static final double WIND = 25;
  private static final List<String> NAMED =
      List.of(
          "buildings",
          "supports",
          "trees",
          "bracketLines",
          "mastZones",
          "overheadLines",
          "zones",
          "people",
          "noise",
          "metalwork");

  private PlanDefaults() {}

  /** A copy with every absent scalar filled in; a field that is null counts as absent. */
  static ObjectNode filled(ObjectNode plan) {
    ObjectNode full = plan.deepCopy();
    dropNulls(full);
    put(full, "format", FORMAT);
    put(full, "title", "Untitled plot");
    put(full, "notes", "");
    site(full);
    for (String list : NAMED) {
      for (JsonNode thing : full.path(list)) {
        put((ObjectNode) thing, "name", thing.path("id").asText());
      }
    }
    full.path("buildings").forEach(building -> building((ObjectNode) building));
    full.path("supports").forEach(support -> support((ObjectNode) support));
    full.path("mastZones").forEach(zone -> put(put((ObjectNode) zone, "base", 0), "guyRadius", 0));
    full.path("overheadLines").forEach(line -> put((ObjectNode) line, "kind", "unknown"));
    full.path("people").forEach(volume -> put((ObjectNode) volume, "from", 0));
    full.path("boundaryRules").forEach(rule -> put((ObjectNode) rule, "overhang", "none"));
    datums(full.path("datums"));
    if (full.path("brief") instanceof ObjectNode brief) {
      brief(brief);
    }
    return full;
  }

  private static void site(ObjectNode full) {
    ObjectNode site = full.withObject("/site");
    put(put(site, "planNorth", 0), "magneticVariation", 0);
    SoilKind soil = Catalogues.standard().soil(null);
    ObjectNode ground = site.withObject("/ground");
    put(put(ground, "permittivity", soil.permittivity()), "conductivity", soil.conductivity());
    if (site.path("terrain").path("spots").isEmpty()) {
      site.remove("terrain");
    }
  }

  private static void building(ObjectNode building) {
    put(building, "metalRoof", false);
    put(building, "ridge", building.path("eaves").asDouble());
    put(building, "roof", "flat");
  }

  private static void support(ObjectNode support) {
    put(support, "kind", "other");
    put(put(support, "accuracy", ACCURACY), "sway", 0);
    put(support, "ropeOnly", false);
  }

  private static void datums(JsonNode datums) {
    for (int i = 0; i < datums.size(); i++) {
      put((ObjectNode) datums.get(i), "name", String.valueOf((char) ('A' + i % 26)));
    }
  }

  private static void brief(ObjectNode brief) {
    brief
        .path("bands")
        .forEach(band -> put(put((ObjectNode) band, "weight", 1), "receiveOnly", false));
    brief.path("targets").forEach(target -> put((ObjectNode) target, "weight", 1));
    put(put(brief, "power", POWER), "duty", 1);
    put(brief, "lineLengths", "free");
    put(brief, "newMasts", 0);
    if (brief.path("shapes").isEmpty()) {
      ArrayNode shapes = brief.putArray("shapes");
      for (Shape shape : Shape.values()) {
        shapes.add(Json.mapper().<JsonNode>valueToTree(shape));
      }
    }
    ObjectNode rules = brief.withObject("/rules");
    put(put(rules, "wind", WIND), "ice", 0);
  }

  private static void dropNulls(JsonNode node) {
    if (node instanceof ObjectNode object) {
      for (Iterator<JsonNode> fields = object.iterator(); fields.hasNext(); ) {
        if (fields.next().isNull()) {
          fields.remove();
        }
      }
    }
    node.forEach(PlanDefaults::dropNulls);
  }

  private static ObjectNode put(ObjectNode node, String field, double value) {
    return node.has(field) ? node : node.put(field, value);
  }

  private static ObjectNode put(ObjectNode node, String field, int value) {
    return node.has(field) ? node : node.put(field, value);
  }

  private static ObjectNode put(ObjectNode node, String field, boolean value) {
    return node.has(field) ? node : node.put(field, value);
  }

  private static ObjectNode put(ObjectNode node, String field, String value) {
    return node.has(field) ? node : node.put(field, value);
  }
}
