package spanwright.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import spanwright.BrokenPlans;
import spanwright.store.PlanStore;

/** Who is let in, and what every answer carries. */
class GateTest {
  @TempDir static Path folder;
  private static PlanStore store;
  private static WebServer server;
  private static Client client;

  @BeforeAll
  static void start() {
    store = PlanStore.open(folder);
    server = WebServer.start(new WebServer.Options("127.0.0.1", 0, store, "test"));
    client = new Client(server);
  }

  @AfterAll
  static void stop() {
    server.close();
    store.close();
  }

  private static String asking(String host) throws IOException {
    return client.raw(
        "GET /api/health HTTP/1.1\r\nHost: " + host + "\r\nConnection: close\r\n\r\n");
  }

  @Test
  void only_this_servers_own_names_are_answered() throws IOException {
    int port = server.port();
    for (String host : new String[] {"127.0.0.1", "localhost", "LOCALHOST", "[::1]"}) {
      assertTrue(asking(host + ":" + port).startsWith("HTTP/1.1 200"), host);
    }
    for (String host :
        new String[] {
          "evil.example",
          "evil.example:" + port,
          "127.0.0.1",
          "127.0.0.1:" + (port + 1),
          "127.0.0.1.evil.example:" + port,
          "localhost:80",
          "[::1",
          "0.0.0.0:" + port
        }) {
      String answer = asking(host);
      assertTrue(answer.matches("(?s)HTTP/1.1 (403|400).*"), host + " gave " + answer);
    }
    String none = client.raw("GET /api/health HTTP/1.0\r\n\r\n");
    assertTrue(none.contains(" 403 "), none);
  }

  @Test
  void a_page_from_elsewhere_is_kept_out() {
    String own = "http://127.0.0.1:" + server.port();
    assertEquals(200, client.get("/api/plans", "Origin", own).status());
    for (String origin :
        new String[] {
          "null",
          "http://evil.example",
          "https://127.0.0.1:" + server.port(),
          "http://127.0.0.1",
          "http://localhost:" + server.port(),
          own + ".evil.example",
          ""
        }) {
      Client.Answer answer = client.get("/api/plans", "Origin", origin);
      assertEquals(403, answer.status(), origin);
      assertEquals("application/problem+json", answer.header("Content-Type"));
      assertEquals(403, client.get("/", "Origin", origin).status(), origin);
    }
    assertEquals(403, client.get("/api/plans", "Sec-Fetch-Site", "cross-site").status());
    assertEquals(200, client.get("/api/plans", "Sec-Fetch-Site", "same-origin").status());
  }

  @Test
  void every_answer_carries_the_same_protection() throws IOException {
    for (String path : new String[] {"/", "/api/health", "/api/nothing", "/api/plans/x"}) {
      Client.Answer answer = client.get(path);
      String policy = answer.header("Content-Security-Policy");
      assertTrue(policy.startsWith("default-src 'none'"), path);
      assertFalse(policy.contains("unsafe"), path);
      assertEquals("nosniff", answer.header("X-Content-Type-Options"), path);
      assertEquals("no-referrer", answer.header("Referrer-Policy"), path);
    }
    String bad = client.raw("GET /../.. HTTP/1.1\r\nHost: localhost\r\nConnection: close\r\n\r\n");
    assertTrue(bad.startsWith("HTTP/1.1 400"), bad);
    assertTrue(bad.contains("Content-Security-Policy: default-src 'none'"), bad);
    assertTrue(bad.contains("application/problem+json"), bad);
    assertFalse(bad.toLowerCase(java.util.Locale.ROOT).contains("jetty"), bad);
  }

  @Test
  void garbage_for_a_request_gets_a_plain_400() throws IOException {
    for (String request :
        new String[] {"BLAH\r\n\r\n", "GET / HTTP/9.9\r\n\r\n", "\u0000\u0001\r\n\r\n"}) {
      String answer = client.raw(request);
      assertTrue(answer.matches("(?s)HTTP/1.1 (400|505|404).*"), answer);
      assertFalse(BrokenPlans.namesInnards(answer), answer);
    }
  }

  @Test
  void what_is_not_there_is_404_and_a_wrong_method_405_with_what_is_allowed() {
    Client.Answer nothing = client.get("/api/nothing");
    assertEquals(404, nothing.status());
    assertEquals("application/problem+json", nothing.header("Content-Type"));
    assertEquals(404, client.get("/nothing.js").status());
    Client.Answer wrong = client.post("/api/catalogue", "{}");
    assertEquals(405, wrong.status());
    assertTrue(wrong.header("Allow").contains("GET"), wrong.header("Allow"));
    assertEquals("application/problem+json", wrong.header("Content-Type"));
  }

  @Test
  void the_page_is_served_whole_and_never_from_a_cache() {
    Client.Answer page = client.get("/");
    assertEquals(200, page.status());
    assertTrue(page.header("Content-Type").startsWith("text/html"));
    assertEquals("no-store", page.header("Cache-Control"));
    Client.Answer script = client.get("/src/main.js");
    assertTrue(script.header("Content-Type").startsWith("text/javascript"));
    assertEquals("no-store", script.header("Cache-Control"));
  }

  @Test
  void beyond_loopback_every_request_needs_the_token() {
    WebServer open = WebServer.start(new WebServer.Options("0.0.0.0", 0, store, "test"));
    try {
      Client outside = new Client(open);
      String token = open.address().replaceFirst(".*token=", "");
      assertTrue(token.length() >= 20, open.address());
      for (String path : new String[] {"/", "/api/plans", "/src/main.js", "/api/nothing"}) {
        assertEquals(401, outside.get(path).status(), path);
        assertEquals(401, outside.get(path, "Authorization", "Bearer x" + token).status(), path);
      }
      assertEquals(200, outside.get("/api/plans", "Authorization", "Bearer " + token).status());
      Client.Answer first = outside.get("/?token=" + token);
      assertEquals(303, first.status());
      assertEquals("/", first.header("Location"));
      String cookie = first.header("Set-Cookie");
      assertTrue(cookie.contains("HttpOnly") && cookie.contains("SameSite=Strict"), cookie);
      String pair = cookie.substring(0, cookie.indexOf(';'));
      assertEquals(200, outside.get("/", "Cookie", pair).status());
      assertEquals(200, outside.get("/api/plans", "Cookie", pair).status());
      assertEquals(401, outside.get("/", "Cookie", pair + "x").status());
    } finally {
      open.close();
    }
  }

  @Test
  void a_taken_port_and_an_unknown_host_are_said_in_a_sentence() {
    ServerTrouble taken =
        assertThrows(
            ServerTrouble.class,
            () ->
                WebServer.start(new WebServer.Options("127.0.0.1", server.port(), store, "test")));
    assertTrue(taken.getMessage().startsWith("Port " + server.port() + " is taken"));
    ServerTrouble unknown =
        assertThrows(
            ServerTrouble.class,
            () -> WebServer.start(new WebServer.Options("no.such.invalid", 0, store, "test")));
    assertTrue(unknown.getMessage().startsWith("The host no.such.invalid is not known"));
    ServerTrouble foreign =
        assertThrows(
            ServerTrouble.class,
            () -> WebServer.start(new WebServer.Options("192.0.2.1", 0, store, "test")));
    assertTrue(foreign.getMessage().contains("cannot answer on 192.0.2.1"), foreign.getMessage());
  }
}
