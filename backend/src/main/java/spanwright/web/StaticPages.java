package spanwright.web;

import io.javalin.http.Context;
import io.javalin.http.HandlerType;
import io.javalin.http.staticfiles.ResourceHandler;
import io.javalin.http.staticfiles.StaticFileConfig;
import io.javalin.security.RouteRole;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.net.URL;
import java.util.Map;
import java.util.Set;
import java.util.regex.Pattern;

/**
 * The page's files, from {@code /web} on the class path: a folder while building, the jar
 * afterwards. Only kinds that a page consists of are handed out, never with a cache: two builds may
 * give a file the same length and time.
 */
final class StaticPages implements ResourceHandler {
  private static final Pattern SOUND = Pattern.compile("(/[A-Za-z0-9_][A-Za-z0-9._-]*)+");
  private static final Map<String, String> TYPES =
      Map.of(
          "html", "text/html; charset=utf-8",
          "js", "text/javascript; charset=utf-8",
          "css", "text/css; charset=utf-8",
          "svg", "image/svg+xml",
          "png", "image/png",
          "ico", "image/x-icon",
          "json", "application/json",
          "webmanifest", "application/manifest+json",
          "woff2", "font/woff2");

  @Override
  public boolean canHandle(Context ctx) {
    boolean reads = ctx.method() == HandlerType.GET || ctx.method() == HandlerType.HEAD;
    return reads && find(ctx.path()) != null;
  }

  @Override
  public boolean handle(Context ctx) {
    String name = name(ctx.path());
    URL url = find(ctx.path());
    if (url == null) {
      return false;
    }
    try (InputStream in = url.openStream()) {
      ctx.result(in.readAllBytes());
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    ctx.contentType(TYPES.get(ending(name)));
    ctx.header("Cache-Control", "no-store");
    return true;
  }

  @Override
  public boolean addStaticFileConfig(StaticFileConfig config) {
    return false;
  }

  @Override
  public Set<RouteRole> resourceRouteRoles(Context ctx) {
    return Set.of();
  }

  /** Whether there is a file of the page at that path. */
  static boolean has(String path) {
    return find(path) != null;
  }

  private static String name(String path) {
    return path.equals("/") ? "/index.html" : path;
  }

  private static URL find(String path) {
    String name = name(path);
    boolean sound =
        SOUND.matcher(name).matches() && !name.startsWith("/api/") && !name.contains("..");
    return sound && TYPES.containsKey(ending(name))
        ? StaticPages.class.getResource("/web" + name)
        : null;
  }

  private static String ending(String name) {
    return name.substring(name.lastIndexOf('.') + 1);
  }
}
