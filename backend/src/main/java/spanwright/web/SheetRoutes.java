package spanwright.web;

import com.fasterxml.jackson.databind.JsonNode;
import io.javalin.config.RoutesConfig;
import io.javalin.http.Context;
import java.nio.charset.StandardCharsets;
import java.time.Instant;
import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import spanwright.assess.Placement;
import spanwright.plan.Catalogues;
import spanwright.plan.Fault;
import spanwright.plan.Plan;
import spanwright.sheet.Issued;
import spanwright.sheet.NoCoordinatesException;
import spanwright.sheet.SheetModel;
import spanwright.sheet.SheetOptions;
import spanwright.sheet.Sheets;
import spanwright.store.PlanStore;

/** Sheets of placements, and which of them were issued. */
final class SheetRoutes {
  private static final DateTimeFormatter CLOCK =
      DateTimeFormatter.ofPattern("yyyy-MM-dd HH:mm").withZone(ZoneId.systemDefault());

  private static final Map<String, String> TYPES =
      Map.of(
          "csv", "text/csv; charset=utf-8",
          "json", "application/json",
          "pdf", "application/pdf",
          "svg", "image/svg+xml",
          "geojson", "application/geo+json");

  private final PlanStore store;
  private final Searches searches;
  private final Assessments assessments;
  private final IssuedSheets issued;

  SheetRoutes(PlanStore store, Searches searches, Assessments assessments) {
    this.store = store;
    this.searches = searches;
    this.assessments = assessments;
    this.issued = new IssuedSheets(store);
  }

  void install(RoutesConfig routes) {
    routes.get("/api/searches/{id}/placements/{placement}/sheet.{type}", this::ofSearch);
    routes.post("/api/sheet.{type}", this::ofBody);
    routes.get("/api/plans/{id}/issued", this::list);
    routes.post("/api/plans/{id}/issued", this::issue);
  }

  private void ofSearch(Context ctx) {
    String type = type(ctx);
    SearchJob job = SearchRoutes.existing(searches, ctx.pathParam("id"));
    Placement placement = found(job, ctx.pathParam("placement"));
    write(ctx, type, new Subject(job.plan(), placement, job), issued.of(job.planId()));
  }

  private static Placement found(SearchJob job, String id) {
    return job.placement(id)
        .orElseThrow(
            () ->
                new ProblemException(
                    Problem.notFound(
                        job.state() == SearchJob.State.RUNNING
                            ? "The search is still running. Its sheets are there when it is done."
                            : "The search has no placement of that id.")));
  }

  private void ofBody(Context ctx) {
    String type = type(ctx);
    String saved = ctx.queryParam("saved");
    List<Issued> before =
        saved == null ? List.of() : issued.of(PlanRoutes.existing(store, saved).id());
    AskedPlacement asked = AskedPlacement.of(Requests.tree(ctx), assessments);
    Placement placement = asked.whole();
    write(ctx, type, new Subject(asked.plan(), placement, madeFrom(ctx, asked.plan())), before);
  }

  /** The search a placement made by hand goes back to, if the server holds it and its plan. */
  private SearchJob madeFrom(Context ctx, Plan plan) {
    String id = ctx.queryParam("search");
    return id == null
        ? null
        : searches.find(id).filter(job -> job.plan().equals(plan)).orElse(null);
  }

  /**
   * What a sheet is of.
   *
   * @param job the search it goes back to, or null
   */
  private record Subject(Plan plan, Placement placement, SearchJob job) {
    SheetModel sheet(SheetOptions options, List<Issued> before) {
      List<Placement> others = job == null ? List.of() : job.placements();
      return Sheets.of(plan, Catalogues.standard(), placement, options, others, before);
    }
  }

  /** A sheet of the record as the list has it; {@code what} in metres, as the record keeps it. */
  private record Line(String revision, String date, String placement, String what) {
    static Line of(Issued sheet) {
      String what =
          sheet.facts().stream()
              .filter(fact -> fact.what().equals("Placement"))
              .findFirst()
              .map(Issued.Fact::value)
              .orElse("");
      return new Line(sheet.revision(), sheet.date(), sheet.placement(), what);
    }
  }

  private void list(Context ctx) {
    String id = PlanRoutes.existing(store, ctx.pathParam("id")).id();
    ctx.header("Cache-Control", "no-store");
    ctx.json(issued.of(id).stream().map(Line::of).toList());
  }

  private void issue(Context ctx) {
    String id = PlanRoutes.existing(store, ctx.pathParam("id")).id();
    JsonNode tree = Requests.tree(ctx);
    List<Fault> faults = new ArrayList<>();
    Form form = Form.of(tree, faults);
    String seen = form.has("revision") ? form.text("revision") : null;
    boolean held = form.has("search");
    String searchId = held ? form.text("search") : null;
    String placementId = held ? form.text("placement") : null;
    if (held) {
      form.finish();
    }
    AskedPlacement.require("The request", faults);
    Subject subject = held ? subject(id, searchId, placementId) : subject(tree);
    try {
      IssuedSheets.Outcome outcome =
          issued.issue(id, before -> subject.sheet(SheetOptions.standard(), before), seen);
      ctx.status(outcome.fresh() ? 201 : 200);
      ctx.json(Line.of(outcome.sheet()));
    } catch (IllegalArgumentException e) {
      throw AskedPlacement.senseless(e);
    }
  }

  private Subject subject(String planId, String searchId, String placementId) {
    SearchJob job = SearchRoutes.existing(searches, searchId);
    if (!job.planId().equals(planId)) {
      String other =
          "this search was made of another plan. Search this one, then issue a sheet of it.";
      AskedPlacement.require("The request", List.of(new Fault("search", other)));
    }
    return new Subject(job.plan(), found(job, placementId), job);
  }

  private Subject subject(JsonNode tree) {
    AskedPlacement asked = AskedPlacement.of(tree, assessments, "revision");
    return new Subject(asked.plan(), asked.whole(), null);
  }

  private static String type(Context ctx) {
    String type = ctx.pathParam("type");
    if (!TYPES.containsKey(type)) {
      throw new ProblemException(
          Problem.notFound("A sheet comes as sheet.pdf, .csv, .json, .svg or .geojson."));
    }
    return type;
  }

  private static void write(Context ctx, String type, Subject subject, List<Issued> before) {
    SearchJob job = subject.job();
    SheetOptions options = options(ctx, job == null ? null : job.savedAt());
    try {
      SheetModel model = subject.sheet(options, before);
      byte[] bytes = bytes(type, model);
      ctx.contentType(TYPES.get(type));
      ctx.header("Cache-Control", "no-store");
      ctx.header(
          "Content-Disposition", "attachment; filename=\"" + stem(model) + "." + type + "\"");
      ctx.result(bytes);
    } catch (NoCoordinatesException e) {
      throw new ProblemException(
          Problem.of(422, "no-coordinates", "No coordinates", e.getMessage()));
    } catch (IllegalArgumentException e) {
      throw AskedPlacement.senseless(e);
    }
  }

  private static SheetOptions options(Context ctx, Instant savedAt) {
    try {
      return SheetOptions.of(
          ctx.queryParam("paper"),
          ctx.queryParam("units"),
          savedAt == null ? null : CLOCK.format(savedAt));
    } catch (IllegalArgumentException e) {
      throw new ProblemException(Problem.badRequest(e.getMessage()));
    }
  }

  private static byte[] bytes(String type, SheetModel model) {
    return switch (type) {
      case "pdf" -> Sheets.toPdf(model);
      case "csv" -> Sheets.toCsv(model).getBytes(StandardCharsets.UTF_8);
      case "svg" -> Sheets.toSvg(model).getBytes(StandardCharsets.UTF_8);
      case "geojson" -> Sheets.toGeoJson(model).getBytes(StandardCharsets.UTF_8);
      default -> Sheets.toJson(model).getBytes(StandardCharsets.UTF_8);
    };
  }

  /** From revision B on the name carries the letter, so that no file is written over. */
  private static String stem(SheetModel model) {
    String plain = model.head().placement().replaceAll("[^A-Za-z0-9]+", "-");
    String revision = model.head().revision();
    return "sheet-"
        + plain.substring(0, Math.min(plain.length(), 20))
        + (revision.equals("A") ? "" : "-" + revision);
  }
}
