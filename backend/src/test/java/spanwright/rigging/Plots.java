package spanwright.rigging;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.plan.PlanReader;

/** Small plans for tests, made from the parts that a test is about. */
public final class Plots {
  private final List<String> parts = new ArrayList<>();
  private String terrain = "";
  private String rules = "\"wind\": 20, \"ice\": 0";
  private String entry = "[30, 26]";
  private int newMasts = 2;

  private Plots() {}

  /** A bare plot of 60 by 60 m. */
  public static Plots bare() {
    return new Plots();
  }

  /** Adds a list of the plan format, as JSON. */
  public Plots with(String name, String list) {
    parts.add("\"" + name + "\": " + list);
    return this;
  }

  /** Two poles of 10 m on a line from west to east, 30 m apart, and whatever else is given. */
  public Plots poles(String more) {
    return with(
        "supports",
        """
        [ { "id": "west", "name": "West pole", "kind": "other", "at": [15, 30], "lowest": 2, "highest": 10 },
          { "id": "east", "name": "East pole", "kind": "other", "at": [45, 30], "lowest": 2, "highest": 10 }"""
            + more
            + "]");
  }

  /** Sets the spot heights. */
  public Plots terrain(String spots) {
    terrain = ", \"terrain\": { \"spots\": " + spots + " }";
    return this;
  }

  /** Sets the rules of the brief. */
  public Plots rules(String json) {
    rules = json;
    return this;
  }

  /** Moves the entry. */
  public Plots entry(String at) {
    entry = at;
    return this;
  }

  /** Reads the plan; a fault in a test's plan fails the test. */
  public Plan plan() {
    return plan(json());
  }

  /** Reads a plan; a fault in it fails the test. */
  public static Plan plan(String json) {
    PlanReader.Outcome outcome = PlanReader.read(json);
    if (outcome.plan() == null) {
      throw new IllegalStateException(outcome.faults().toString());
    }
    return outcome.plan();
  }

  /** The plan as JSON. */
  public String json() {
    String rest = parts.isEmpty() ? "" : String.join(",\n", parts) + ",";
    return String.format(
        Locale.ROOT,
        """
            { "format": "spanwright-plan/1", "title": "Test plot",
              "site": { "planNorth": 0 %s },
              "boundary": [[0,0],[60,0],[60,60],[0,60]],
              %s
              "entry": { "at": %s, "height": 1.5 },
              "brief": {
                "bands": [ { "name": "20 m", "frequencies": [14.1] } ],
                "targets": [ { "name": "Far", "bearing": 90, "distanceKm": 3000 } ],
                "newMasts": %d, "rules": { %s } } }
            """,
        terrain,
        rest,
        entry,
        newMasts,
        rules);
  }

  /**
   * A layout along straight lines.
   *
   * @param tail rope at both ends [m]
   * @param fraction of the feedpoint
   */
  public static Layout straight(String shape, double tail, double fraction, Layout.Hold... holds) {
    List<Place> points = new ArrayList<>();
    int last = holds.length - 1;
    for (int i = 0; i <= last; i++) {
      Place at = holds[i].at();
      points.add(
          i == 0
              ? towards(at, holds[1].at(), tail)
              : i == last ? towards(at, holds[last - 1].at(), tail) : at);
    }
    return new Layout(
        shape,
        List.of(holds),
        List.of(new Layout.Run(points, null)),
        new Layout.FeedChoice(0, fraction, null, null));
  }

  /** A holding point. */
  public static Layout.Hold hold(String on, double x, double y, double z) {
    return new Layout.Hold(on, new Place(x, y, z));
  }

  private static Place towards(Place a, Place b, double way) {
    double t = way / a.distance(b);
    return new Place(
        a.x() + t * (b.x() - a.x()), a.y() + t * (b.y() - a.y()), a.z() + t * (b.z() - a.z()));
  }
}
