package spanwright.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import org.junit.jupiter.api.io.TempDir;
import spanwright.BrokenPlans;
import spanwright.store.PlanStore;

/** Plans over HTTP, on the really started server. */
class PlanRoutesTest {
  private static final String JSON = "application/json";
  private static final String BEGUN = "{\"format\":\"spanwright-plan/1\",\"title\":\"Begun\"}";

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

  private static Client.Answer create() {
    return client.post("/api/plans", BrokenPlans.SOUND, "Content-Type", JSON);
  }

  private static void assertProblem(Client.Answer answer, int status, String words) {
    assertEquals(status, answer.status(), answer.body());
    assertEquals("application/problem+json", answer.header("Content-Type"));
    JsonNode problem = answer.json();
    assertTrue(problem.get("type").asText().startsWith("urn:spanwright:problem:"));
    assertFalse(problem.get("title").asText().isBlank());
    assertEquals(status, problem.get("status").asInt());
    assertTrue(problem.get("detail").asText().contains(words), answer.body());
    assertFalse(BrokenPlans.namesInnards(answer.body()), answer.body());
  }

  @Test
  void a_plan_is_saved_at_an_address_and_read_back_as_it_was_sent() {
    Client.Answer created = create();
    assertEquals(201, created.status(), created.body());
    String id = created.json().get("id").asText();
    assertEquals("/api/plans/" + id, created.header("Location"));
    Client.Answer read = client.get(created.header("Location"));
    assertEquals(200, read.status());
    assertEquals(BrokenPlans.SOUND, read.body());
    assertEquals(created.header("ETag"), read.header("ETag"));
    assertEquals(
        304, client.get(created.header("Location"), "If-None-Match", read.header("ETag")).status());
  }

  @Test
  void the_list_tells_id_title_time_and_version() {
    Client.Answer created = create();
    String id = created.json().get("id").asText();
    for (JsonNode line : client.get("/api/plans").json()) {
      if (line.get("id").asText().equals(id)) {
        assertEquals("Test garden", line.get("title").asText());
        assertNotNull(java.time.Instant.parse(line.get("savedAt").asText()));
        assertEquals(created.header("ETag"), line.get("etag").asText());
        return;
      }
    }
    throw new AssertionError("not listed");
  }

  @Test
  void replacing_needs_the_version_and_gives_the_next() {
    Client.Answer created = create();
    String at = created.header("Location");
    assertProblem(client.put(at, BrokenPlans.SOUND, "Content-Type", JSON), 428, "If-Match");
    Client.Answer replaced =
        client.put(at, BrokenPlans.SOUND, "Content-Type", JSON, "If-Match", created.header("ETag"));
    assertEquals(200, replaced.status(), replaced.body());
    assertNotEquals(created.header("ETag"), replaced.header("ETag"));
    assertEquals(replaced.header("ETag"), client.get(at).header("ETag"));
  }

  @Test
  void the_loser_of_a_race_is_told_and_overwrites_nothing() {
    Client.Answer created = create();
    String at = created.header("Location");
    String seen = created.header("ETag");
    String first = BrokenPlans.SOUND.replace("Test garden", "First");
    client.put(at, first, "Content-Type", JSON, "If-Match", seen);
    Client.Answer late = client.put(at, BrokenPlans.SOUND, "Content-Type", JSON, "If-Match", seen);
    assertProblem(late, 412, "nothing was overwritten");
    assertProblem(client.delete(at, "If-Match", seen), 412, "saved since");
    assertEquals(first, client.get(at).body());
  }

  @Test
  void deleting_needs_the_version_too() {
    Client.Answer created = create();
    String at = created.header("Location");
    assertProblem(client.delete(at), 428, "If-Match");
    assertEquals(204, client.delete(at, "If-Match", created.header("ETag")).status());
    assertProblem(client.get(at), 404, "There is no plan called");
    assertProblem(client.delete(at, "If-Match", "*"), 404, "There is no plan called");
  }

  @Test
  void a_plan_only_begun_is_saved_as_a_draft_and_not_otherwise() {
    Client.Answer refused = client.post("/api/plans", BEGUN, "Content-Type", JSON);
    assertProblem(refused, 422, "");
    assertTrue(refused.json().get("faults").size() > 1);
    Client.Answer kept = client.post("/api/plans?draft=true", BEGUN, "Content-Type", JSON);
    assertEquals(201, kept.status(), kept.body());
    String at = kept.header("Location");
    Client.Answer saved =
        client.put(
            at + "?draft=true", BEGUN, "Content-Type", JSON, "If-Match", kept.header("ETag"));
    assertEquals(200, saved.status());
    assertProblem(client.post(at + "/searches", "{}", "Content-Type", JSON), 422, "");
  }

  @Test
  void a_draft_too_is_refused_for_syntax_types_and_unknown_fields() {
    String address = "/api/plans?draft=true";
    assertProblem(client.post(address, "{", "Content-Type", JSON), 400, "line 1");
    String typed = BEGUN.replace("\"Begun\"", "7");
    assertProblem(client.post(address, typed, "Content-Type", JSON), 422, "title");
    String unknown = BEGUN.replace("title", "titel");
    assertProblem(client.post(address, unknown, "Content-Type", JSON), 422, "titel");
    assertProblem(
        client.post("/api/plans?draft=perhaps", BEGUN, "Content-Type", JSON), 400, "draft");
  }

  @Test
  void checking_lists_every_fault_and_saves_nothing() throws IOException {
    long before = files();
    Client.Answer sound = client.post("/api/check", BrokenPlans.SOUND, "Content-Type", JSON);
    assertEquals(200, sound.status());
    assertEquals("{\"faults\":[]}", sound.body());
    Client.Answer begun = client.post("/api/check", BEGUN, "Content-Type", JSON);
    assertEquals(200, begun.status());
    assertTrue(begun.json().get("faults").size() > 1);
    assertTrue(begun.json().get("faults").get(0).has("path"));
    assertTrue(begun.json().get("faults").get(0).has("message"));
    assertEquals(before, files());
  }

  private static long files() throws IOException {
    try (Stream<Path> all = Files.list(folder)) {
      return all.count();
    }
  }

  @TestFactory
  Stream<DynamicTest> text_that_is_not_json_gets_400_with_its_place() {
    return BrokenPlans.syntax().entrySet().stream()
        .map(
            broken ->
                DynamicTest.dynamicTest(
                    broken.getKey(),
                    () -> {
                      Client.Answer answer =
                          client.post("/api/plans", broken.getValue(), "Content-Type", JSON);
                      String words = broken.getValue().isEmpty() ? "empty" : "line ";
                      assertProblem(answer, 400, words);
                      assertEquals(1, answer.json().get("faults").size());
                    }));
  }

  @TestFactory
  Stream<DynamicTest> a_plan_that_cannot_be_gets_422_with_its_faults() {
    return BrokenPlans.meaning().entrySet().stream()
        .map(
            broken ->
                DynamicTest.dynamicTest(
                    broken.getKey(),
                    () -> {
                      Client.Answer answer =
                          client.post("/api/plans", broken.getValue(), "Content-Type", JSON);
                      assertProblem(answer, 422, "");
                      assertTrue(answer.json().get("faults").size() > 0);
                    }));
  }

  @Test
  void bytes_that_are_not_utf_8_are_refused() throws IOException {
    String answer =
        client.raw(
            "POST /api/plans HTTP/1.1\r\nHost: 127.0.0.1:"
                + server.port()
                + "\r\nContent-Type: application/json\r\nContent-Length: 3\r\n"
                + "Connection: close\r\n\r\n\"\u00ff\"");
    assertTrue(answer.startsWith("HTTP/1.1 400"), answer);
    assertTrue(answer.contains("not UTF-8"), answer);
  }

  @Test
  void a_body_over_8_mb_is_refused_with_a_length_and_without() throws IOException {
    String large = "{\"notes\":\"" + "x".repeat(8 << 20) + "\"}";
    assertProblem(client.post("/api/plans", large, "Content-Type", JSON), 413, "8 MB");
    StringBuilder chunked = new StringBuilder();
    chunked.append("POST /api/check HTTP/1.1\r\nHost: localhost:").append(server.port());
    chunked.append("\r\nContent-Type: application/json\r\nConnection: close\r\n");
    chunked.append("Transfer-Encoding: chunked\r\n\r\n");
    String chunk = "10000\r\n" + "x".repeat(0x10000) + "\r\n";
    chunked.append(chunk.repeat(130)).append("0\r\n\r\n");
    String answer = client.raw(chunked.toString());
    assertTrue(answer.startsWith("HTTP/1.1 413"), answer.substring(0, 100));
  }

  @Test
  void a_form_is_not_json() {
    Client.Answer answer =
        client.post("/api/plans", "a=b", "Content-Type", "application/x-www-form-urlencoded");
    assertProblem(answer, 415, "Content-Type: application/json");
    assertEquals(
        201,
        client
            .post(
                "/api/plans", BrokenPlans.SOUND, "Content-Type", "application/json; charset=utf-8")
            .status());
  }

  @Test
  void a_plan_damaged_on_the_disk_is_set_aside_and_the_others_still_open() throws IOException {
    String hurt = create().json().get("id").asText();
    String whole = create().header("Location");
    Files.writeString(folder.resolve(hurt + ".json"), "{\"format\":");
    assertEquals(404, client.get("/api/plans/" + hurt).status());
    assertEquals(200, client.get(whole).status());
    assertEquals(200, client.get("/api/plans").status());
    assertTrue(client.get("/api/health").body().contains(hurt + ".damaged-"));
  }

  @Test
  void ids_from_outside_never_become_paths() throws IOException {
    Files.writeString(folder.resolveSibling("outside.json"), BEGUN);
    for (String id : new String[] {"..%2Foutside", "%2e%2e%5coutside", "a%00", "x".repeat(500)}) {
      int status = client.get("/api/plans/" + id).status();
      assertTrue(status == 404 || status == 400, id + " gave " + status);
    }
  }
}
