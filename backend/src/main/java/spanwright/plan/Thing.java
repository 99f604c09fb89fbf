package spanwright.plan;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;

/**
 * A part of a document under check. Its readers answer null where a field is absent or was already
 * found to be of the wrong type, so that one fault does not hide the next.
 *
 * @param path in the document
 * @param label what sentences call it
 * @param json the part
 */
record Thing(String path, String label, JsonNode json) {

  static List<Thing> list(JsonNode parent, String path, String field, String kind) {
    List<Thing> things = new ArrayList<>();
    JsonNode entries = parent.path(field);
    if (entries.isArray()) {
      for (int i = 0; i < entries.size(); i++) {
        if (entries.get(i).isObject()) {
          String at = Paths.entry(Paths.field(path, field), i);
          things.add(new Thing(at, SchemaWalk.label(kind, entries.get(i), i), entries.get(i)));
        }
      }
    }
    return things;
  }

  Thing child(String field) {
    return new Thing(at(field), label, json.path(field));
  }

  String at(String field) {
    return Paths.field(path, field);
  }

  /** Whether a field is absent; null counts as absent. */
  boolean lacks(String field) {
    return json.path(field).isMissingNode() || json.path(field).isNull();
  }

  Double number(String field) {
    JsonNode value = json.path(field);
    return value.isNumber() && Double.isFinite(value.asDouble()) ? value.asDouble() : null;
  }

  double number(String field, double absent) {
    Double value = number(field);
    return value == null ? absent : value;
  }

  String text(String field) {
    JsonNode value = json.path(field);
    return value.isTextual() ? value.asText() : null;
  }

  /** Points of the plan; null when the list is absent, or an entry is no point. */
  List<Point> points(String field) {
    List<Place> places = numbers(field, 2);
    return places == null ? null : places.stream().map(Place::onPlan).toList();
  }

  /** Places in space; null when the list is absent, or an entry is no place. */
  List<Place> places(String field) {
    return numbers(field, 3);
  }

  Point point(String field) {
    Place place = place(json.path(field), 2);
    return place == null ? null : place.onPlan();
  }

  private List<Place> numbers(String field, int count) {
    JsonNode list = json.path(field);
    if (!list.isArray() || list.size() > (field.equals("spots") ? 5000 : 1000)) {
      return null;
    }
    List<Place> places = new ArrayList<>();
    for (JsonNode entry : list) {
      Place place = place(entry, count);
      if (place == null) {
        return null;
      }
      places.add(place);
    }
    return places;
  }

  private static Place place(JsonNode entry, int count) {
    if (!entry.isArray() || entry.size() != count) {
      return null;
    }
    double[] xyz = new double[3];
    for (int i = 0; i < count; i++) {
      if (!entry.get(i).isNumber() || Math.abs(entry.get(i).asDouble()) > 1e5) {
        return null;
      }
      xyz[i] = entry.get(i).asDouble();
    }
    return new Place(xyz[0], xyz[1], xyz[2]);
  }
}
