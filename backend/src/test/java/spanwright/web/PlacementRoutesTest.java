package spanwright.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.nio.file.Path;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import spanwright.BrokenPlans;
import spanwright.assess.Assessor;
import spanwright.assess.Placement;
import spanwright.plan.Catalogues;
import spanwright.plan.Json;
import spanwright.plan.Plan;
import spanwright.rigging.Layout;
import spanwright.store.PlanStore;

/** Assessing and sheets over HTTP, and what else stands under {@code /api}. */
class PlacementRoutesTest {
  private static final String JSON = "application/json";

  /** Answers with a placement made by hand, or fails as the test says. */
  private static final class Quick extends Engine {
    final AtomicInteger prepared = new AtomicInteger();
    volatile RuntimeException fails;
    volatile Layout asked;

    @Override
    Assessor prepare(Plan plan) {
      prepared.incrementAndGet();
      return super.prepare(plan);
    }

    @Override
    Placement assess(Assessor assessor, Layout layout) {
      asked = layout;
      if (fails != null) {
        throw fails;
      }
      return SomePlacements.level(1);
    }
  }

  @TempDir static Path folder;
  private static PlanStore store;
  private static WebServer server;
  private static Client client;
  private static final Quick QUICK = new Quick();

  @BeforeAll
  static void start() {
    store = PlanStore.open(folder);
    server = WebServer.start(new WebServer.Options("127.0.0.1", 0, store, "test"), QUICK);
    client = new Client(server);
  }

  @AfterAll
  static void stop() {
    server.close();
    store.close();
  }

  @BeforeEach
  void mend() {
    QUICK.fails = null;
  }

  private static ObjectNode asked() {
    try {
      ObjectNode body = Json.mapper().createObjectNode();
      body.set("plan", Json.mapper().readTree(BrokenPlans.SOUND));
      body.set("placement", Json.mapper().valueToTree(SomePlacements.level(1)));
      return body;
    } catch (JsonProcessingException e) {
      throw new AssertionError(e);
    }
  }

  private static Client.Answer post(String path, JsonNode body) {
    return client.post(path, body.toString(), "Content-Type", JSON);
  }

  private static void assertFault(Client.Answer answer, String path) {
    assertEquals(422, answer.status(), answer.body());
    assertEquals(path, answer.json().at("/faults/0/path").asText(), answer.body());
    assertFalse(BrokenPlans.namesInnards(answer.body()), answer.body());
  }

  @Test
  void a_placement_is_assessed_by_its_geometry() {
    Client.Answer answer = post("/api/assess", asked());
    assertEquals(200, answer.status(), answer.body());
    assertEquals("level", answer.json().get("shape").asText());
    assertEquals("west", QUICK.asked.attachments().get(0).on());
  }

  @Test
  void the_same_plan_is_prepared_once_while_an_end_is_dragged() {
    ObjectNode body = asked();
    ((ObjectNode) body.get("plan")).put("title", "Dragged");
    int before = QUICK.prepared.get();
    for (int i = 0; i < 5; i++) {
      assertEquals(200, post("/api/assess", body).status());
    }
    assertEquals(before + 1, QUICK.prepared.get());
  }

  @Test
  void faults_of_plan_and_placement_have_their_paths_in_the_body() {
    assertFault(post("/api/assess", Json.mapper().createObjectNode()), "plan");
    ObjectNode more = asked();
    more.put("hurry", true);
    assertFault(post("/api/assess", more), "hurry");
    ObjectNode plan = asked();
    ((ObjectNode) plan.at("/plan/supports/0")).put("lowest", "low");
    assertFault(post("/api/assess", plan), "plan.supports[0].lowest");
    ObjectNode placement = asked();
    ((ObjectNode) placement.at("/placement/attachments/1")).put("on", "moon");
    assertFault(post("/api/assess", placement), "placement.attachments[1].on");
    assertEquals(400, client.post("/api/assess", "{", "Content-Type", JSON).status());
  }

  @Test
  void what_the_reckoning_refuses_is_bad_input_and_what_it_did_not_foresee_is_not() {
    QUICK.fails = new IllegalArgumentException("The wire is longer than the plot. Shorten it.");
    Client.Answer refused = post("/api/assess", asked());
    assertFault(refused, "placement");
    assertTrue(refused.body().contains("Shorten it."), refused.body());
    QUICK.fails = new IndexOutOfBoundsException("Index 3 out of bounds for length 3");
    Client.Answer unforeseen = post("/api/assess", asked());
    assertEquals(500, unforeseen.status());
    assertFalse(unforeseen.body().contains("Index"), unforeseen.body());
    assertFalse(BrokenPlans.namesInnards(unforeseen.body()), unforeseen.body());
  }

  @Test
  void a_sheet_comes_in_every_format() {
    for (String[] each :
        new String[][] {
          {"pdf", "application/pdf", "%PDF-"},
          {"csv", "text/csv", ""},
          {"json", "application/json", "{"},
          {"svg", "image/svg+xml", "<"}
        }) {
      Client.Answer sheet = post("/api/sheet." + each[0] + "?paper=Letter&units=ft", asked());
      assertEquals(200, sheet.status(), sheet.body());
      assertTrue(sheet.header("Content-Type").startsWith(each[1]), sheet.header("Content-Type"));
      assertTrue(sheet.body().startsWith(each[2]), each[0]);
      assertEquals(
          "attachment; filename=\"sheet-p01." + each[0] + "\"",
          sheet.header("Content-Disposition"));
    }
  }

  @Test
  void geojson_needs_coordinates() {
    Client.Answer none = post("/api/sheet.geojson", asked());
    assertEquals(422, none.status());
    assertEquals("urn:spanwright:problem:no-coordinates", none.json().get("type").asText());
    ObjectNode placed = asked();
    ((ObjectNode) placed.get("plan")).putObject("site").put("latitude", 51).put("longitude", -1);
    Client.Answer sheet = post("/api/sheet.geojson", placed);
    assertEquals(200, sheet.status(), sheet.body());
    assertEquals("FeatureCollection", sheet.json().get("type").asText());
  }

  @Test
  void a_sheet_asked_for_wrongly_is_refused_in_words() {
    assertEquals(404, post("/api/sheet.docx", asked()).status());
    Client.Answer paper = post("/api/sheet.pdf?paper=A0", asked());
    assertEquals(400, paper.status());
    assertTrue(paper.body().contains("A4 or Letter"), paper.body());
    ObjectNode half = asked();
    ((ObjectNode) half.get("placement")).remove("spans");
    assertFault(post("/api/sheet.pdf", half), "placement.spans");
    String huge = asked().toString().replace("\"sag\":0.2", "\"sag\":1e999");
    assertFault(
        client.post("/api/sheet.pdf", huge, "Content-Type", JSON), "placement.spans[0].sag");
  }

  @Test
  void catalogue_demos_and_health_are_there() {
    assertTrue(client.get("/api/catalogue").json().get("wires").size() > 3);
    JsonNode demos = client.get("/api/demos").json();
    assertTrue(demos.size() >= 3);
    for (JsonNode demo : demos) {
      assertFalse(demo.get("title").asText().isBlank());
      Client.Answer plan = client.get("/api/demos/" + demo.get("name").asText());
      assertEquals(200, plan.status());
      Client.Answer check = client.post("/api/check", plan.body(), "Content-Type", JSON);
      assertEquals("{\"faults\":[]}", check.body());
    }
    assertEquals(404, client.get("/api/demos/none").status());
    JsonNode health = client.get("/api/health").json();
    assertEquals("ok", health.get("status").asText());
    assertEquals("test", health.get("version").asText());
    assertEquals(
        Catalogues.standard().rules().size(),
        client.get("/api/catalogue").json().get("rules").size());
  }

  @Test
  void many_at_once_are_all_answered() throws Exception {
    CountDownLatch done = new CountDownLatch(60);
    AtomicInteger bad = new AtomicInteger();
    for (int i = 0; i < 60; i++) {
      boolean assess = i % 3 == 0;
      new Thread(
              () -> {
                int status =
                    assess
                        ? post("/api/assess", asked()).status()
                        : client.get("/api/demos").status();
                bad.addAndGet(status == 200 ? 0 : 1);
                done.countDown();
              })
          .start();
    }
    done.await();
    assertEquals(0, bad.get());
  }
}
