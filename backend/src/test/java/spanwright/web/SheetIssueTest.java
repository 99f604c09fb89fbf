package spanwright.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Collections;
import java.util.HashSet;
import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import spanwright.BrokenPlans;
import spanwright.plan.Json;
import spanwright.plan.Plan;
import spanwright.search.Result;
import spanwright.search.Search;
import spanwright.store.PlanStore;

/** Sheets handed out over HTTP, and what later ones say of it. */
class SheetIssueTest {
  private static final String JSON = "application/json";

  /** Finds two placements at once. */
  private static final class Quick extends Engine {
    @Override
    Result search(Plan plan, Search.Options options, Search.Listener listener) {
      return SomePlacements.result(plan, options, 2);
    }
  }

  @TempDir Path folder;
  private PlanStore store;
  private WebServer server;
  private Client client;
  private String plan;
  private String id;

  @BeforeEach
  void start() {
    store = PlanStore.open(folder);
    server = WebServer.start(new WebServer.Options("127.0.0.1", 0, store, "test"), new Quick());
    client = new Client(server);
    plan = client.post("/api/plans", BrokenPlans.SOUND, "Content-Type", JSON).header("Location");
    id = plan.substring(plan.lastIndexOf('/') + 1);
  }

  @AfterEach
  void stop() {
    server.close();
    store.close();
  }

  private Client.Answer post(String path, JsonNode body) {
    return client.post(path, body.toString(), "Content-Type", JSON);
  }

  /** A placement on the plan, with the first mast of that height. */
  private static ObjectNode sent(double highest) {
    try {
      ObjectNode body = Json.mapper().createObjectNode();
      ObjectNode tree = (ObjectNode) Json.mapper().readTree(BrokenPlans.SOUND);
      ((ObjectNode) tree.at("/supports/0")).put("highest", highest);
      body.set("plan", tree);
      body.set("placement", Json.mapper().valueToTree(SomePlacements.level(1)));
      return body;
    } catch (JsonProcessingException e) {
      throw new AssertionError(e);
    }
  }

  private static ObjectNode of(String search, String placement) {
    String searchId = search.substring(search.lastIndexOf('/') + 1);
    return Json.mapper().createObjectNode().put("search", searchId).put("placement", placement);
  }

  private String search() throws InterruptedException {
    String search = client.post(plan + "/searches", "", "Content-Type", JSON).header("Location");
    while (client.get(search).json().get("state").asText().equals("running")) {
      Thread.sleep(10);
    }
    return search;
  }

  private JsonNode head(ObjectNode body) {
    Client.Answer sheet = post("/api/sheet.json?saved=" + id, body);
    assertEquals(200, sheet.status(), sheet.body());
    return sheet.json().get("head");
  }

  private List<String> letters() {
    List<String> letters = new ArrayList<>();
    client.get(plan + "/issued").json().forEach(s -> letters.add(s.get("revision").asText()));
    return letters;
  }

  @Test
  void a_sheet_of_a_search_is_issued_once_and_says_so_from_then_on() throws Exception {
    String search = search();
    String sheet = search + "/placements/p01/sheet.json";
    JsonNode before = client.get(sheet).json().get("head");
    assertEquals("A", before.get("revision").asText());
    assertFalse(before.hasNonNull("date"));
    Client.Answer issued = post(plan + "/issued", of(search, "p01").put("revision", "A"));
    assertEquals(201, issued.status(), issued.body());
    String today = LocalDate.now().toString();
    assertEquals(today, issued.json().get("date").asText());
    assertTrue(issued.json().get("what").asText().startsWith("level, "), issued.body());
    JsonNode after = client.get(sheet).json().get("head");
    assertEquals("A", after.get("revision").asText());
    assertEquals(today, after.get("date").asText());
    assertEquals(200, post(plan + "/issued", of(search, "p01")).status());
    assertEquals(200, post(plan + "/issued", of(search, "p02")).status(), "says the same");
    assertEquals(List.of("A"), letters());
  }

  @Test
  void a_changed_survey_makes_the_next_revision_in_every_format() throws Exception {
    String search = search();
    assertEquals(201, post(plan + "/issued", of(search, "p01")).status());
    ObjectNode taller = sent(11);
    JsonNode head = head(taller);
    assertEquals("B", head.get("revision").asText());
    assertEquals("A", head.get("since").asText());
    assertFalse(head.hasNonNull("date"));
    assertEquals(1, head.get("changes").size(), head.toString());
    assertTrue(head.at("/changes/0").asText().endsWith(": changed."), head.toString());
    String change = head.at("/changes/0").asText();
    ((ObjectNode) taller.get("plan")).putObject("site").put("latitude", 51).put("longitude", -1);
    for (String type : List.of("csv", "json", "svg", "geojson")) {
      Client.Answer sheet = post("/api/sheet." + type + "?saved=" + id, taller);
      assertTrue(sheet.body().contains(change), type + " says what changed");
      assertEquals(
          "attachment; filename=\"sheet-p01-B." + type + "\"", sheet.header("Content-Disposition"));
    }
    assertEquals(200, post("/api/sheet.pdf?saved=" + id, taller).status());
    assertEquals("A", post("/api/sheet.json", taller).json().at("/head/revision").asText());
    assertEquals("A", head(sent(9)).get("revision").asText());
  }

  @Test
  void what_is_issued_is_what_was_looked_at() {
    assertEquals(201, post(plan + "/issued", sent(9).put("revision", "A")).status());
    assertEquals(201, post(plan + "/issued", sent(11).put("revision", "B")).status());
    Client.Answer late = post(plan + "/issued", sent(12).put("revision", "B"));
    assertEquals(409, late.status());
    assertEquals("urn:spanwright:problem:issued-meanwhile", late.json().get("type").asText());
    assertTrue(late.body().contains("would now be revision C"), late.body());
    assertEquals(List.of("A", "B"), letters());
    JsonNode head = head(sent(11));
    assertEquals("B", head.get("revision").asText());
    assertEquals("A", head.get("since").asText());
    assertEquals(201, post(plan + "/issued", sent(9).put("revision", "C")).status());
  }

  @Test
  void many_windows_at_once_never_give_one_letter_to_two_sheets() {
    List<String> given = Collections.synchronizedList(new ArrayList<>());
    IntStream.range(0, 12)
        .parallel()
        .forEach(
            i -> {
              Client.Answer answer = post(plan + "/issued", sent(9 + 0.1 * i));
              assertEquals(201, answer.status(), answer.body());
              given.add(answer.json().get("revision").asText());
            });
    assertEquals(12, new HashSet<>(given).size(), given.toString());
    assertEquals(
        IntStream.range(0, 12).mapToObj(i -> String.valueOf((char) ('A' + i))).toList(), letters());
  }

  @Test
  void a_restart_and_a_plan_brought_back_remember_what_was_issued() {
    assertEquals(201, post(plan + "/issued", sent(9)).status());
    server.close();
    store.close();
    store = PlanStore.open(folder);
    server = WebServer.start(new WebServer.Options("127.0.0.1", 0, store, "test"), new Quick());
    client = new Client(server);
    assertEquals(List.of("A"), letters());
    client.delete(plan, "If-Match", "*");
    assertEquals(404, client.get(plan + "/issued").status());
    plan =
        client
            .post("/api/plans?restores=" + id, BrokenPlans.SOUND, "Content-Type", JSON)
            .header("Location");
    assertFalse(plan.endsWith("/" + id));
    assertEquals(List.of("A"), letters());
    assertEquals("A", client.get(plan + "/issued").json().at("/0/revision").asText());
  }

  @Test
  void what_cannot_be_issued_is_refused_in_words() throws Exception {
    String search = search();
    assertEquals(404, post("/api/plans/none-1/issued", sent(9)).status());
    assertEquals(404, post("/api/sheet.json?saved=..%2Fnone", sent(9)).status());
    assertEquals(404, post(plan + "/issued", of(search, "p99")).status());
    assertEquals(404, post(plan + "/issued", of("x/unknown", "p01")).status());
    Client.Answer half = post(plan + "/issued", sent(9).without("placement"));
    assertEquals("placement", half.json().at("/faults/0/path").asText(), half.body());
    Client.Answer more = post(plan + "/issued", of(search, "p01").put("hurry", true));
    assertEquals("hurry", more.json().at("/faults/0/path").asText(), more.body());
    Client.Answer odd = post(plan + "/issued", sent(9).put("revision", 3));
    assertEquals("revision", odd.json().at("/faults/0/path").asText(), odd.body());
    String other =
        client.post("/api/plans", BrokenPlans.SOUND, "Content-Type", JSON).header("Location");
    Client.Answer foreign = post(other + "/issued", of(search, "p01"));
    assertEquals(422, foreign.status());
    assertTrue(foreign.body().contains("another plan"), foreign.body());
    assertEquals(List.of(), letters());
  }
}
