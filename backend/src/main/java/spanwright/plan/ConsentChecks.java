package spanwright.plan;

import com.fasterxml.jackson.databind.JsonNode;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import org.locationtech.jts.geom.Polygon;

/** Whether what only others can allow was allowed: by whom, and on what day. */
final class ConsentChecks {
  private static final double ROUNDING = 1e-9;

  private final Thing plan;
  private final LocalDate today;
  private final List<Fault> faults = new ArrayList<>();

  private ConsentChecks(JsonNode plan, LocalDate today) {
    this.plan = new Thing("", "The plan", plan);
    this.today = today;
  }

  /**
   * The faults.
   *
   * @param today where known, so that nothing counts as allowed on a day still to come; or null
   */
  static List<Fault> faults(JsonNode plan, LocalDate today) {
    ConsentChecks checks = new ConsentChecks(plan, today);
    Thing.list(plan, "", "overheadLines", "overhead line").forEach(checks::overheadLine);
    checks.ropesOutside();
    return checks.faults;
  }

  private void say(String path, Wording wording, Object... parts) {
    faults.add(Fault.of(path, wording, parts));
  }

  private void overheadLine(Thing line) {
    String date = line.text("authorisedOn");
    boolean given = date != null && !date.isBlank();
    if (given && !Dates.isDate(date)) {
      say(line.at("authorisedOn"), Wording.BAD_DATE, line.label(), Wording.quoted(date));
    } else if (given && today != null && LocalDate.parse(date).isAfter(today)) {
      say(line.at("authorisedOn"), Wording.DATE_TO_COME, line.label(), date, today.toString());
    }
    Double clearance = line.number("clearance");
    String word = line.text("kind");
    var rule = Catalogues.standard().findRule("overhead-" + (word == null ? "unknown" : word));
    if (clearance == null || rule.isEmpty()) {
      return;
    }
    double least = rule.get().defaultValue();
    String by = line.text("authorisedBy");
    boolean named = by != null && !by.isBlank();
    if (clearance < least - ROUNDING && !(named && given)) {
      String lacking = named ? "the day is" : given ? "who allowed it is" : "both are";
      String cure = Wording.number(least) + " m or more";
      say(
          line.at("clearance"),
          Wording.CLEARANCE_UNAUTHORISED,
          line.label(),
          clearance,
          least,
          lacking,
          cure);
    }
  }

  /** A rope to something that stands at a neighbour's is the neighbour's to allow. */
  private void ropesOutside() {
    List<Fault> unsound = new ArrayList<>();
    if (!OutlineChecks.outline(plan, "boundary", "the boundary", unsound)) {
      return;
    }
    Polygon boundary = OutlineChecks.polygon(plan.points("boundary"));
    for (Thing support : Thing.list(plan.json(), "", "supports", "support")) {
      Point at = support.point("at");
      String by = support.text("agreedBy");
      boolean ropeOnly = support.json().path("ropeOnly").asBoolean(false);
      if (ropeOnly && at != null && (by == null || by.isBlank())) {
        double away = OutlineChecks.outside(at, boundary);
        if (away > OutlineChecks.SPOT) {
          double shown = Math.round(away * 10) / 10.0;
          say(support.at("agreedBy"), Wording.ROPE_NOT_AGREED, support.label(), shown);
        }
      }
    }
  }
}
