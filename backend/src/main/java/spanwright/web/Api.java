package spanwright.web;

import io.javalin.config.RoutesConfig;

/** Every route of the program, and what works behind them. */
final class Api implements AutoCloseable {
  private final PlanRoutes plans;
  private final SearchRoutes searchRoutes;
  private final PlacementRoutes placements;
  private final SheetRoutes sheets;
  private final ReferenceRoutes reference;
  private final Searches searches;
  private final Assessments assessments;

  Api(WebServer.Options options, Engine engine) {
    this.searches = new Searches(engine);
    this.assessments = new Assessments(engine);
    this.plans = new PlanRoutes(options.store());
    this.searchRoutes = new SearchRoutes(options.store(), searches);
    this.placements = new PlacementRoutes(assessments);
    this.sheets = new SheetRoutes(options.store(), searches, assessments);
    this.reference = new ReferenceRoutes(options);
  }

  void install(RoutesConfig routes) {
    plans.install(routes);
    searchRoutes.install(routes);
    placements.install(routes);
    sheets.install(routes);
    reference.install(routes);
  }

  @Override
  public void close() {
    searches.close();
    assessments.close();
  }
}
