package spanwright.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;
import spanwright.BrokenPlans;
import spanwright.plan.Json;
import spanwright.store.PlanStore;

/** The whole job over HTTP with nothing put in anything's place: save, search, move, sheet. */
class WholeJobTest {
  private static final String JSON = "application/json";

  @TempDir Path folder;

  @Test
  @Timeout(120)
  void a_saved_plan_is_searched_a_wire_moved_and_its_sheet_fetched() throws Exception {
    try (PlanStore store = PlanStore.open(folder);
        WebServer server = WebServer.start(new WebServer.Options("127.0.0.1", 0, store, "test"))) {
      Client client = new Client(server);
      String plan =
          client.post("/api/plans", BrokenPlans.SOUND, "Content-Type", JSON).header("Location");
      String search =
          client
              .post(plan + "/searches", "{\"effort\":\"quick\",\"top\":4}", "Content-Type", JSON)
              .header("Location");
      String events = client.get(search + "/events").body();
      assertTrue(events.contains("event: progress"), events);
      assertTrue(events.contains("event: found"), events);
      assertTrue(events.contains("event: done"), events);
      JsonNode done = client.get(search).json();
      assertEquals("done", done.get("state").asText());
      JsonNode placements = done.at("/result/placements");
      assertTrue(placements.size() >= 1 && placements.size() <= 4, "" + placements.size());
      assertEquals(List.of(), Finite.faults(done));

      String id = placements.get(0).get("id").asText();
      Client.Answer sheet = client.get(search + "/placements/" + id + "/sheet.csv");
      assertEquals(200, sheet.status(), sheet.body());
      assertTrue(sheet.body().contains("west") || sheet.body().contains("east"), sheet.body());
      Client.Answer pdf = client.get(search + "/placements/" + id + "/sheet.pdf?paper=Letter");
      assertEquals(200, pdf.status());
      assertEquals(404, client.get(search + "/placements/p99/sheet.csv").status());

      ObjectNode body = Json.mapper().createObjectNode();
      body.set("plan", Json.mapper().readTree(BrokenPlans.SOUND));
      ObjectNode moved = placements.get(0).deepCopy();
      body.set("placement", moved);
      double score = assessed(client, body).get("score").asDouble();
      assertEquals(placements.get(0).get("score").asDouble(), score, 0.05);
      ArrayNode at = (ArrayNode) moved.at("/attachments/0/at");
      at.set(2, at.get(2).asDouble() - 1);
      JsonNode lower = assessed(client, body);
      assertEquals(at.get(2).asDouble(), lower.at("/attachments/0/at/2").asDouble(), 1e-6);
      body.set("placement", lower);
      assertEquals(
          200, client.post("/api/sheet.svg", body.toString(), "Content-Type", JSON).status());
    }
  }

  private static JsonNode assessed(Client client, ObjectNode body) {
    Client.Answer answer = client.post("/api/assess", body.toString(), "Content-Type", JSON);
    assertEquals(200, answer.status(), answer.body());
    return answer.json();
  }
}
