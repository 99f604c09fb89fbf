package spanwright.web;

import io.javalin.http.Context;
import io.javalin.http.HandlerType;
import io.javalin.http.HttpStatus;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.SecureRandom;
import java.util.Base64;
import java.util.HashSet;
import java.util.Locale;
import java.util.Set;
import java.util.function.IntSupplier;

/**
 * Who may come in. A browser sends requests for any page it shows; this is what keeps pages from
 * elsewhere out: they cannot put this server's name in {@code Host} (a name of theirs that resolves
 * to this machine stands there instead) nor hide theirs in {@code Origin}. Beyond loopback a token
 * is asked for as well.
 */
final class Gate {
  private static final Set<String> LOOPBACK = Set.of("127.0.0.1", "localhost", "[::1]");
  private static final Set<String> FOREIGN = Set.of("cross-site", "same-site");
  private static final int TOKEN_BYTES = 18;

  private final Set<String> names;
  private final IntSupplier port;
  private final String token;

  /**
   * Makes a gate.
   *
   * @param host the server was told to answer on
   * @param addresses further names this machine goes by, when it answers on all of them
   * @param loopback whether only this machine can reach it
   * @param port asked late, since port 0 is settled at the start
   */
  Gate(String host, Set<String> addresses, boolean loopback, IntSupplier port) {
    this.names = new HashSet<>(LOOPBACK);
    names.add(bracketed(host));
    addresses.forEach(address -> names.add(bracketed(address)));
    this.port = port;
    this.token = loopback ? null : newToken();
  }

  /** What requests must show, or null when the server answers on loopback alone. */
  String token() {
    return token;
  }

  /** As it stands in an address: small letters, IPv6 in brackets. */
  static String bracketed(String host) {
    String small = host.toLowerCase(Locale.ROOT);
    return small.contains(":") && !small.startsWith("[") ? "[" + small + "]" : small;
  }

  private static String newToken() {
    byte[] bytes = new byte[TOKEN_BYTES];
    new SecureRandom().nextBytes(bytes);
    return Base64.getUrlEncoder().withoutPadding().encodeToString(bytes);
  }

  /** Lets the request pass or ends it. */
  void check(Context ctx) {
    String host = ctx.header("Host");
    if (host == null || !isOurs(host)) {
      throw refused(
          "host-refused",
          "The request names another server than this one. Open the address that was printed when"
              + " the server started.");
    }
    String origin = ctx.header("Origin");
    boolean sameOrigin = origin == null || origin.equalsIgnoreCase("http://" + host);
    String site = ctx.header("Sec-Fetch-Site");
    boolean foreignCall = ctx.path().startsWith("/api") && site != null && FOREIGN.contains(site);
    if (!sameOrigin || foreignCall) {
      throw refused(
          "origin-refused",
          "The request comes from another page than this server's own. Only its own page may use"
              + " it from a browser.");
    }
    if (token != null) {
      checkToken(ctx);
    }
  }

  private boolean isOurs(String host) {
    String small = host.toLowerCase(Locale.ROOT);
    int colon = small.lastIndexOf(':');
    boolean hasPort = colon > small.lastIndexOf(']');
    String name = hasPort && colon >= 0 ? small.substring(0, colon) : small;
    String number = hasPort && colon >= 0 ? small.substring(colon + 1) : "80";
    return names.contains(name) && number.equals(Integer.toString(port.getAsInt()));
  }

  private void checkToken(Context ctx) {
    String cookieName = "spanwright-" + port.getAsInt();
    if (isToken(ctx.cookie(cookieName)) || isToken(bearer(ctx))) {
      return;
    }
    if (isToken(ctx.queryParam("token"))) {
      // From the address that was printed: kept as a cookie, so that it leaves the address bar.
      ctx.res()
          .addHeader(
              "Set-Cookie", cookieName + "=" + token + "; Path=/; HttpOnly; SameSite=Strict");
      if (ctx.method() == HandlerType.GET && !ctx.path().startsWith("/api")) {
        ctx.redirect(ctx.path(), HttpStatus.SEE_OTHER);
        ctx.skipRemainingHandlers();
      }
      return;
    }
    ctx.header("WWW-Authenticate", "Bearer");
    throw new ProblemException(
        Problem.of(
            401,
            "token-needed",
            "Token needed",
            "This server answers beyond its own machine and wants its token. Open the whole address"
                + " it printed at the start, with ?token=… at its end."));
  }

  private static String bearer(Context ctx) {
    String header = ctx.header("Authorization");
    return header != null && header.startsWith("Bearer ") ? header.substring(7).strip() : null;
  }

  /** In a time that does not tell how much of it was right. */
  private boolean isToken(String shown) {
    return shown != null
        && MessageDigest.isEqual(
            shown.getBytes(StandardCharsets.UTF_8), token.getBytes(StandardCharsets.UTF_8));
  }

  private static ProblemException refused(String kind, String detail) {
    return new ProblemException(Problem.of(403, kind, "Not let in", detail));
  }
}
