package spanwright.web;

import io.javalin.config.RoutesConfig;
import io.javalin.http.Context;
import spanwright.rigging.Layout;

/** One placement, assessed. */
final class PlacementRoutes {
  private final Assessments assessments;

  PlacementRoutes(Assessments assessments) {
    this.assessments = assessments;
  }

  void install(RoutesConfig routes) {
    routes.post("/api/assess", this::assess);
  }

  private void assess(Context ctx) {
    AskedPlacement asked = AskedPlacement.of(Requests.tree(ctx), assessments);
    Layout layout = asked.layout();
    try {
      ctx.json(Finite.tree(assessments.assess(asked.text(), asked.plan(), layout)));
    } catch (IllegalArgumentException e) {
      throw AskedPlacement.senseless(e);
    }
  }
}
