package spanwright.assess;

import spanwright.plan.Plan;
import spanwright.plan.PlanReader;

/** Plans for these tests: a level or sloping garden with two poles, and what a test is about. */
final class Gardens {
  private Gardens() {}

  /**
   * @param site members of the site, or empty
   * @param lists further lists of the plan, each followed by a comma
   * @param brief members of the brief
   */
  static Plan of(String site, String lists, String brief) {
    String json =
        """
        { "format": "spanwright-plan/1", "title": "Garden", "site": { %s },
          "boundary": [[0,0],[40,0],[40,30],[0,30]],
          "supports": [
            { "id": "west", "kind": "other", "at": [5,15], "lowest": 2, "highest": 10 },
            { "id": "east", "kind": "other", "at": [35,15], "lowest": 2, "highest": 10 } ],
          %s
          "entry": { "at": [20,1], "height": 1.5 },
          "brief": { %s } }
        """
            .formatted(site, lists, brief);
    PlanReader.Outcome outcome = PlanReader.read(json);
    if (outcome.plan() == null) {
      throw new IllegalStateException(outcome.faults().toString());
    }
    return outcome.plan();
  }

  static final String ONE_BAND =
      """
      "bands": [ { "name": "20 m", "frequencies": [14.0, 14.175, 14.35] } ],
      "targets": [ { "name": "Far", "bearing": 285, "distanceKm": 5600 } ]
      """;

  /** A plan with these lines of metal. */
  static Plan withMetal(String site, String metalwork) {
    return of(site, "\"metalwork\": [" + metalwork + "],", ONE_BAND);
  }
}
