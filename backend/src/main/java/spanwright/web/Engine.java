package spanwright.web;

import spanwright.assess.Assessor;
import spanwright.assess.Placement;
import spanwright.moments.GroundTables;
import spanwright.plan.Catalogues;
import spanwright.plan.Plan;
import spanwright.rigging.Layout;
import spanwright.search.Result;
import spanwright.search.Search;

/** What the routes ask of the packages that reckon; tests put a slow or failing one here. */
class Engine {
  /** For all plans: one that was changed a little stands on the same ground. */
  private final GroundTables tables = new GroundTables();

  Result search(Plan plan, Search.Options options, Search.Listener listener) {
    return Search.run(plan, Catalogues.standard(), tables, options, listener);
  }

  Assessor prepare(Plan plan) {
    return Assessor.of(plan, Catalogues.standard(), tables);
  }

  Placement assess(Assessor assessor, Layout layout) {
    return assessor.assess(layout);
  }
}
