package spanwright.plan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.nio.charset.StandardCharsets;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

/**
 * A battery of broken plans. Each case changes one sound plan and pins the whole sentence; the last
 * test holds that every sentence of {@link Wording} has its case.
 */
class FaultsTest {
  private static final String SOUND =
      """
      {
        "format": "spanwright-plan/1",
        "site": {"latitude": 50, "longitude": 5,
                 "terrain": {"spots": [[0,0,0],[20,0,1],[0,30,2]]}},
        "boundary": [[0,0],[20,0],[20,30],[0,30]],
        "boundaryRules": [{"edge": 1, "overhang": "ropes"}],
        "buildings": [{"id": "house", "name": "House", "footprint": [[2,2],[12,2],[12,9],[2,9]],
                       "eaves": 5, "ridge": 8, "roof": "gable", "ridgeLine": [[2,5.5],[12,5.5]]}],
        "supports": [{"id": "oak", "name": "Oak", "kind": "tree", "at": [3,25], "lowest": 4,
                      "highest": 9, "canopy": {"radius": 2, "from": 3, "to": 11}},
                     {"id": "pole", "at": [18,27], "lowest": 2, "highest": 6}],
        "trees": [{"id": "birch", "name": "Birch", "at": [25,4],
                   "canopy": {"radius": 3, "from": 3, "to": 11}}],
        "bracketLines": [{"id": "rear", "name": "Rear eaves", "path": [[2,9],[12,9]], "lowest": 4,
                          "highest": 4.8}],
        "mastZones": [{"id": "bed", "name": "Bed", "area": [[3,12],[9,12],[9,16],[3,16]],
                       "highest": 9, "consents": [{"highest": 3, "needs": "none"},
                                                  {"highest": 9, "needs": "permission"}]}],
        "overheadLines": [{"id": "drop", "name": "Service drop", "kind": "low-voltage",
                           "path": [[30,0,6],[30,30,6]]}],
        "zones": [{"id": "drive", "name": "Drive", "area": [[14,2],[18,2],[18,8],[14,8]],
                   "rule": "headroom", "height": 5}],
        "people": [{"id": "patio", "name": "Patio", "area": [[3,10],[9,10],[9,12],[3,12]],
                    "from": 0, "to": 2}],
        "metalwork": [{"id": "gutter", "name": "Gutter", "path": [[2,9,5],[12,9,5]],
                       "radius": 0.03}],
        "entry": {"at": [8,9], "height": 1.5},
        "datums": [{"name": "A", "at": [2,9]}, {"name": "B", "at": [12,9]}],
        "brief": {
          "bands": [{"name": "20 m", "frequencies": [14.0, 14.175]},
                    {"name": "40 m", "frequencies": [7.1]}],
          "targets": [{"name": "Far", "bearing": 285, "distanceKm": 5600},
                      {"name": "Near", "nearVerticalKm": 300, "bands": ["40 m"]}],
          "rules": {"overrides": {"headroom": 2.6}},
          "matching": {"network": "L", "inductance": [0, 3e-5], "capacitance": [1e-11, 5e-10],
                       "coilQ": 150, "capacitorQ": 1000, "peakVolts": 3000}
        }
      }
      """;

  private static final LocalDate TODAY = LocalDate.of(2026, 6, 1);

  /** One broken plan: what is set where, and the one sentence it must give. */
  private record Case(String path, String value, String at, String message) {}

  private static Case set(String path, String value, String message) {
    return new Case(path, value, path, message);
  }

  private static Case setAt(String path, String value, String at, String message) {
    return new Case(path, value, at, message);
  }

  private static List<Case> fields() {
    return List.of(
        set(
            "titel",
            "\"x\"",
            "The plan: \"titel\" is not a field of the plan format here. Did you mean \"title\"?"),
        set(
            "supports[0].colour",
            "\"red\"",
            "Support \"Oak\": \"colour\" is not a field of the plan format here. Take it out."),
        set(
            "supports[0].highest",
            null,
            "Support \"Oak\": \"highest\" is missing. Add the highest height: a number in m (metres"
                + " above the local ground at that spot)."),
        set(
            "entry",
            null,
            "The plan: \"entry\" is missing. Add the entry: an object in braces (where the feed"
                + " line enters the station)."),
        set(
            "boundary",
            null,
            "The plan: \"boundary\" is missing. Add the boundary: a list in square brackets"
                + " (corners in order; the last is not the first again)."),
        set(
            "supports[0].highest",
            "true",
            "Support \"Oak\": the highest height must be a number in m; found true."),
        set("supports[1]", "7", "Support 2: it must be an object in braces; found the number 7."),
        set(
            "supports",
            "{}",
            "The plan: the supports must be a list in square brackets; found an object."),
        set(
            "brief.lineLengths",
            "12",
            "The brief: the line lengths must be the word free or a list in square brackets; found"
                + " the number 12."),
        set(
            "brief.lineLengths",
            "\"any\"",
            "The brief: the line lengths must be the word free; found the text \"any\"."),
        set(
            "supports[0].highest",
            "\"9 m\"",
            "Support \"Oak\": the highest height must be a number in m; found the text \"9 m\"."
                + " Write the number alone, without quotes and unit."),
        set(
            "brief.newMasts",
            "1.5",
            "The brief: the number of new masts must be a whole number; found 1.5."),
        set(
            "brief.power",
            "1e999",
            "The brief: the power holds a number too large to be used. Give a smaller one."),
        setAt(
            "supports[0].at[0]",
            "1e999",
            "supports[0].at",
            "Support \"Oak\": its place holds a number too large to be used. Give a smaller one."),
        set(
            "site.latitude",
            "95",
            "The site: the latitude must be between -90 and 90 degrees; found 95 degrees."),
        set(
            "site.longitude",
            "-181",
            "The site: the longitude must be between -180 and 180 degrees; found -181 degrees."),
        set(
            "site.planNorth",
            "361",
            "The site: plan north must be between -360 and 360 degrees; found 361 degrees."),
        setAt(
            "site.ground",
            "{\"permittivity\": 0.5}",
            "site.ground.permittivity",
            "The site: the soil's permittivity must be between 1 and 100; found 0.5."),
        setAt(
            "site.ground",
            "{\"conductivity\": -1}",
            "site.ground.conductivity",
            "The site: the soil's conductivity must be between 0 and 10 S/m; found -1 S/m."),
        set(
            "brief.bands[0].weight",
            "-1",
            "Band \"20 m\": the weight must be between 0 and 1000; found -1."),
        set(
            "brief.power",
            "10001",
            "The brief: the power must be between 0 and 10000 W; found 10001 W."),
        set("brief.duty", "1.5", "The brief: the duty must be between 0 and 1; found 1.5."),
        set(
            "brief.rules.wind",
            "71",
            "The brief: the wind must be between 0 and 70 m/s; found 71 m/s."),
        set(
            "brief.rules.ice",
            "51",
            "The brief: the ice must be between 0 and 50 mm; found 51 mm."),
        set(
            "metalwork[0].radius",
            "0",
            "Metalwork \"Gutter\": the radius must be above 0 and at most 0.5 m; found 0 m."),
        set(
            "brief.targets[0].bearing",
            "-75",
            "Target \"Far\": the bearing must be between 0 and 360 degrees; found -75 degrees."),
        setAt(
            "brief.lineLengths",
            "[10, 900]",
            "brief.lineLengths[1]",
            "The brief: a line length must be between 0.5 and 500 m; found 900 m."),
        set(
            "brief.matching.capacitance",
            "[10, 500]",
            "The brief: the capacitance in farads must be between 0 and 1; found 10."),
        set(
            "brief.matching.inductance",
            "[-1, 1]",
            "The brief: the inductance in henries must be between 0 and 1; found -1."),
        set(
            "buildings[0].roof",
            "\"mansard\"",
            "Building \"House\": the roof must be one of flat, gable, hip or lean-to; found the"
                + " text \"mansard\"."),
        set(
            "format",
            "\"spanwright-plan/2\"",
            "The plan: the format must be \"spanwright-plan/1\", but is \"spanwright-plan/2\". This"
                + " program reads no other."),
        set(
            "boundary[1]",
            "[20, 0, 0]",
            "The plan: point 2 of the boundary must be [x, y], two numbers in metres; found a list"
                + " of 3 numbers."),
        set(
            "boundary[1]",
            "[20, \"0\"]",
            "The plan: point 2 of the boundary must be [x, y], two numbers in metres; found a list"
                + " of 2 with the text \"0\" in it."),
        set(
            "overheadLines[0].path[0]",
            "[1]",
            "Overhead line \"Service drop\": point 1 of the path must be [x, y, z], three numbers"
                + " in metres; found a list of 1 number."),
        set(
            "brief.matching.inductance",
            "3e-5",
            "The brief: the inductance in henries must be [least, most], two numbers; found the"
                + " number 3e-5."),
        set(
            "boundary[1]",
            "[20000000, 0]",
            "The plan: point 2 of the boundary has the coordinate 20000000 m; coordinates lie"
                + " within 100 km (100000 m) of the plan's origin. Is it in the right unit?"),
        set(
            "brief.bands[0].frequencies",
            twentyOne(),
            "Band \"20 m\": the frequencies: 21 entries are too many, at most 20 are allowed. Leave"
                + " out those that change nothing."),
        set(
            "brief.bands[1].frequencies",
            "[]",
            "Band \"40 m\": the frequencies: at least 1 needed, found 0."),
        set("brief.lineLengths", "[]", "The brief: the line lengths: at least 1 needed, found 0."),
        set(
            "title",
            "\"" + "x".repeat(201) + "\"",
            "The plan: the title has 201 characters; at most 200 are allowed. Shorten it."),
        set(
            "notes",
            "\"" + "x".repeat(1_000_001) + "\"",
            "The plan: the notes has 1000001 characters; at most 1000000 are allowed. Shorten it."),
        set("supports[0].id", "\" \"", "Support \"Oak\": the id is empty. Write something."),
        set(
            "title",
            "\"a\\u0007b\"",
            "The plan: the title holds a control character (U+0007) as character 2. Take it out."),
        set(
            "title",
            "\"a\\nb\"",
            "The plan: the title holds a control character (U+000A) as character 2. Take it out."),
        set(
            "notes",
            "\"a\\nb\\tc\"",
            "The plan: the notes holds a control character (U+0009) as character 4. Take it out."));
  }

  private static String twentyOne() {
    return java.util.stream.IntStream.range(0, 21)
        .mapToObj(i -> 14 + i / 100.0)
        .toList()
        .toString();
  }

  private static List<Case> survey() {
    return List.of(
        set(
            "trees[0].id",
            "\"oak\"",
            "Tree \"Birch\": the id \"oak\" is already that of support \"Oak\". Give each thing its"
                + " own."),
        set(
            "datums[1].name",
            "\"A\"",
            "Datum \"A\": another datum before it has the same name. Give each its own."),
        set(
            "datums[1].at",
            "[2, 9.01]",
            "Datum \"B\": it is on the same spot as datum \"A\". Tapes need two spots; move one."),
        set(
            "boundary",
            "[[0,0],[20,0]]",
            "The plan: the boundary needs at least three corners, but has 2. Add the missing"
                + " ones."),
        set(
            "boundary",
            "[[0,0],[20,0],[20,30],[0,30],[0,0]]",
            "The plan: the last corner of the boundary is the first again. Leave the last one out;"
                + " the outline closes by itself."),
        set(
            "boundary",
            "[[0,0],[20,0],[20,0],[20,30],[0,30]]",
            "The plan: corners 2 and 3 of the boundary are on one spot. Leave one out."),
        set(
            "buildings[0].footprint",
            "[[2,2],[12,9],[12,2],[2,9]]",
            "Building \"House\": the footprint crosses itself: the side from corner 1 to 2 meets"
                + " the side from corner 3 to 4. Move a corner, or draw it again."),
        set(
            "zones[0].area",
            "[[14,2],[18,2],[16,2]]",
            "Zone \"Drive\": the area encloses no area. Its corners lie on one line; move one."),
        set(
            "people[0].area",
            "[[3,10],[9,10],[9,10.0015]]",
            "Place for people \"Patio\": the area encloses no area. Its corners lie on one line;"
                + " move one."),
        set(
            "overheadLines[0].path",
            "[[30,0,6]]",
            "Overhead line \"Service drop\": the path needs at least two points, but has 1. Add the"
                + " missing ones."),
        set(
            "bracketLines[0].path",
            "[[2,9],[12,9],[12,9]]",
            "Bracket line \"Rear eaves\": points 2 and 3 of the path are on one spot. Leave one"
                + " out."),
        setAt(
            "supports[0].lowest",
            "10",
            "supports[0].lowest",
            "Support \"Oak\": the lowest height (10 m) is above the highest (9 m). Swap them, or"
                + " measure again."),
        set(
            "bracketLines[0].lowest",
            "5",
            "Bracket line \"Rear eaves\": the lowest height (5 m) is above the highest (4.8 m)."
                + " Swap them, or measure again."),
        set(
            "trees[0].canopy.from",
            "12",
            "Tree \"Birch\": the crown's foot (12 m) is above its top (11 m). Swap them, or measure"
                + " again."),
        set(
            "people[0].from",
            "2",
            "Place for people \"Patio\": the foot (2 m) is not below the top (2 m). Swap them, or"
                + " measure again."),
        setAt(
            "buildings[0].eaves",
            "9",
            "buildings[0].ridge",
            "Building \"House\": the eaves (9 m) are above the ridge (8 m). Swap them, or measure"
                + " again."),
        set(
            "buildings[0].ridgeLine",
            null,
            "Building \"House\": a gable roof needs a ridge line. Add \"ridgeLine\" with its two"
                + " ends."),
        set(
            "buildings[0].ridgeLine",
            "[[2,5]]",
            "Building \"House\": the ridge line needs two ends, but has 1. Add the other."),
        set(
            "buildings[0].ridgeLine",
            "[[2,5],[2,5]]",
            "Building \"House\": both ends of the ridge line are on one spot. Move one."),
        setAt(
            "buildings[0].ridgeLine",
            "[[2,5],[15,5]]",
            "buildings[0].ridgeLine[1]",
            "Building \"House\": end 2 of the ridge line lies 3 m outside the footprint; at most"
                + " 1.5 m are allowed. Move it onto the building."),
        set(
            "mastZones[0].base",
            "9",
            "Mast zone \"Bed\": the base (9 m) is not below the highest top (9 m). Both are"
                + " measured from the ground; lower the base, or raise the top."),
        set(
            "zones[0].height",
            null,
            "Zone \"Drive\": a headroom zone needs its height. Add \"height\" in metres."),
        setAt(
            "mastZones[0].consents[0].highest",
            "10",
            "mastZones[0].consents[1].highest",
            "Mast zone \"Bed\": the consents must rise; consent 2 (9 m) is not above the one before"
                + " it (10 m). Put them in order."),
        setAt(
            "mastZones[0].highest",
            "12",
            "mastZones[0].consents",
            "Mast zone \"Bed\": the consents reach only 9 m, but a mast may be 12 m high. Say what"
                + " the height above needs."),
        set(
            "mastZones[0].area",
            "[[40,12],[45,12],[45,16]]",
            "Mast zone \"Bed\": the area lies wholly outside the boundary. Move it, or the"
                + " boundary."),
        set(
            "entry.at",
            "[80, 9]",
            "The entry lies 60 m outside the boundary; at most 30 m are allowed. Move it, or the"
                + " boundary."),
        set(
            "boundaryRules[0].edge",
            "4",
            "Boundary rule for edge 4: the boundary has edges 0 to 3. Correct the number."),
        setAt(
            "boundaryRules[1]",
            "{\"edge\": 1}",
            "boundaryRules[1].edge",
            "Boundary rule for edge 1: there is one for that edge before it. Keep one."),
        set(
            "site.longitude",
            null,
            "The site: latitude is given, but longitude is not. Give both, or neither."),
        set(
            "site.terrain.spots",
            "[[0,0,0],[20,0,1]]",
            "The terrain: 2 spot heights make no triangle; give at least three, or leave the"
                + " terrain out."),
        setAt(
            "site.terrain.spots[3]",
            "[20,0,5]",
            "site.terrain.spots[3]",
            "The terrain: spot heights 2 and 4 are on one spot. Leave one out."),
        set(
            "site.terrain.spots",
            "[[0,0,0],[10,0,1],[20,0,1]]",
            "The terrain: all spot heights lie on one line and make no triangle. Add one to the"
                + " side."),
        set(
            "overheadLines[0].clearance",
            "1",
            "Overhead line \"Service drop\": a kept distance of 1 m is less than the 3.05 m for a"
                + " line of this kind. It counts only with who allowed it (\"authorisedBy\") and on"
                + " what day (\"authorisedOn\"); both are missing. Ask the line's owner, or give"
                + " 3.05 m or more."),
        set(
            "overheadLines[0].authorisedOn",
            "\"2026-02-30\"",
            "Overhead line \"Service drop\": authorisedOn must be a date as YYYY-MM-DD, but is"
                + " \"2026-02-30\"."),
        set(
            "overheadLines[0].authorisedOn",
            "\"2026-06-02\"",
            "Overhead line \"Service drop\": authorisedOn is 2026-06-02, which is still to come"
                + " (today is 2026-06-01). Give the day on which it was allowed; until then the"
                + " full distance is kept."),
        setAt(
            "supports[1]",
            "{\"id\": \"pole\", \"name\": \"Pole\", \"at\": [24,27], \"lowest\": 2,"
                + " \"highest\": 6, \"ropeOnly\": true}",
            "supports[1].agreedBy",
            "Support \"Pole\": it stands 4 m outside the boundary and takes a rope, but nobody is"
                + " named who agreed. Ask, and put the name into \"agreedBy\"; or leave the"
                + " support out."),
        setAt(
            "supports[1]",
            "{\"id\": \"pole\", \"name\": \"Pole\", \"at\": [3.5,25], \"lowest\": 4,"
                + " \"highest\": 6}",
            "supports[1].at",
            "Support \"Pole\": all of its reach (4 to 6 m) lies among the leaves of support"
                + " \"Oak\" (3 to 11 m), where nothing can be hoisted. Correct its place or the"
                + " crown, or leave it out."),
        set(
            "brief.rules.wind",
            "500",
            "The brief: the wind must be between 0 and 70 m/s; found 500 m/s."));
  }

  private static List<Case> brief() {
    return List.of(
        setAt(
            "brief.bands[2]",
            "{\"name\": \"40 m\", \"frequencies\": [7.0]}",
            "brief.bands[2].name",
            "Band \"40 m\": another band before it has the same name. Give each its own."),
        set(
            "brief.bands[0].frequencies[1]",
            "14175000",
            "Band \"20 m\": 14175000 looks like hertz. Frequencies are in MHz: write 14.175."),
        set(
            "brief.bands[0].frequencies[1]",
            "14175",
            "Band \"20 m\": 14175 looks like kilohertz. Frequencies are in MHz: write 14.175."),
        set(
            "brief.bands[0].frequencies[1]",
            "144.3",
            "Band \"20 m\": 144.3 MHz is outside the range the program works in, 1.8 to 54 MHz."),
        set(
            "brief.bands[0].frequencies[1]",
            "14",
            "Band \"20 m\": 14 MHz is there twice. Keep one."),
        set(
            "brief.targets[0]",
            "{\"name\": \"Far\"}",
            "Target \"Far\": it needs a bearing and a distance, or a radius of near-vertical cover."
                + " Add \"bearing\" and \"distanceKm\", or \"nearVerticalKm\"."),
        setAt(
            "brief.targets[0].nearVerticalKm",
            "200",
            "brief.targets[0]",
            "Target \"Far\": it has both a direction and near-vertical cover. Keep \"bearing\" and"
                + " \"distanceKm\", or keep \"nearVerticalKm\"."),
        set(
            "brief.targets[0].distanceKm",
            null,
            "Target \"Far\": bearing is given, but distanceKm is not. A far target needs both."),
        set(
            "brief.targets[1].bands[0]",
            "\"80 m\"",
            "Target \"Near\": there is no band called \"80 m\". The bands are \"20 m\", \"40 m\"."),
        set(
            "brief.targets",
            "[{\"name\": \"Near\", \"nearVerticalKm\": 300, \"weight\": 0}]",
            "The brief: every one of the targets has the weight 0, so nothing could be ranked. Give"
                + " at least one a weight above 0."),
        set(
            "brief.matching",
            "\"magic\"",
            "The brief: there is no matching unit called \"magic\" in the catalogue. Choose one of"
                + " balanced-l-wide, t-unit, remote-l, set-l or balun-only."),
        set(
            "brief.rules.overrides.mast-let-go",
            "0.5",
            "The rules: \"mast-let-go\" may not be changed. Take it out."),
        set(
            "brief.rules.overrides.headroom",
            "1.9",
            "The rules: \"headroom\" may be set to 2 m at the least, but is 1.9 m."),
        set(
            "brief.rules.overrides.overhead-low-voltage",
            "1",
            "The rules: \"overhead-low-voltage\" may be set to 3.05 m at the least, but is 1 m."),
        set(
            "brief.rules.overrides.headroom",
            "21",
            "The rules: \"headroom\" may be set to 20 m at the most, but is 21 m."),
        set(
            "brief.matching.inductance",
            "[3e-5, 0]",
            "The matching unit: the least inductance (3e-5) is above the most (0). Swap them."),
        set(
            "brief.matching.coilQ",
            null,
            "The matching unit: \"coilQ\" is missing. Add it: a number."));
  }

  @TestFactory
  Stream<DynamicTest> each_broken_plan_gives_its_sentence() {
    return Stream.of(fields(), survey(), brief())
        .flatMap(List::stream)
        .map(c -> DynamicTest.dynamicTest(c.message(), () -> check(c)));
  }

  private static void check(Case c) throws JsonProcessingException {
    assertEquals(
        List.of(new Fault(c.at(), c.message())), PlanReader.read(changed(c), TODAY).faults());
  }

  private static String changed(Case c) throws JsonProcessingException {
    JsonNode plan = Json.mapper().readTree(SOUND);
    // a number JSON cannot hold is put in as text afterwards
    boolean huge = c.value() != null && c.value().equals("1e999");
    JsonNode value = c.value() == null ? null : Json.mapper().readTree(huge ? "987654" : c.value());
    put(plan, c.path(), value);
    return plan.toString().replace("987654", "1e999");
  }

  private static void put(JsonNode plan, String path, JsonNode value) {
    String[] steps = path.replace("[", ".[").split("\\.");
    JsonNode node = plan;
    for (int i = 0; i < steps.length - 1; i++) {
      node = isIndex(steps[i]) ? node.get(index(steps[i])) : node.get(steps[i]);
    }
    String last = steps[steps.length - 1];
    if (node instanceof ArrayNode list && index(last) == list.size()) {
      list.add(value);
    } else if (node instanceof ArrayNode list) {
      list.set(index(last), value);
    } else if (value == null) {
      ((ObjectNode) node).remove(last);
    } else {
      ((ObjectNode) node).set(last, value);
    }
  }

  private static boolean isIndex(String step) {
    return step.startsWith("[");
  }

  private static int index(String step) {
    return Integer.parseInt(step.substring(1, step.length() - 1));
  }

  /** One broken text: what it is, where the fault is, and its sentence. */
  private record Broken(String text, String at, String message) {}

  private static List<Broken> texts() {
    return List.of(
        new Broken(" ", "", "There is nothing in the file. A plan is a JSON object in braces."),
        new Broken(
            "{\"notes\": \"" + "x".repeat(8_400_000) + "\"}",
            "",
            "The file has 8400013 bytes; at most 8388608 are allowed. Leave out what the plan does"
                + " not need."),
        new Broken(
            "{\"x\": [" + ("[" + "1,".repeat(5000) + "1],").repeat(200),
            "line 1, column 1000003",
            "The file holds more than 500000 values. Leave out points that change nothing."),
        new Broken("{\u0001}", "line 1, column 3", "The text is not JSON from here on."),
        new Broken("[1]", "", "A plan is a JSON object in braces, but this is a list."),
        new Broken(
            "{\"boundary\": [[0,1],\n [",
            "line 2, column 3",
            "The text ends too early: something opened before is not closed. Check the last"
                + " brackets and quotes."),
        new Broken(
            "{} {}", "line 1, column 4", "Something follows the end of the plan. Take it out."),
        new Broken(
            "{\"a\":".repeat(200),
            "line 1, column 152",
            "Brackets are nested more than 30 deep; a plan needs no more than ten. Check for a"
                + " bracket too many."),
        new Broken(
            "{\"title\": " + "1".repeat(300) + "}",
            "line 1, column 311",
            "A number here has more than 200 digits. Write fewer."),
        new Broken(
            "{\"notes\": \"" + "x".repeat(2_100_000) + "\"}",
            "line 1, column 2031629",
            "A text here has more than 2000000 characters. Shorten it."),
        new Broken(
            "{\"boundary\": [[0,NaN]]}",
            "line 1, column 21",
            "NaN is not a number that JSON knows. Give a plain number, or leave the field out."),
        new Broken(
            "{\"boundary\": [[0,-Infinity]]}",
            "line 1, column 27",
            "-Infinity is not a number that JSON knows. Give a plain number, or leave the field"
                + " out."),
        new Broken(
            "{\"title\": yes}",
            "line 1, column 11",
            "yes is not a value. Texts stand in double quotes; yes and no are true and false."),
        new Broken(
            "{\"boundary\": [[0 1]]}",
            "line 1, column 18",
            "Found 1 where a comma or a closing bracket should stand."),
        new Broken(
            "{\"title\": \"a\",}",
            "line 1, column 15",
            "Found } where a field's name in double quotes should stand. Is there a comma too many,"
                + " or a quote missing?"),
        new Broken(
            "{\"title\" \"a\"}",
            "line 1, column 10",
            "Found \" where a colon should stand between a field's name and its value."),
        new Broken(
            "{\"title\": , \"notes\": \"\"}",
            "line 1, column 11",
            "Found , where a value should stand. Is a value missing, or a comma too many?"),
        new Broken(
            "{\"boundary\": [[0,1}",
            "line 1, column 19",
            "Found }, which does not close the bracket opened last. Check the brackets before this"
                + " place."),
        new Broken(
            "{\"boundary\": [[+1,1]]}",
            "line 1, column 17",
            "This number is not written as JSON has it: no leading zero, no plus sign, a digit on"
                + " both sides of the point."),
        new Broken(
            "{\"title\": \"a\nb\"}",
            "line 1, column 13",
            "A text is broken here by a line end or another control character. Close its quotes, or"
                + " write \\n"
                + " for a line end."),
        new Broken(
            "{\"title\": \"a\\qb\"}",
            "line 1, column 14",
            "A backslash in a text here is followed by something JSON does not know. Write \\\\ for"
                + " a backslash."),
        new Broken(
            "{\"title\": \"a\" // mine\n}",
            "line 1, column 15",
            "JSON has no comments. Put the remark into \"notes\"."));
  }

  @TestFactory
  Stream<DynamicTest> each_broken_text_gives_its_sentence() {
    return texts().stream()
        .map(
            b ->
                DynamicTest.dynamicTest(
                    b.message(),
                    () ->
                        assertEquals(
                            List.of(new Fault(b.at(), b.message())),
                            PlanReader.read(b.text()).faults())));
  }

  @Test
  void bytes_that_are_not_text_are_said_with_their_line() {
    byte[] latin = "{\"title\":\n\"caf\u00e9\"}".getBytes(StandardCharsets.ISO_8859_1);
    assertEquals(
        List.of(new Fault("line 2", "The file is not UTF-8 text from here on. Save it as UTF-8.")),
        PlanReader.read(latin).faults());
  }

  @Test
  void a_field_there_twice_is_said_with_its_path() {
    String twice = SOUND.replace("\"entry\": {", "\"entry\": {\"height\": 1,");
    assertEquals(
        List.of(new Fault("entry.height", "\"height\" is there twice. Keep one.")),
        PlanReader.read(twice).faults());
  }

  @Test
  void a_kind_or_rule_that_no_catalogue_has_is_said_with_the_choice()
      throws JsonProcessingException {
    for (String field : List.of("wire", "line", "rope", "exposure")) {
      Case c = set("brief." + field, "\"string\"", "");
      List<Fault> faults = PlanReader.read(changed(c), TODAY).faults();
      assertEquals(1, faults.size());
      assertTrue(faults.get(0).message().startsWith("The brief: there is no "), field);
      assertTrue(
          faults.get(0).message().contains(" called \"string\" in the catalogue. Choose one"));
    }
    Case rule = set("brief.rules.overrides.luck", "1", "");
    String said = PlanReader.read(changed(rule)).faults().get(0).message();
    assertTrue(
        said.startsWith("The rules: there is no rule called \"luck\". Those that may be set are "));
    assertTrue(said.contains("headroom") && !said.contains("let-go"));
  }

  @Test
  void too_few_places_to_hang_a_wire_are_counted() throws JsonProcessingException {
    ObjectNode plan = (ObjectNode) Json.mapper().readTree(SOUND);
    plan.remove("supports");
    plan.remove("bracketLines");
    Fault none = PlanReader.read(plan.toString()).faults().get(0);
    assertEquals(
        new Fault(
            "supports",
            "There is no place to hang a wire; at least two are needed. Add a support, a bracket"
                + " line, or a mast zone together with new masts in the brief."),
        none);
    ((ObjectNode) plan.path("brief")).put("newMasts", 1);
    assertTrue(
        PlanReader.read(plan.toString())
            .faults()
            .get(0)
            .message()
            .startsWith("There is only 1 place"));
    ((ObjectNode) plan.path("brief")).put("newMasts", 2);
    assertEquals(List.of(), PlanReader.read(plan.toString()).faults());
  }

  @Test
  void an_authorised_smaller_clearance_is_taken() throws JsonProcessingException {
    ObjectNode line = (ObjectNode) Json.mapper().readTree(SOUND).path("overheadLines").get(0);
    line.put("clearance", 1).put("authorisedBy", "the network");
    String half =
        SOUND.replaceAll(
            "(?s)\\{\"id\": \"drop\".*?\\}",
            Pattern.quote("").isEmpty()
                ? ""
                : java.util.regex.Matcher.quoteReplacement(line.toString()));
    assertTrue(PlanReader.read(half).faults().get(0).message().contains("; the day is missing."));
    line.put("authorisedOn", "2026-05-01");
    String both =
        SOUND.replaceAll(
            "(?s)\\{\"id\": \"drop\".*?\\}",
            java.util.regex.Matcher.quoteReplacement(line.toString()));
    assertEquals(1.0, PlanReader.read(both).plan().overheadLines().get(0).clearance());
  }

  @Test
  void every_fault_is_gathered_not_only_the_first() throws JsonProcessingException {
    JsonNode plan = Json.mapper().readTree(SOUND);
    List<String> expected = new ArrayList<>();
    for (Case c :
        List.of(
            survey().get(6), survey().get(11), fields().get(1), brief().get(1), brief().get(11))) {
      put(plan, c.path(), c.value() == null ? null : Json.mapper().readTree(c.value()));
      expected.add(c.message());
    }
    List<String> found =
        PlanReader.read(plan.toString()).faults().stream().map(Fault::message).toList();
    assertEquals(expected.stream().sorted().toList(), found.stream().sorted().toList());
  }

  @Test
  void what_real_surveyors_draw_is_let_by() throws JsonProcessingException {
    for (Case c :
        List.of(
            set("boundary", "[[0,0],[20,0],[20,15],[20,30],[0,30]]", ""), // a corner on a side
            set("boundary", "[[0,30],[20,30],[20,0],[0,0]]", ""), // the other way round
            set("supports[0].at", "[-30, 25]", ""), // a neighbour's tree
            set("supports[0].pullLimit", "0", ""),
            set("mastZones[0].area", "[[-1,12],[9,12],[9,16],[-1,16]]", ""), // a little over
            set("mastZones[0].consents", "[]", ""),
            set("buildings[0].ridge", "5", ""), // a gable with no rise
            set("zones[0].rule", "\"no-wire\"", ""), // a height that no-wire needs not
            set("metalwork[0].path", "[[2,9,5],[2,9,1]]", ""), // straight down
            set("metalwork[0].path", "[[2,2,5],[9,2,5],[9,9,5],[2,2,5]]", ""), // a ring
            set("datums", "[{\"at\": [2,9]}, {\"at\": [12,9]}]", ""),
            set("brief.newMasts", "2", ""),
            set("brief.shapes", "[]", ""),
            set("brief.lineLengths", "[12, 18.5]", ""),
            set("brief.matching", "{\"network\": \"balun\"}", ""),
            set("brief.targets[0].distanceKm", "31000", ""))) { // the long way round
      assertEquals(List.of(), PlanReader.read(changed(c), TODAY).faults(), c.toString());
    }
  }

  /** Every value of the plan in turn is replaced by every kind of nonsense. */
  @Test
  void nonsense_in_any_place_is_a_fault_or_a_plan_never_a_crash() throws JsonProcessingException {
    JsonNode sound = Json.mapper().readTree(SOUND);
    List<String> places = new ArrayList<>();
    places(sound, "", places);
    assertTrue(places.size() > 150);
    for (String place : places) {
      for (String value :
          List.of("null", "true", "\"x\"", "-1", "1e9", "0.5", "[]", "{}", "[[1]]", "[null]")) {
        JsonNode plan = sound.deepCopy();
        put(plan, place, Json.mapper().readTree(value));
        PlanReader.Outcome outcome = PlanReader.read(plan.toString());
        assertTrue((outcome.plan() == null) != outcome.faults().isEmpty(), place + " = " + value);
        PlanReader.readDraft(plan.toString());
        if (outcome.plan() != null) {
          String written = Json.mapper().writeValueAsString(outcome.plan());
          assertEquals(outcome.plan(), PlanReader.read(written).plan(), place + " = " + value);
        }
      }
    }
  }

  private static void places(JsonNode node, String path, List<String> places) {
    if (!path.isEmpty()) {
      places.add(path);
    }
    for (int i = 0; i < node.size() && node.isArray(); i++) {
      places(node.get(i), path + "[" + i + "]", places);
    }
    node.properties()
        .forEach(
            f -> places(f.getValue(), (path.isEmpty() ? "" : path + ".") + f.getKey(), places));
  }

  @Test
  void every_sentence_has_its_case() throws JsonProcessingException {
    List<String> said = new ArrayList<>();
    Stream.of(fields(), survey(), brief())
        .flatMap(List::stream)
        .forEach(c -> said.add(c.message()));
    texts().forEach(b -> said.add(b.message()));
    said.add("The file is not UTF-8 text from here on. Save it as UTF-8.");
    said.add("\"height\" is there twice. Keep one.");
    said.add(
        "There is no place to hang a wire; at least two are needed. Add a support, a bracket line,"
            + " or a mast zone together with new masts in the brief.");
    Case rule = set("brief.rules.overrides.luck", "1", "");
    said.add(PlanReader.read(changed(rule)).faults().get(0).message());
    EnumSet<Wording> silent = EnumSet.allOf(Wording.class);
    silent.removeIf(wording -> said.stream().anyMatch(pattern(wording).asMatchPredicate()));
    assertEquals(EnumSet.noneOf(Wording.class), silent);
  }

  private static Pattern pattern(Wording wording) {
    Object[] parts = new Object[12];
    java.util.Arrays.fill(parts, "\u0001");
    return Pattern.compile(
        ("\\Q" + wording.with(parts) + "\\E").replace("\u0001", "\\E.+?\\Q"), Pattern.DOTALL);
  }
}
