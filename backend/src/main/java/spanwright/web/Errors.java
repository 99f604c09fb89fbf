package spanwright.web;

import com.fasterxml.jackson.core.JsonProcessingException;
import io.javalin.config.JavalinConfig;
import io.javalin.http.Context;
import io.javalin.http.HttpResponseException;
import java.io.IOException;
import java.util.UUID;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import spanwright.plan.Json;
import spanwright.store.StaleVersion;
import spanwright.store.StoreTrouble;

/** Turns whatever ends a request into a problem document. */
final class Errors {
  private static final Logger LOG = LoggerFactory.getLogger("spanwright");

  private Errors() {}

  static void install(JavalinConfig cfg) {
    cfg.routes.exception(ProblemException.class, (e, ctx) -> write(ctx, e.problem()));
    cfg.routes.exception(StaleVersion.class, (e, ctx) -> write(ctx, stale(e)));
    cfg.routes.exception(StoreTrouble.class, (e, ctx) -> write(ctx, disk(e)));
    cfg.routes.exception(HttpResponseException.class, (e, ctx) -> write(ctx, http(ctx, e)));
    cfg.routes.exception(Exception.class, (e, ctx) -> write(ctx, unforeseen(e)));
    cfg.router.javaLangErrorHandler(
        (response, error) -> {
          byte[] bytes = bytes(unforeseen(error));
          response.setStatus(500);
          response.setContentType("application/problem+json");
          try {
            response.getOutputStream().write(bytes);
          } catch (IOException e) {
            LOG.debug("the client left", e);
          }
        });
  }

  static void write(Context ctx, Problem problem) {
    ctx.status(problem.status());
    ctx.contentType("application/problem+json");
    ctx.header("Cache-Control", "no-store");
    if (problem.status() == 429 || problem.status() == 503) {
      ctx.header("Retry-After", "5");
    }
    ctx.result(bytes(problem));
  }

  static byte[] bytes(Problem problem) {
    try {
      return Json.mapper().writeValueAsBytes(problem.document());
    } catch (JsonProcessingException e) {
      throw new IllegalStateException("a problem document is always JSON", e);
    }
  }

  /** The log has the whole of it under the reference that the client is told. */
  static Problem unforeseen(Throwable e) {
    String reference = UUID.randomUUID().toString().substring(0, 8);
    LOG.error("unforeseen, reference {}: {}", reference, e.toString());
    LOG.debug("reference {}", reference, e);
    return Problem.unforeseen(reference);
  }

  private static Problem stale(StaleVersion e) {
    return Problem.of(
        412,
        "stale-version",
        "Saved by another meanwhile",
        e.getMessage() + " Read it again, then bring your changes over; nothing was overwritten.");
  }

  private static Problem disk(StoreTrouble e) {
    return Problem.of(500, "disk", "The disk refused", e.getMessage());
  }

  private static Problem http(Context ctx, HttpResponseException e) {
    boolean isPage = e.getStatus() == 404 && StaticPages.has(ctx.path());
    if (isPage || e.getStatus() == 405) {
      String allowed = e.getDetails().get("availableMethods");
      ctx.header("Allow", isPage || allowed == null ? "GET, HEAD" : allowed);
    }
    return switch (isPage ? 405 : e.getStatus()) {
      case 404 ->
          Problem.notFound(
              "There is nothing at "
                  + shown(ctx.path())
                  + ". Check the address for a typing error.");
      case 405 ->
          Problem.of(
              405,
              "method",
              "Method not allowed",
              ctx.method()
                  + " cannot be used on "
                  + shown(ctx.path())
                  + "; the header Allow lists what can.");
      case 413 -> Problem.tooLarge();
      default -> unexpected(e.getStatus());
    };
  }

  /** Errors met before a request reaches a route, and rare ones of the server itself. */
  static Problem unexpected(int status) {
    if (status >= 500) {
      return Problem.of(status, "server", "The server could not answer", "Try again in a moment.");
    }
    return switch (status) {
      case 404 -> Problem.notFound("There is nothing at that address.");
      case 408 -> Problem.of(408, "too-slow", "Took too long", "The request came in too slowly.");
      case 414, 431 ->
          Problem.of(status, "too-large", "Too large", "The address or a header is too long.");
      default ->
          Problem.of(
              status,
              "bad-request",
              "Request not understood",
              "The request is not HTTP as this server speaks it. Check its address and headers.");
    };
  }

  private static String shown(String path) {
    return path.length() > 80 ? path.substring(0, 80) + "…" : path;
  }
}
