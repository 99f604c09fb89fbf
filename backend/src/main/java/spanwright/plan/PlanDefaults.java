package spanwright.plan;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.Collections;
import java.util.Iterator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Fills in what a plan file leaves out, so that the records hold a value wherever one is due. */
final class PlanDefaults {
  static final String FORMAT = "spanwright-plan/1";
  static final double ACCURACY = 0.3;
  static final double POWER = 100;
  static final double WIND = 25;

  /** Lists of things with an id, and what one of them is called. */
  static final Map<String, String> NAMED = named();

  /** What an L or T unit described in place must say. */
  static final List<String> UNIT_FIELDS =
      List.of("inductance", "capacitance", "coilQ", "capacitorQ", "peakVolts");

  private PlanDefaults() {}

  private static Map<String, String> named() {
    Map<String, String> named = new LinkedHashMap<>();
    named.put("buildings", "building");
    named.put("supports", "support");
    named.put("trees", "tree");
    named.put("bracketLines", "bracket line");
    named.put("mastZones", "mast zone");
    named.put("overheadLines", "overhead line");
    named.put("zones", "zone");
    named.put("people", "place for people");
    named.put("noise", "noise source");
    named.put("metalwork", "metalwork");
    return Collections.unmodifiableMap(named);
  }

  /** A band's name; where it is absent, its first frequency. */
  static String bandName(JsonNode band) {
    String name = band.path("name").asText("");
    JsonNode first = band.path("frequencies").path(0);
    return name.isBlank() ? Wording.number(first.asDouble()) + " MHz" : name;
  }

  /** A datum's name; where it is absent, a letter by its place in the list. */
  static String datumName(String name, int index) {
    return name == null || name.isBlank() ? String.valueOf((char) ('A' + index % 26)) : name;
  }

  /** A copy with every absent scalar filled in; a field that is null counts as absent. */
  static ObjectNode filled(ObjectNode plan) {
    ObjectNode full = plan.deepCopy();
    dropNulls(full);
    put(full, "format", FORMAT);
    put(full, "title", "Untitled plot");
    put(full, "notes", "");
    site(full);
    for (String list : NAMED.keySet()) {
      for (JsonNode thing : full.path(list)) {
        if (thing.path("name").asText("").isBlank()) {
          ((ObjectNode) thing).put("name", thing.path("id").asText());
        }
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
      JsonNode name = datums.get(i).path("name");
      ((ObjectNode) datums.get(i)).put("name", datumName(name.asText(""), i));
    }
  }

  private static void brief(ObjectNode brief) {
    for (JsonNode band : brief.path("bands")) {
      ((ObjectNode) band).put("name", bandName(band));
      put(put((ObjectNode) band, "weight", 1), "receiveOnly", false);
      rising((ObjectNode) band);
    }
    for (int i = 0; i < brief.path("targets").size(); i++) {
      ObjectNode target = (ObjectNode) brief.path("targets").get(i);
      put(put(target, "weight", 1), "name", "Target " + (i + 1));
    }
    if (brief.path("matching") instanceof ObjectNode unit) {
      balun(unit);
    }
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

  /** The records hold frequencies rising; a plan file may give them in any order. */
  private static void rising(ObjectNode band) {
    List<Double> frequencies = new ArrayList<>();
    band.path("frequencies").forEach(f -> frequencies.add(f.asDouble()));
    Collections.sort(frequencies);
    ArrayNode sorted = band.putArray("frequencies");
    frequencies.forEach(sorted::add);
  }

  /** A balun has nothing to adjust; what it leaves out is that of the catalogue's. */
  private static void balun(ObjectNode unit) {
    MatchingUnit plain = Catalogues.standard().matchingUnit("balun-only").unit();
    JsonNode fields = Json.mapper().valueToTree(plain);
    for (String field : UNIT_FIELDS) {
      if (!unit.has(field)) {
        unit.set(field, fields.path(field));
      }
    }
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
