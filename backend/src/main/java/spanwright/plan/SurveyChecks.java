package spanwright.plan;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.locationtech.jts.geom.Polygon;
import org.locationtech.jts.triangulate.quadedge.LocateFailureException;

/** Whether the surveyed things make sense, each alone and together. */
final class SurveyChecks {
  /** A ridge may stand out over its walls by this much [m]. */
  static final double RIDGE_OVERHANG = 1.5;

  /** An entry further outside the boundary than this is a slip [m]. */
  static final double ENTRY_OUTSIDE = 30;

  /** Deeper in a crown than this nothing is hoisted past its leaves [m]. */
  static final double IN_LEAVES = 1;

  /** Rounding in heights read off a tape or a screen [m]. */
  private static final double ROUNDING = 1e-9;

  private final Thing plan;
  private final List<Fault> faults = new ArrayList<>();
  private Polygon boundary;

  private SurveyChecks(JsonNode plan) {
    this.plan = new Thing("", "The plan", plan);
  }

  static List<Fault> faults(JsonNode plan) {
    SurveyChecks checks = new SurveyChecks(plan);
    checks.boundary();
    checks.ids();
    checks.site();
    checks.things("buildings", "building").forEach(checks::building);
    checks.things("supports", "support").forEach(checks::support);
    checks.things("trees", "tree").forEach(checks::crown);
    checks.things("bracketLines", "bracket line").forEach(checks::bracketLine);
    checks.things("mastZones", "mast zone").forEach(checks::mastZone);
    checks
        .things("overheadLines", "overhead line")
        .forEach(l -> OutlineChecks.path(l, "path", l.places("path"), checks.faults));
    checks.things("zones", "zone").forEach(checks::zone);
    checks.things("people", "place for people").forEach(checks::people);
    checks
        .things("metalwork", "metalwork")
        .forEach(m -> OutlineChecks.path(m, "path", m.places("path"), checks.faults));
    checks.entry();
    checks.datums();
    checks.places();
    return checks.faults;
  }

  private List<Thing> things(String field, String kind) {
    return Thing.list(plan.json(), "", field, kind);
  }

  private void say(String path, Wording wording, Object... parts) {
    faults.add(Fault.of(path, wording, parts));
  }

  private void boundary() {
    if (OutlineChecks.outline(plan, "boundary", "the boundary", faults)) {
      boundary = OutlineChecks.polygon(plan.points("boundary"));
    }
    int corners = plan.json().path("boundary").size();
    Set<Double> seen = new HashSet<>();
    for (Thing rule : Thing.list(plan.json(), "", "boundaryRules", "boundary rule")) {
      Double edge = rule.number("edge");
      if (edge == null) {
        continue;
      }
      if (corners >= 3 && edge >= corners) {
        say(rule.at("edge"), Wording.NO_SUCH_EDGE, edge, corners - 1);
      } else if (!seen.add(edge)) {
        say(rule.at("edge"), Wording.EDGE_TWICE, edge);
      }
    }
  }

  private void ids() {
    Map<String, String> owners = new HashMap<>();
    for (Map.Entry<String, String> list : PlanDefaults.NAMED.entrySet()) {
      for (Thing thing : things(list.getKey(), list.getValue())) {
        String id = thing.text("id");
        String owner = id == null ? null : owners.putIfAbsent(id, thing.label());
        if (owner != null) {
          String first = Character.toLowerCase(owner.charAt(0)) + owner.substring(1);
          say(thing.at("id"), Wording.SAME_ID, thing.label(), Wording.clean(id), first);
        }
      }
    }
  }

  private void site() {
    Thing site = new Thing("site", "The site", plan.json().path("site"));
    boolean latitude = site.number("latitude") != null;
    if (latitude != (site.number("longitude") != null)) {
      String given = latitude ? "latitude" : "longitude";
      String lacking = latitude ? "longitude" : "latitude";
      if (site.lacks(lacking)) {
        say(site.at(lacking), Wording.HALF_POSITION, given, lacking);
      }
    }
    terrain(site.child("terrain"));
  }

  private void terrain(Thing terrain) {
    List<Place> spots = terrain.places("spots");
    if (spots == null || spots.isEmpty()) {
      return;
    }
    if (spots.size() < 3) {
      say(terrain.at("spots"), Wording.FEW_SPOTS, spots.size());
      return;
    }
    Map<List<Long>, Integer> seen = new HashMap<>();
    for (int i = 0; i < spots.size(); i++) {
      List<Long> millimetres =
          List.of(Math.round(spots.get(i).x() * 1000), Math.round(spots.get(i).y() * 1000));
      Integer before = seen.putIfAbsent(millimetres, i + 1);
      if (before != null) {
        say(Paths.entry(terrain.at("spots"), i), Wording.SAME_SPOT, before, i + 1);
        return;
      }
    }
    if (inLine(spots) || !makesGround(spots)) {
      say(terrain.at("spots"), Wording.SPOTS_IN_LINE);
    }
  }

  /** Spots so near to one line that the triangulation finds no triangle among them. */
  private static boolean makesGround(List<Place> spots) {
    try {
      return !GroundSurface.of(new Terrain(spots)).isLevel();
    } catch (IllegalArgumentException | LocateFailureException e) {
      return false;
    }
  }

  private static boolean inLine(List<Place> spots) {
    Point first = spots.get(0).onPlan();
    Point far = first;
    for (Place spot : spots) {
      far = spot.onPlan().distance(first) > far.distance(first) ? spot.onPlan() : far;
    }
    double reach = far.distance(first);
    for (Place spot : spots) {
      double aside =
          (far.x() - first.x()) * (spot.y() - first.y())
              - (far.y() - first.y()) * (spot.x() - first.x());
      if (Math.abs(aside) > OutlineChecks.SPOT * reach) {
        return false;
      }
    }
    return true;
  }

  private void building(Thing building) {
    boolean sound = OutlineChecks.outline(building, "footprint", "the footprint", faults);
    Double eaves = building.number("eaves");
    Double ridge = building.number("ridge");
    if (eaves != null && ridge != null && eaves > ridge + ROUNDING) {
      say(building.at("ridge"), Wording.ROOF_SWAPPED, building.label(), eaves, ridge);
    }
    List<Point> line = building.points("ridgeLine");
    String roof = building.text("roof");
    boolean needed = "gable".equals(roof) || "lean-to".equals(roof);
    boolean absent = line == null ? building.lacks("ridgeLine") : line.isEmpty();
    boolean rises = eaves != null && ridge != null && ridge > eaves + ROUNDING;
    if (absent) {
      if (needed && rises) {
        say(building.at("ridgeLine"), Wording.NO_RIDGE_LINE, building.label(), roof);
      }
    } else if (line != null) {
      ridgeLine(building, line, sound);
    }
  }

  private void ridgeLine(Thing building, List<Point> line, boolean sound) {
    if (line.size() == 1) {
      say(building.at("ridgeLine"), Wording.HALF_RIDGE_LINE, building.label(), 1);
      return;
    }
    if (line.size() == 2 && OutlineChecks.together(line.get(0), line.get(1))) {
      say(building.at("ridgeLine"), Wording.RIDGE_POINT, building.label());
      return;
    }
    if (sound) {
      Polygon footprint = OutlineChecks.polygon(building.points("footprint"));
      for (int i = 0; i < line.size(); i++) {
        double away = OutlineChecks.outside(line.get(i), footprint);
        if (away > RIDGE_OVERHANG) {
          String at = Paths.entry(building.at("ridgeLine"), i);
          say(at, Wording.RIDGE_OUTSIDE, building.label(), i + 1, rounded(away), RIDGE_OVERHANG);
        }
      }
    }
  }

  private void reach(Thing thing) {
    Double lowest = thing.number("lowest");
    Double highest = thing.number("highest");
    if (lowest != null && highest != null && lowest > highest + ROUNDING) {
      say(thing.at("lowest"), Wording.REACH_SWAPPED, thing.label(), lowest, highest);
    }
  }

  private void support(Thing support) {
    reach(support);
    crown(support);
    if (!"tree".equals(support.text("kind"))) {
      things("supports", "support").forEach(other -> amidLeaves(support, other));
      things("trees", "tree").forEach(other -> amidLeaves(support, other));
    }
  }

  /**
   * Trees stand in one another's crowns as they please; at a mast, pole or wall all of whose reach
   * lies deep in a crown, nothing can be hoisted.
   */
  private void amidLeaves(Thing support, Thing tree) {
    Thing canopy = tree.child("canopy");
    Point at = support.point("at");
    Point trunk = tree.point("at");
    Double radius = canopy.number("radius");
    Double from = canopy.number("from");
    Double to = canopy.number("to");
    Double lowest = support.number("lowest");
    Double highest = support.number("highest");
    boolean known = at != null && trunk != null && radius != null && from != null && to != null;
    if (!known || lowest == null || highest == null || tree.path().equals(support.path())) {
      return;
    }
    boolean beside = at.distance(trunk) < radius - IN_LEAVES;
    if (beside && lowest > from + ROUNDING && highest < to - ROUNDING) {
      say(
          support.at("at"),
          Wording.AMID_LEAVES,
          support.label(),
          lowest,
          highest,
          Character.toLowerCase(tree.label().charAt(0)) + tree.label().substring(1),
          from,
          to);
    }
  }

  private void crown(Thing tree) {
    Thing canopy = tree.child("canopy");
    Double from = canopy.number("from");
    Double to = canopy.number("to");
    if (from != null && to != null && from > to + ROUNDING) {
      say(canopy.at("from"), Wording.CROWN_SWAPPED, tree.label(), from, to);
    }
  }

  private void bracketLine(Thing line) {
    List<Point> path = line.points("path");
    List<Place> level =
        path == null ? null : path.stream().map(p -> new Place(p.x(), p.y(), 0)).toList();
    OutlineChecks.path(line, "path", level, faults);
    reach(line);
  }

  private void mastZone(Thing zone) {
    boolean sound = OutlineChecks.outline(zone, "area", "the area", faults);
    if (sound && boundary != null) {
      Polygon area = OutlineChecks.polygon(zone.points("area"));
      if (!area.intersects(boundary)) {
        say(zone.at("area"), Wording.ZONE_OUTSIDE, zone.label());
      }
    }
    Double highest = zone.number("highest");
    double base = zone.number("base", 0);
    if (highest != null && base >= highest) {
      say(zone.at("base"), Wording.BASE_TOO_HIGH, zone.label(), base, highest);
    }
    consents(zone, highest);
  }

  private void consents(Thing zone, Double highest) {
    Double before = null;
    List<Thing> consents = Thing.list(zone.json(), zone.path(), "consents", "consent");
    for (int i = 0; i < consents.size(); i++) {
      Double height = consents.get(i).number("highest");
      if (height == null) {
        return;
      }
      if (before != null && height <= before) {
        String at = consents.get(i).at("highest");
        say(at, Wording.CONSENTS_NOT_RISING, zone.label(), i + 1, height, before);
        return;
      }
      before = height;
    }
    if (before != null && highest != null && before < highest - ROUNDING) {
      say(zone.at("consents"), Wording.CONSENTS_TOO_LOW, zone.label(), before, highest);
    }
  }

  private void zone(Thing zone) {
    OutlineChecks.outline(zone, "area", "the area", faults);
    boolean lacks = zone.lacks("height");
    if ("headroom".equals(zone.text("rule")) && lacks) {
      say(zone.at("height"), Wording.NO_HEADROOM, zone.label());
    }
  }

  private void people(Thing people) {
    OutlineChecks.outline(people, "area", "the area", faults);
    Double to = people.number("to");
    double from = people.number("from", 0);
    if (to != null && from >= to) {
      say(people.at("from"), Wording.PEOPLE_SWAPPED, people.label(), from, to);
    }
  }

  private void entry() {
    Point at = plan.child("entry").point("at");
    if (at != null && boundary != null) {
      double away = OutlineChecks.outside(at, boundary);
      if (away > ENTRY_OUTSIDE) {
        say("entry.at", Wording.ENTRY_OUTSIDE, rounded(away), ENTRY_OUTSIDE);
      }
    }
  }

  private void datums() {
    List<Thing> datums = things("datums", "datum");
    Set<String> names = new HashSet<>();
    for (int i = 0; i < datums.size(); i++) {
      String name = PlanDefaults.datumName(datums.get(i).text("name"), i);
      if (!names.add(name)) {
        say(datums.get(i).at("name"), Wording.SAME_DATUM, Wording.quoted(name));
      }
      Point at = datums.get(i).point("at");
      for (int j = 0; j < i && at != null; j++) {
        Point other = datums.get(j).point("at");
        if (other != null && at.distance(other) < 0.05) {
          String first = PlanDefaults.datumName(datums.get(j).text("name"), j);
          say(
              datums.get(i).at("at"),
              Wording.DATUMS_TOGETHER,
              Wording.quoted(name),
              Wording.quoted(first));
          break;
        }
      }
    }
  }

  /** Supports one each, bracket lines two, and as many of the new masts as there are zones for. */
  private void places() {
    long places = things("supports", "support").stream().filter(SurveyChecks::isUsed).count();
    places +=
        2 * things("bracketLines", "bracket line").stream().filter(SurveyChecks::isUsed).count();
    if (things("mastZones", "mast zone").stream().anyMatch(SurveyChecks::isUsed)) {
      places += Math.round(plan.child("brief").number("newMasts", 0));
    }
    if (places < 2) {
      say("supports", Wording.FEW_PLACES, places == 0 ? "no place" : "only 1 place");
    }
  }

  private static boolean isUsed(Thing thing) {
    return thing.number("pullLimit", 1) > 0;
  }

  private static double rounded(double metres) {
    return Math.round(metres * 10) / 10.0;
  }
}
