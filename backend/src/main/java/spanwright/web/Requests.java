package spanwright.web;

import com.fasterxml.jackson.databind.JsonNode;
import io.javalin.http.Context;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.util.Arrays;
import java.util.Locale;
import java.util.Set;
import java.util.function.Predicate;

/** What requests have in common: bodies, preconditions, switches. */
final class Requests {
  static final int MOST_BYTES = 8 << 20;

  /** All of a body must be here within this time, however lively it drips. */
  private static final long SLOWEST_BODY_NANOS = 60_000_000_000L;

  /** Of a body that is too large, so much is still read and thrown away. */
  private static final long MOST_DISCARDED = 64 << 20;

  private static final int CHUNK = 64 << 10;

  private Requests() {}

  /** The body as text, which must be JSON and say so. */
  static String text(Context ctx) {
    requireJson(ctx);
    byte[] bytes = bytes(ctx);
    try {
      String text = JsonText.decode(bytes);
      JsonText.scan(text);
      return text;
    } catch (BadJson e) {
      throw new ProblemException(Problem.badJson(e.fault()));
    }
  }

  /** The body as a tree, which must be JSON and say so. */
  static JsonNode tree(Context ctx) {
    requireJson(ctx);
    return tree(bytes(ctx));
  }

  /** A body that was read already. */
  static JsonNode tree(byte[] bytes) {
    try {
      return JsonText.read(JsonText.decode(bytes));
    } catch (BadJson e) {
      throw new ProblemException(Problem.badJson(e.fault()));
    }
  }

  /** The body, bounded in size and time. */
  static byte[] bytes(Context ctx) {
    if (ctx.req().getContentLengthLong() > MOST_BYTES) {
      throw tooLarge(ctx);
    }
    long started = System.nanoTime();
    ByteArrayOutputStream all = new ByteArrayOutputStream();
    byte[] chunk = new byte[CHUNK];
    try {
      InputStream in = ctx.req().getInputStream();
      for (int n = in.read(chunk); n >= 0; n = in.read(chunk)) {
        all.write(chunk, 0, n);
        if (all.size() > MOST_BYTES) {
          throw tooLarge(ctx);
        }
        if (System.nanoTime() - started > SLOWEST_BODY_NANOS) {
          throw new ProblemException(Errors.unexpected(408));
        }
      }
      return all.toByteArray();
    } catch (IOException e) {
      throw new ProblemException(Problem.badRequest("The body broke off. Send it again."));
    }
  }

  /**
   * Lets the client finish sending, within bounds: one whose connection is closed while it still
   * sends sees a broken line and never the answer.
   */
  private static ProblemException tooLarge(Context ctx) {
    long started = System.nanoTime();
    byte[] chunk = new byte[CHUNK];
    long left = MOST_DISCARDED;
    try {
      InputStream in = ctx.req().getInputStream();
      for (int n = in.read(chunk); n >= 0 && left > 0; n = in.read(chunk)) {
        left -= n;
        if (System.nanoTime() - started > SLOWEST_BODY_NANOS / 6) {
          break;
        }
      }
    } catch (IOException e) {
      ctx.header("Connection", "close");
    }
    return new ProblemException(Problem.tooLarge());
  }

  static void requireJson(Context ctx) {
    String type = ctx.contentType();
    if (type == null) {
      return;
    }
    String plain = type.replaceFirst(";.*", "").strip().toLowerCase(Locale.ROOT);
    if (!plain.equals("application/json") && !plain.endsWith("+json")) {
      throw new ProblemException(
          Problem.of(
              415,
              "not-json-type",
              "Kind of content not accepted",
              "The body is said to be "
                  + plain
                  + ". Send JSON, with the header Content-Type: application/json."));
    }
  }

  /** The versions that {@code If-Match} accepts; 428 without the header. */
  static Predicate<String> ifMatch(Context ctx) {
    String header = ctx.header("If-Match");
    if (header == null || header.isBlank()) {
      throw new ProblemException(
          Problem.of(
              428,
              "no-version",
              "Version needed",
              "Say which version of the plan you mean: send its ETag in the header If-Match."));
    }
    return matches(header);
  }

  /** Whether the client has this version already. */
  static boolean hasAlready(Context ctx, String version) {
    String header = ctx.header("If-None-Match");
    return header != null && matches(header.replace("W/", "")).test(version);
  }

  private static Predicate<String> matches(String header) {
    Set<String> tags = Set.copyOf(Arrays.stream(header.split(",")).map(String::strip).toList());
    return version -> tags.contains("*") || tags.contains(etag(version)) || tags.contains(version);
  }

  static String etag(String version) {
    return "\"" + version + "\"";
  }

  /** A query switch: absent is false. */
  static boolean isOn(Context ctx, String name) {
    String value = ctx.queryParam(name);
    if (value == null || value.equals("false")) {
      return false;
    }
    if (value.equals("true")) {
      return true;
    }
    throw new ProblemException(
        Problem.badRequest("?" + name + "= takes true or false; remove it or say one of them."));
  }
}
