package spanwright.web;

import com.fasterxml.jackson.databind.JsonNode;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import spanwright.assess.Placement;
import spanwright.plan.Catalogues;
import spanwright.plan.Fault;
import spanwright.plan.Plan;
import spanwright.plan.PlanReader;
import spanwright.rigging.Layout;

/**
 * A plan and a placement on it, as every route with such a body takes them.
 *
 * @param text of the plan
 * @param plan the same, read and free of faults
 * @param placement as sent
 */
record AskedPlacement(String text, Plan plan, JsonNode placement) {
  /**
   * From a body.
   *
   * @param assessments may know the plan already
   * @param more fields that the route takes besides
   */
  static AskedPlacement of(JsonNode tree, Assessments assessments, String... more) {
    List<Fault> faults = new ArrayList<>();
    Form form = Form.of(tree, faults);
    form.form("plan");
    form.form("placement");
    for (String name : more) {
      form.has(name);
    }
    form.finish();
    require("The request", faults);
    String text = tree.get("plan").toString();
    Plan known = assessments.known(text);
    if (known != null) {
      return new AskedPlacement(text, known, tree.get("placement"));
    }
    PlanReader.Outcome outcome = PlanReader.read(text, LocalDate.now());
    for (Fault fault : outcome.faults()) {
      String path = fault.path().isEmpty() ? "plan" : "plan." + fault.path();
      faults.add(new Fault(path, fault.message()));
    }
    require("The plan", faults);
    return new AskedPlacement(text, outcome.plan(), tree.get("placement"));
  }

  /** What is to be assessed of it. */
  Layout layout() {
    List<Fault> faults = new ArrayList<>();
    Layout layout = reader().layout(placement, "placement", faults);
    require("The placement", faults);
    return layout;
  }

  /** All of it, for a sheet. */
  Placement whole() {
    List<Fault> faults = new ArrayList<>();
    Placement whole = reader().whole(placement, "placement", faults);
    require("The placement", faults);
    return whole;
  }

  private PlacementReader reader() {
    return new PlacementReader(plan, Catalogues.standard());
  }

  static void require(String what, List<Fault> faults) {
    if (!faults.isEmpty()) {
      throw new ProblemException(Problem.faulty(what, faults));
    }
  }

  /** What the reckoning refuses is bad input, if the sentence is our own. */
  static RuntimeException senseless(IllegalArgumentException e) {
    boolean ours =
        e.getClass() == IllegalArgumentException.class
            || e.getClass().getName().startsWith("spanwright.");
    return ours
        ? new ProblemException(
            Problem.faulty("The placement", List.of(new Fault("placement", e.getMessage()))))
        : e;
  }
}
