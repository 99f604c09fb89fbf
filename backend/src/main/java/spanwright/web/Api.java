package spanwright.web;

import io.javalin.config.RoutesConfig;

/** Every route of the program. */
final class Api implements AutoCloseable {
  private final PlanRoutes plans;
  private final ReferenceRoutes reference;

  Api(WebServer.Options options, Engine engine) {
    this.plans = new PlanRoutes(options.store());
    this.reference = new ReferenceRoutes(options);
  }

  void install(RoutesConfig routes) {
    plans.install(routes);
    reference.install(routes);
  }

  @Override
  public void close() {}
}
