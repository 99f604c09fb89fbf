package spanwright.web;

import java.util.Map;

/** What every answer carries, the server's own error pages too. */
final class Headers {
  /**
   * Scripts and styles from this server's files alone, none written into a page or put together as
   * text. A traced picture is shown from {@code blob:} or {@code data:}.
   */
  private static final String POLICY =
      "default-src 'none'; script-src 'self'; style-src 'self'; font-src 'self'; connect-src 'self';"
          + " img-src 'self' data: blob:; manifest-src 'self'; base-uri 'none'; form-action 'none';"
          + " frame-ancestors 'none'";

  static final Map<String, String> ALWAYS =
      Map.of(
          "Content-Security-Policy", POLICY,
          "X-Content-Type-Options", "nosniff",
          "Referrer-Policy", "no-referrer",
          "Cross-Origin-Opener-Policy", "same-origin",
          "Cross-Origin-Resource-Policy", "same-origin");

  private Headers() {}
}
