package spanwright;

import java.util.LinkedHashMap;
import java.util.Map;

/** A small sound plan, and the many ways it can be broken. */
public final class BrokenPlans {
  /** Two masts and a house on a level garden: all a plan needs. */
  public static final String SOUND =
      """
      {
        "format": "spanwright-plan/1",
        "title": "Test garden",
        "boundary": [[0,0],[24,0],[24,18],[0,18]],
        "buildings": [ { "id": "house", "footprint": [[1,1],[7,1],[7,6],[1,6]], "eaves": 4, "roof": "flat" } ],
        "supports": [
          { "id": "west", "kind": "mast", "at": [2,12], "lowest": 4, "highest": 9, "pullLimit": 400 },
          { "id": "east", "kind": "mast", "at": [22,12], "lowest": 4, "highest": 9, "pullLimit": 400 } ],
        "entry": { "at": [7,3], "height": 1.5 },
        "datums": [ { "name": "A", "at": [0,0] }, { "name": "B", "at": [10,0] } ],
        "brief": {
          "bands": [ { "name": "20 m", "frequencies": [14.175] } ],
          "targets": [ { "name": "West", "bearing": 285, "distanceKm": 5600 } ] }
      }
      """;

  private BrokenPlans() {}

  private static String with(String found, String instead) {
    if (!SOUND.contains(found)) {
      throw new IllegalArgumentException(found);
    }
    return SOUND.replace(found, instead);
  }

  /** Texts that are not JSON within bounds: 400, exit 3. */
  public static Map<String, String> syntax() {
    Map<String, String> broken = new LinkedHashMap<>();
    broken.put("nothing at all", "");
    broken.put("cut off", SOUND.substring(0, 200));
    broken.put("a comma too many", with("\"lowest\": 4,", "\"lowest\": 4,,"));
    broken.put("no quotes", with("\"mast\"", "mast"));
    broken.put("NaN", with("\"lowest\": 4", "\"lowest\": NaN"));
    broken.put("infinity", with("\"lowest\": 4", "\"lowest\": -Infinity"));
    broken.put("a name twice", with("\"lowest\": 4", "\"lowest\": 4, \"lowest\": 5"));
    broken.put("something after the end", SOUND + "{}");
    broken.put("a thousand digits", with("\"lowest\": 4", "\"lowest\": " + "9".repeat(1000)));
    broken.put(
        "deep nesting",
        with("[[0,0],[24,0]", "[".repeat(100_000) + "]".repeat(100_000) + ",[0,0]"));
    broken.put("a comment", "// plan\n" + SOUND);
    broken.put("a control character in a text", with("Test garden", "Test\u0001garden"));
    return broken;
  }

  /** Documents that say something that cannot be: 422, exit 3. */
  public static Map<String, String> meaning() {
    Map<String, String> broken = new LinkedHashMap<>();
    broken.put("a list for a plan", "[]");
    broken.put("a word for a plan", "\"plan\"");
    broken.put("null for a plan", "null");
    broken.put("a text for a number", with("\"lowest\": 4", "\"lowest\": \"four\""));
    broken.put("an object for a list", with("[[0,0],[24,0],[24,18],[0,18]]", "{}"));
    broken.put("a point of one number", with("[24,0]", "[24]"));
    broken.put("null in a point", with("[24,0]", "[24,null]"));
    broken.put("null in a list", with("\"datums\": [", "\"datums\": [ null,"));
    broken.put("an unknown field", with("\"kind\": \"mast\"", "\"kind\": \"mast\", \"colour\": 1"));
    broken.put("an unknown word", with("\"kind\": \"mast\"", "\"kind\": \"crane\""));
    broken.put("another format", with("spanwright-plan/1", "spanwright-plan/9"));
    broken.put("no boundary", with("\"boundary\": [[0,0],[24,0],[24,18],[0,18]],", ""));
    broken.put("no brief", with("\"brief\": {", "\"unused\": {"));
    broken.put("a crossing boundary", with("[24,18],[0,18]", "[0,18],[24,18]"));
    broken.put(
        "heights swapped", with("\"lowest\": 4, \"highest\": 9", "\"lowest\": 9, \"highest\": 4"));
    broken.put("a huge number", with("\"highest\": 9", "\"highest\": 1e300"));
    broken.put("a number beyond doubles", with("\"highest\": 9", "\"highest\": 1e999"));
    broken.put("a corner beyond the horizon", with("[24,0]", "[2.4e9,0]"));
    broken.put("an id twice", with("\"id\": \"east\"", "\"id\": \"west\""));
    broken.put("frequencies in hertz", with("14.175", "14175000"));
    broken.put("an unknown wire", with("\"bands\"", "\"wire\": \"unobtainium\", \"bands\""));
    broken.put("a bearing of 700", with("\"bearing\": 285", "\"bearing\": 700"));
    broken.put("a negative weight", with("\"bearing\": 285", "\"weight\": -1, \"bearing\": 285"));
    broken.put("300,000 points", with("[24,0]", "[24,0]" + ",[23.5,0.5]".repeat(300_000)));
    broken.put(
        "a line with less clearance and nobody's word",
        with(
            "\"entry\"",
            "\"overheadLines\": [ { \"id\": \"drop\", \"path\": [[0,17,6],[24,17,6]],"
                + " \"kind\": \"low-voltage\", \"clearance\": 0.5 } ], \"entry\""));
    return broken;
  }

  /** What must never be seen from outside: names of what is inside. */
  public static boolean namesInnards(String text) {
    return text.matches(
        "(?s).*(Exception|java\\.|jackson|spanwright\\.[a-z]+\\.|\\bat [a-z]+\\.|StackTrace|Throwable"
            + "|org\\.|com\\.|JsonNode|deserializ|null pointer).*");
  }
}
