package spanwright.web;

import spanwright.assess.Assessor;
import spanwright.assess.Placement;
import spanwright.plan.Catalogues;
import spanwright.plan.Plan;
import spanwright.rigging.Layout;
import spanwright.search.Result;
import spanwright.search.Search;

/** What the routes ask of the packages that reckon; tests put a slow or failing one here. */
class Engine {
  Result search(Plan plan, Search.Options options, Search.Listener listener) {
    return Search.run(plan, Catalogues.standard(), options, listener);
  }

  Assessor prepare(Plan plan) {
    return Assessor.of(plan, Catalogues.standard());
  }

  Placement assess(Assessor assessor, Layout layout) {
    return assessor.assess(layout);
  }
}
