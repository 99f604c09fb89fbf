package spanwright.web;

import io.javalin.config.RoutesConfig;
import io.javalin.http.Context;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import spanwright.plan.Fault;
import spanwright.plan.Plan;
import spanwright.plan.PlanReader;
import spanwright.search.Effort;
import spanwright.search.Search;
import spanwright.store.PlanStore;
import spanwright.store.SavedPlan;

/** Searches: start, ask, follow, cancel. */
final class SearchRoutes {
  private static final int MOST_PLACEMENTS = 100;

  /** Beyond this a number in JSON is not exact in every language. */
  private static final double LARGEST_SEED = 9_007_199_254_740_991.0;

  private final PlanStore store;
  private final Searches searches;
  private final EventStream events = new EventStream();

  SearchRoutes(PlanStore store, Searches searches) {
    this.store = store;
    this.searches = searches;
  }

  void install(RoutesConfig routes) {
    routes.post("/api/plans/{id}/searches", this::start);
    routes.get("/api/searches/{id}", this::ask);
    routes.delete("/api/searches/{id}", this::cancel);
    routes.get("/api/searches/{id}/events", ctx -> events.serve(ctx, existing(ctx)));
  }

  private void start(Context ctx) {
    SavedPlan saved = PlanRoutes.existing(store, ctx.pathParam("id"));
    Search.Options options = options(ctx);
    PlanReader.Outcome outcome = PlanReader.read(saved.json(), LocalDate.now());
    if (!outcome.faults().isEmpty()) {
      throw new ProblemException(Problem.faulty("The plan", outcome.faults()));
    }
    Plan plan = outcome.plan();
    SearchJob job = searches.start(saved, plan, options);
    ctx.status(202);
    ctx.header("Location", "/api/searches/" + job.id());
    ctx.json(job.document());
  }

  private static Search.Options options(Context ctx) {
    byte[] bytes = Requests.bytes(ctx);
    Search.Options standard = Search.Options.standard();
    if (bytes.length == 0) {
      return standard;
    }
    Requests.requireJson(ctx);
    List<Fault> faults = new ArrayList<>();
    Form form = Form.of(Requests.tree(bytes), faults);
    Effort effort =
        form.word(
            "effort",
            Map.of(
                Effort.QUICK.word(), Effort.QUICK,
                Effort.NORMAL.word(), Effort.NORMAL,
                Effort.THOROUGH.word(), Effort.THOROUGH),
            standard.effort());
    long seed = form.whole("seed", -LARGEST_SEED, LARGEST_SEED, standard.seed());
    int top = (int) form.whole("top", 1, MOST_PLACEMENTS, standard.top());
    form.finish();
    if (!faults.isEmpty()) {
      throw new ProblemException(Problem.faulty("The request", faults));
    }
    return new Search.Options(effort, seed, top, standard.threads());
  }

  private void ask(Context ctx) {
    ctx.header("Cache-Control", "no-store");
    ctx.json(existing(ctx).document());
  }

  private void cancel(Context ctx) {
    existing(ctx).cancel();
    ctx.status(204);
  }

  private SearchJob existing(Context ctx) {
    return existing(searches, ctx.pathParam("id"));
  }

  static SearchJob existing(Searches searches, String id) {
    return searches
        .find(id)
        .orElseThrow(
            () ->
                new ProblemException(
                    Problem.notFound(
                        "There is no such search. Only the last few are kept; start it again.")));
  }
}
