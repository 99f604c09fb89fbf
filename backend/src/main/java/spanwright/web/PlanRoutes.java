package spanwright.web;

import com.fasterxml.jackson.annotation.JsonProperty;
import io.javalin.config.RoutesConfig;
import io.javalin.http.Context;
import java.time.LocalDate;
import java.util.List;
import java.util.Map;
import java.util.function.Predicate;
import spanwright.plan.Fault;
import spanwright.plan.PlanReader;
import spanwright.store.PlanEntry;
import spanwright.store.PlanStore;
import spanwright.store.SavedPlan;

/** Plans: list, read, save, delete, check. */
final class PlanRoutes {
  private final PlanStore store;

  PlanRoutes(PlanStore store) {
    this.store = store;
  }

  void install(RoutesConfig routes) {
    routes.get("/api/plans", ctx -> ctx.json(store.list().stream().map(Line::of).toList()));
    routes.post("/api/plans", this::create);
    routes.get("/api/plans/{id}", this::read);
    routes.put("/api/plans/{id}", this::replace);
    routes.delete("/api/plans/{id}", this::delete);
    routes.post("/api/check", PlanRoutes::check);
  }

  /** A line of the list; the ETag as {@code If-Match} takes it. */
  private record Line(
      String id, String title, @JsonProperty("savedAt") String savedAt, String etag) {
    static Line of(PlanEntry entry) {
      return new Line(
          entry.id(), entry.title(), entry.savedAt().toString(), Requests.etag(entry.version()));
    }
  }

  private void create(Context ctx) {
    SavedPlan saved = store.create(admitted(ctx));
    String before = ctx.queryParam("restores");
    if (before != null) {
      store.issued().carry(before, saved.id());
    }
    ctx.status(201);
    ctx.header("Location", "/api/plans/" + saved.id());
    ctx.header("ETag", Requests.etag(saved.version()));
    ctx.json(Map.of("id", saved.id()));
  }

  private void read(Context ctx) {
    SavedPlan saved = existing(store, ctx.pathParam("id"));
    ctx.header("ETag", Requests.etag(saved.version()));
    ctx.header("Cache-Control", "no-cache");
    if (Requests.hasAlready(ctx, saved.version())) {
      ctx.status(304);
      return;
    }
    ctx.contentType("application/json");
    ctx.result(saved.json());
  }

  private void replace(Context ctx) {
    String id = existing(store, ctx.pathParam("id")).id();
    Predicate<String> accepted = Requests.ifMatch(ctx);
    String json = admitted(ctx);
    SavedPlan saved = store.replace(id, json, accepted).orElseThrow(() -> gone(id));
    ctx.header("ETag", Requests.etag(saved.version()));
    ctx.json(Map.of("id", id));
  }

  private void delete(Context ctx) {
    String id = existing(store, ctx.pathParam("id")).id();
    if (!store.delete(id, Requests.ifMatch(ctx))) {
      throw gone(id);
    }
    ctx.status(204);
  }

  private static void check(Context ctx) {
    String text = Requests.text(ctx);
    ctx.json(Map.of("faults", PlanReader.read(text, LocalDate.now()).faults()));
  }

  /** The body as sent, if it is a plan, or with {@code ?draft=true} the beginning of one. */
  private static String admitted(Context ctx) {
    boolean draft = Requests.isOn(ctx, "draft");
    String text = Requests.text(ctx);
    List<Fault> faults =
        draft
            ? PlanReader.readDraft(text).faults()
            : PlanReader.read(text, LocalDate.now()).faults();
    if (!faults.isEmpty()) {
      throw new ProblemException(Problem.faulty("The plan", faults));
    }
    return text;
  }

  static SavedPlan existing(PlanStore store, String id) {
    return store.find(id).orElseThrow(() -> gone(id));
  }

  static ProblemException gone(String id) {
    String shown = id.length() > 64 ? id.substring(0, 64) + "…" : id;
    return new ProblemException(
        Problem.notFound(
            "There is no plan called "
                + shown
                + " here. It may have been deleted; GET /api/plans lists what there is."));
  }
}
