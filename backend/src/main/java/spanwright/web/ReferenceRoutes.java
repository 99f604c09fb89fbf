package spanwright.web;

import io.javalin.config.RoutesConfig;
import io.javalin.http.Context;
import java.util.Map;
import spanwright.plan.Catalogues;
import spanwright.plan.DemoPlans;

/** What does not change: the catalogues, the demo plots, and whether the server is well. */
final class ReferenceRoutes {
  private final WebServer.Options options;

  ReferenceRoutes(WebServer.Options options) {
    this.options = options;
  }

  void install(RoutesConfig routes) {
    routes.get("/api/catalogue", ctx -> ctx.json(Catalogues.standard()));
    routes.get("/api/demos", ReferenceRoutes::demos);
    routes.get("/api/demos/{name}", ReferenceRoutes::demo);
    routes.get("/api/health", this::health);
  }

  private static void demos(Context ctx) {
    ctx.json(
        DemoPlans.list().stream()
            .map(demo -> Map.of("name", demo.name(), "title", demo.title()))
            .toList());
  }

  private static void demo(Context ctx) {
    String name = ctx.pathParam("name");
    ctx.contentType("application/json");
    ctx.result(
        DemoPlans.list().stream()
            .filter(demo -> demo.name().equals(name))
            .findFirst()
            .orElseThrow(
                () ->
                    new ProblemException(
                        Problem.notFound(
                            "There is no demo plot of that name; GET /api/demos lists them.")))
            .json());
  }

  /** Also what people should know about their folder of plans. */
  private void health(Context ctx) {
    ctx.header("Cache-Control", "no-store");
    ctx.json(
        Map.of(
            "status", "ok",
            "version", options.version(),
            "notices", options.store().notices()));
  }
}
