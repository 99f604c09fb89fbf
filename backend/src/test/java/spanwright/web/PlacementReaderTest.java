package spanwright.web;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import org.junit.jupiter.api.Test;
import spanwright.BrokenPlans;
import spanwright.plan.Catalogues;
import spanwright.plan.Fault;
import spanwright.plan.Json;
import spanwright.plan.Plan;
import spanwright.plan.PlanReader;
import spanwright.rigging.Layout;

/** What is read of a placement, and what is refused. */
class PlacementReaderTest {
  private final Plan plan = PlanReader.read(BrokenPlans.SOUND).plan();
  private final PlacementReader reader = new PlacementReader(plan, Catalogues.standard());
  private final List<Fault> faults = new ArrayList<>();

  private static ObjectNode element() {
    ObjectNode node = Json.mapper().valueToTree(SomePlacements.level(1));
    return node;
  }

  @Test
  void a_layout_is_shape_attachments_conductors_and_feed_and_the_rest_is_let_through() {
    ObjectNode node = element();
    node.put("something", "from a newer version");
    Layout layout = reader.layout(node, "", faults);
    assertEquals(List.of(), faults);
    assertEquals("level", layout.shape());
    assertEquals("east", layout.attachments().get(1).on());
    assertEquals(9, layout.attachments().get(1).at().z());
    assertEquals(2, layout.conductors().get(0).points().size());
    assertEquals(0.5, layout.feed().fraction());
    assertEquals(15.0, layout.feed().lineLength());
  }

  @Test
  void a_layout_needs_nothing_but_its_geometry() {
    ObjectNode node = element();
    node.retain("shape", "attachments", "conductors", "feed");
    ((ObjectNode) node.get("feed")).retain("conductor", "fraction");
    Layout layout = reader.layout(node, "", faults);
    assertEquals(List.of(), faults);
    assertEquals(null, layout.feed().line());
    assertEquals(null, layout.feed().lineLength());
  }

  private void assertFault(String path, Consumer<ObjectNode> breaking) {
    faults.clear();
    ObjectNode node = element();
    breaking.accept(node);
    reader.layout(node, "placement", faults);
    assertTrue(
        faults.stream().anyMatch(fault -> fault.path().startsWith(path)), path + ": " + faults);
    for (Fault fault : faults) {
      assertFalse(BrokenPlans.namesInnards(fault.sentence()), fault.sentence());
    }
  }

  @Test
  void every_fault_has_its_path() {
    assertFault("placement.shape", node -> node.put("shape", "spiral"));
    assertFault("placement.shape", node -> node.remove("shape"));
    assertFault("placement.attachments", node -> node.putArray("attachments"));
    assertFault("placement.attachments", node -> node.put("attachments", 3));
    assertFault(
        "placement.attachments[0].on", node -> at(node, "/attachments/0").put("on", "moon"));
    assertFault("placement.attachments[0].at", node -> at(node, "/attachments/0").put("at", 1));
    assertFault(
        "placement.attachments[0].at[2]",
        node -> at(node, "/attachments/0").putArray("at").add(1).add(2).add(1e99));
    assertFault(
        "placement.conductors[0].wire", node -> at(node, "/conductors/0").put("wire", "string"));
    assertFault(
        "placement.conductors[0].points", node -> at(node, "/conductors/0").putArray("points"));
    assertFault("placement.feed.conductor", node -> at(node, "/feed").put("conductor", 1));
    assertFault("placement.feed.conductor", node -> at(node, "/feed").put("conductor", -1));
    assertFault("placement.feed.fraction", node -> at(node, "/feed").put("fraction", 1.5));
    assertFault("placement.feed.line", node -> at(node, "/feed").put("line", "hose"));
    assertFault("placement.feed", node -> node.remove("feed"));
    assertFault("placement.feed", node -> node.put("feed", "middle"));
  }

  private static ObjectNode at(JsonNode node, String path) {
    return (ObjectNode) node.at(path);
  }

  @Test
  void a_whole_placement_comes_back_as_it_was_written() {
    ObjectNode node = element();
    var placement = reader.whole(node, "", faults);
    assertEquals(List.of(), faults);
    assertEquals(node, Json.mapper().valueToTree(placement));
  }

  @Test
  void what_a_sheet_needs_and_a_result_lacks_is_named() {
    for (String path :
        new String[] {
          "/spans",
          "/clearances/0/at",
          "/attachments/0/held",
          "/feed/path",
          "/state",
          "/scoreParts",
          "/conductors/0/length",
          "/spans/0/points"
        }) {
      faults.clear();
      ObjectNode node = element();
      int cut = path.lastIndexOf('/');
      at(node, path.substring(0, cut)).remove(path.substring(cut + 1));
      reader.whole(node, "placements[0]", faults);
      assertEquals(1, faults.size(), path + ": " + faults);
      assertTrue(faults.get(0).path().startsWith("placements[0]"), faults.toString());
      assertFalse(BrokenPlans.namesInnards(faults.get(0).sentence()), faults.toString());
    }
  }

  @Test
  void a_span_between_attachments_that_are_not_there_is_refused() {
    ObjectNode node = element();
    at(node, "/spans/0").put("to", 5);
    reader.whole(node, "", faults);
    assertTrue(faults.get(0).message().contains("does not have"));
  }
}
