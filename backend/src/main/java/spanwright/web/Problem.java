package spanwright.web;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import spanwright.plan.Fault;

/**
 * A problem document (RFC 9457).
 *
 * @param status HTTP status
 * @param kind one word for programs; the type is {@code urn:spanwright:problem:KIND}
 * @param title the kind in words, the same each time
 * @param detail this case: what, where, what to do
 * @param faults of a document sent, empty when it is not about one
 */
record Problem(int status, String kind, String title, String detail, List<Fault> faults) {
  /** A page cannot show more, and a broken plan can have a hundred thousand. */
  private static final int MOST_FAULTS = 200;

  Problem {
    faults = List.copyOf(faults);
  }

  static Problem of(int status, String kind, String title, String detail) {
    return new Problem(status, kind, title, detail, List.of());
  }

  static Problem notFound(String detail) {
    return of(404, "not-found", "Not found", detail);
  }

  static Problem badRequest(String detail) {
    return of(400, "bad-request", "Request not understood", detail);
  }

  static Problem badJson(Fault fault) {
    return new Problem(400, "not-json", "Not JSON", fault.sentence(), List.of(fault));
  }

  /** What was sent reads as JSON, but says something that cannot be. */
  static Problem faulty(String what, List<Fault> faults) {
    String first = faults.get(0).sentence();
    String more =
        switch (faults.size()) {
          case 1 -> "";
          case 2 -> " There is 1 more fault.";
          default -> " There are " + (faults.size() - 1) + " more faults.";
        };
    return new Problem(422, "faults", what + " has faults", first + more, faults);
  }

  static Problem tooLarge() {
    return of(
        413,
        "too-large",
        "Too large",
        "The body is larger than 8 MB. Make it smaller; a surveyed plot needs a few kilobytes.");
  }

  static Problem busy(String detail) {
    return of(429, "busy", "Too much at once", detail);
  }

  static Problem tooSlow(String detail) {
    return of(503, "too-slow", "Took too long", detail);
  }

  /** Something the program did not foresee; the reference is found again in the server's log. */
  static Problem unforeseen(String reference) {
    return of(
        500,
        "unforeseen",
        "Something went wrong inside",
        "The server met something it did not foresee. Nothing saved is lost. Try again; if it comes"
            + " back, report it with the reference "
            + reference
            + " and what you did.");
  }

  /** The document, in the order people read it. */
  Map<String, Object> document() {
    Map<String, Object> document = new LinkedHashMap<>();
    document.put("type", "urn:spanwright:problem:" + kind);
    document.put("title", title);
    document.put("status", status);
    document.put("detail", detail);
    if (!faults.isEmpty()) {
      document.put("faults", faults.subList(0, Math.min(MOST_FAULTS, faults.size())));
    }
    if (faults.size() > MOST_FAULTS) {
      document.put("faultsNotListed", faults.size() - MOST_FAULTS);
    }
    return document;
  }
}
