package spanwright.web;

import com.fasterxml.jackson.databind.JsonNode;
import io.javalin.config.RoutesConfig;
import io.javalin.http.Context;
import java.nio.charset.StandardCharsets;
import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import spanwright.assess.Placement;
import spanwright.plan.Catalogues;
import spanwright.plan.Fault;
import spanwright.plan.Plan;
import spanwright.plan.PlanReader;
import spanwright.rigging.Layout;
import spanwright.sheet.NoCoordinatesException;
import spanwright.sheet.SheetModel;
import spanwright.sheet.SheetOptions;
import spanwright.sheet.Sheets;

/** One placement: assessed, and as a sheet. */
final class PlacementRoutes {
  private static final DateTimeFormatter CLOCK =
      DateTimeFormatter.ofPattern("yyyy-MM-dd HH:mm").withZone(ZoneId.systemDefault());

  private static final Map<String, String> TYPES =
      Map.of(
          "csv", "text/csv; charset=utf-8",
          "json", "application/json",
          "pdf", "application/pdf",
          "svg", "image/svg+xml",
          "geojson", "application/geo+json");

  private final Searches searches;
  private final Assessments assessments;

  PlacementRoutes(Searches searches, Assessments assessments) {
    this.searches = searches;
    this.assessments = assessments;
  }

  void install(RoutesConfig routes) {
    routes.post("/api/assess", this::assess);
    routes.get("/api/searches/{id}/placements/{placement}/sheet.{type}", this::sheetOfSearch);
    routes.post("/api/sheet.{type}", this::sheetOfBody);
  }

  /** A plan and a placement on it, as both routes with a body take them. */
  private record Asked(String text, Plan plan, JsonNode placement, PlacementReader reader) {}

  private Asked asked(Context ctx) {
    List<Fault> faults = new ArrayList<>();
    JsonNode tree = Requests.tree(ctx);
    Form form = Form.of(tree, faults);
    form.form("plan");
    form.form("placement");
    form.finish();
    require("The request", faults);
    String text = tree.get("plan").toString();
    Plan known = assessments.known(text);
    if (known != null) {
      return new Asked(
          text, known, tree.get("placement"), new PlacementReader(known, Catalogues.standard()));
    }
    PlanReader.Outcome outcome = PlanReader.read(text, LocalDate.now());
    for (Fault fault : outcome.faults()) {
      String path = fault.path().isEmpty() ? "plan" : "plan." + fault.path();
      faults.add(new Fault(path, fault.message()));
    }
    require("The plan", faults);
    Plan plan = outcome.plan();
    return new Asked(
        text, plan, tree.get("placement"), new PlacementReader(plan, Catalogues.standard()));
  }

  private static void require(String what, List<Fault> faults) {
    if (!faults.isEmpty()) {
      throw new ProblemException(Problem.faulty(what, faults));
    }
  }

  private void assess(Context ctx) {
    Asked asked = asked(ctx);
    List<Fault> faults = new ArrayList<>();
    Layout layout = asked.reader().layout(asked.placement(), "placement", faults);
    require("The placement", faults);
    try {
      ctx.json(Finite.tree(assessments.assess(asked.text(), asked.plan(), layout)));
    } catch (IllegalArgumentException e) {
      throw senseless(e);
    }
  }

  /** What the reckoning refuses is bad input, if the sentence is our own. */
  private static RuntimeException senseless(IllegalArgumentException e) {
    boolean ours =
        e.getClass() == IllegalArgumentException.class
            || e.getClass().getName().startsWith("spanwright.");
    return ours
        ? new ProblemException(
            Problem.faulty("The placement", List.of(new Fault("placement", e.getMessage()))))
        : e;
  }

  private void sheetOfSearch(Context ctx) {
    String type = type(ctx);
    SearchJob job = SearchRoutes.existing(searches, ctx.pathParam("id"));
    String id = ctx.pathParam("placement");
    Placement placement =
        job.placement(id)
            .orElseThrow(
                () ->
                    new ProblemException(
                        Problem.notFound(
                            job.state() == SearchJob.State.RUNNING
                                ? "The search is still running. Its sheets are there when it is"
                                    + " done."
                                : "The search has no placement of that id.")));
    write(ctx, type, job.plan(), placement, job);
  }

  private void sheetOfBody(Context ctx) {
    String type = type(ctx);
    Asked asked = asked(ctx);
    List<Fault> faults = new ArrayList<>();
    Placement placement = asked.reader().whole(asked.placement(), "placement", faults);
    require("The placement", faults);
    write(ctx, type, asked.plan(), placement, madeFrom(ctx, asked.plan()));
  }

  /** The search a placement made by hand goes back to, if the server holds it and its plan. */
  private SearchJob madeFrom(Context ctx, Plan plan) {
    String id = ctx.queryParam("search");
    return id == null
        ? null
        : searches.find(id).filter(job -> job.plan().equals(plan)).orElse(null);
  }

  private static String type(Context ctx) {
    String type = ctx.pathParam("type");
    if (!TYPES.containsKey(type)) {
      throw new ProblemException(
          Problem.notFound("A sheet comes as sheet.pdf, .csv, .json, .svg or .geojson."));
    }
    return type;
  }

  private static void write(
      Context ctx, String type, Plan plan, Placement placement, SearchJob job) {
    SheetOptions options = options(ctx, job == null ? null : job.savedAt());
    List<Placement> others = job == null ? List.of() : job.placements();
    try {
      SheetModel model =
          Sheets.of(plan, Catalogues.standard(), placement, options, others, List.of());
      byte[] bytes = bytes(type, model);
      ctx.contentType(TYPES.get(type));
      ctx.header("Cache-Control", "no-store");
      ctx.header(
          "Content-Disposition",
          "attachment; filename=\"sheet-" + safe(placement.id()) + "." + type + "\"");
      ctx.result(bytes);
    } catch (NoCoordinatesException e) {
      throw new ProblemException(
          Problem.of(422, "no-coordinates", "No coordinates", e.getMessage()));
    } catch (IllegalArgumentException e) {
      throw senseless(e);
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

  private static String safe(String id) {
    String plain = id.replaceAll("[^A-Za-z0-9]+", "-");
    return plain.substring(0, Math.min(plain.length(), 20));
  }
}
