package spanwright.plan;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertNull;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

class PlanReaderTest {
  static {
    // the schema library warns of our own annotations, which it rightly ignores
    System.setProperty("org.slf4j.simpleLogger.log.com.networknt.schema", "error");
  }

  private static final String LEAST =
      """
      {"boundary": [[0,0],[20,0],[20,30],[0,30]], "entry": {"at": [10,5], "height": 1.5},
       "supports": [{"id": "a", "at": [2,28], "lowest": 3, "highest": 8},
                    {"id": "b", "at": [18,28], "lowest": 3, "highest": 8}],
       "brief": {"bands": [{"frequencies": [14.2, 14.1]}], "targets": [{"nearVerticalKm": 300}]}}
      """;

  @Test
  void the_least_plan_reads_and_gets_every_default() {
    PlanReader.Outcome outcome = PlanReader.read(LEAST);
    assertEquals(List.of(), outcome.faults());
    Plan plan = outcome.plan();
    assertEquals("spanwright-plan/1", plan.format());
    assertEquals(new Site(null, null, 0, 0, new Soil(13, 0.005), null), plan.site());
    assertEquals(
        new Support(
            "a", "a", Support.Kind.OTHER, new Point(2, 28), 3, 8, 0.3, 0, null, null, false, null),
        plan.supports().get(0));
    Brief brief = plan.brief();
    assertEquals(new Band("14.2 MHz", List.of(14.1, 14.2), 1, false), brief.bands().get(0));
    assertEquals(new Target("Target 1", null, null, 300.0, 1, List.of()), brief.targets().get(0));
    assertEquals(100, brief.power());
    assertEquals(1, brief.duty());
    assertTrue(brief.lineLengths().isFree());
    assertEquals(List.of(Shape.values()), brief.shapes());
    assertEquals(0, brief.newMasts());
    assertEquals(25, brief.rules().wind());
    assertEquals(0, brief.rules().ice());
    assertNull(brief.wire());
    assertNull(brief.matching());
    assertTrue(plan.trees().isEmpty() && plan.datums().isEmpty());
  }

  @Test
  void a_ridge_left_out_is_at_the_eaves_and_a_base_left_out_at_the_ground() {
    Plan plan =
        PlanReader.read(
                LEAST.replace(
                    "\"supports\"",
                    """
                    "buildings": [{"id": "h", "footprint": [[1,1],[9,1],[9,6],[1,6]], "eaves": 5}],
                    "mastZones": [{"id": "m", "area": [[1,9],[9,9],[9,16],[1,16]], "highest": 9}],
                    "supports\"\
                    """))
            .plan();
    assertEquals(5, plan.buildings().get(0).ridge());
    assertEquals(Building.Roof.FLAT, plan.buildings().get(0).roof());
    assertEquals(0, plan.mastZones().get(0).base());
    assertEquals(0, plan.mastZones().get(0).guyRadius());
  }

  @Test
  void the_least_plan_of_the_documentation_reads() throws IOException {
    Path page = Path.of("..", "docs", "reference", "plan.md");
    String text = Files.readString(page, StandardCharsets.UTF_8);
    int from = text.indexOf("```json") + 7;
    PlanReader.Outcome outcome = PlanReader.read(text.substring(from, text.indexOf("```", from)));
    assertEquals(List.of(), outcome.faults());
  }

  @Test
  void a_null_field_counts_as_absent() {
    String json = LEAST.replace("\"entry\"", "\"site\": null, \"title\": null, \"entry\"");
    assertEquals("Untitled plot", PlanReader.read(json).plan().title());
  }

  @Test
  void a_byte_order_mark_is_let_by() {
    byte[] utf8 = ("\uFEFF" + LEAST).getBytes(StandardCharsets.UTF_8);
    assertNotNull(PlanReader.read(utf8).plan());
  }

  @Test
  void demo_plots_read_without_fault_and_show_every_kind_of_thing() {
    List<Plan> plans =
        DemoPlans.list().stream()
            .map(demo -> PlanReader.read(demo.json()))
            .peek(outcome -> assertEquals(List.of(), outcome.faults()))
            .map(PlanReader.Outcome::plan)
            .toList();
    assertEquals(3, plans.size());
    for (Building.Roof roof : Building.Roof.values()) {
      assertTrue(
          plans.stream().flatMap(p -> p.buildings().stream()).anyMatch(b -> b.roof() == roof));
    }
    for (Zone.Rule rule : Zone.Rule.values()) {
      assertTrue(plans.stream().flatMap(p -> p.zones().stream()).anyMatch(z -> z.rule() == rule));
    }
    for (Plan plan : plans) {
      assertTrue(plan.supports().size() >= 5, plan.title());
      assertTrue(!plan.overheadLines().isEmpty() && !plan.mastZones().isEmpty(), plan.title());
      assertTrue(!plan.bracketLines().isEmpty() && !plan.metalwork().isEmpty(), plan.title());
      assertTrue(!plan.people().isEmpty() && plan.datums().size() == 2, plan.title());
      assertTrue(plan.brief().bands().size() >= 3, plan.title());
    }
  }

  @Test
  void what_is_read_and_written_reads_the_same_again() throws IOException {
    for (DemoPlans.Demo demo : DemoPlans.list()) {
      Plan plan = PlanReader.read(demo.json()).plan();
      PlanReader.Outcome again = PlanReader.read(Json.mapper().writeValueAsString(plan));
      assertEquals(List.of(), again.faults());
      assertEquals(plan, again.plan());
    }
  }

  @Test
  void a_draft_may_lack_everything() {
    assertEquals(List.of(), PlanReader.readDraft("{}").faults());
    assertEquals(List.of(), PlanReader.readDraft("{\"supports\": [{\"id\": \"a\"}]}").faults());
    assertEquals(
        List.of(),
        PlanReader.readDraft("{\"boundary\": [[0,0],[9,9]], \"site\": {\"latitude\": 95}}")
            .faults());
  }

  @Test
  void a_draft_is_held_to_syntax_types_sizes_and_fields() {
    assertEquals(1, PlanReader.readDraft("{\"title\": 3}").faults().size());
    assertEquals(1, PlanReader.readDraft("{\"titel\": \"a\"}").faults().size());
    assertEquals(1, PlanReader.readDraft("{\"boundary\": [[0,0,0]]}").faults().size());
    assertEquals(1, PlanReader.readDraft("{\"boundary\": [[0,1e7]]}").faults().size());
    assertEquals(1, PlanReader.readDraft("{\"boundary\": ").faults().size());
    assertNull(PlanReader.readDraft("[]").json());
  }

  @Test
  void faults_beyond_the_twentieth_are_counted() {
    List<Fault> faults = java.util.Collections.nCopies(25, new Fault("a.b", "It is wrong."));
    List<String> lines = Fault.sentences(faults);
    assertEquals(21, lines.size());
    assertEquals("a.b: It is wrong.", lines.get(0));
    assertEquals("and 5 more faults", lines.get(20));
    assertEquals(20, Fault.sentences(faults.subList(0, 20)).size());
    assertEquals("and 1 more fault", Fault.sentences(faults.subList(0, 21)).get(20));
  }

  @Test
  void huge_texts_are_refused_quickly() {
    String points = "[1,2],".repeat(299_999) + "[3,4]";
    String walls = "{\"id\":\"b\",\"eaves\":3,\"footprint\":[" + "[1,2],".repeat(5000) + "[3,4]]},";
    List<String> texts =
        List.of(
            "{\"boundary\": [" + points + "]}",
            "{\"boundary\": " + "[".repeat(200_000),
            "{\"a\": ".repeat(100_000),
            "{\"title\": \"" + "a".repeat(3_000_000) + "\"}",
            "{\"title\": " + "1".repeat(3_000_000) + "}",
            "{\"buildings\": [" + walls.repeat(200) + "{}]}",
            "{" + "\"x\":1,".repeat(600_000) + "\"y\":2}",
            "x".repeat(9_000_000));
    for (String text : texts) {
      assertTimeoutPreemptively(
          Duration.ofSeconds(5),
          () -> {
            PlanReader.Outcome outcome = PlanReader.read(text);
            assertNull(outcome.plan());
            assertTrue(!outcome.faults().isEmpty());
          });
    }
  }

  @Test
  void text_cut_or_changed_anywhere_never_does_worse_than_a_fault() {
    Random random = new Random(7);
    String demo = DemoPlans.list().get(1).json();
    String odd = "{}[]\",:0-9.eE+xnul\\\u0000\u202e";
    for (int i = 0; i < 1500; i++) {
      StringBuilder text = new StringBuilder(demo);
      int at = random.nextInt(text.length());
      switch (random.nextInt(3)) {
        case 0 -> text.setLength(at);
        case 1 -> text.setCharAt(at, odd.charAt(random.nextInt(odd.length())));
        default -> text.delete(at, Math.min(text.length(), at + 1 + random.nextInt(40)));
      }
      PlanReader.Outcome outcome = PlanReader.read(text.toString());
      assertTrue((outcome.plan() == null) != outcome.faults().isEmpty());
      for (Fault fault : outcome.faults()) {
        String said = fault.sentence();
        assertTrue(
            !said.contains("com.") && !said.contains("java") && !said.contains("jackson"), said);
      }
    }
  }

  @Test
  void the_schema_takes_the_demo_plots_and_the_reader_agrees_with_it() throws IOException {
    Schema schema = schema("plan");
    for (DemoPlans.Demo demo : DemoPlans.list()) {
      assertEquals(
          List.of(), List.copyOf(schema.validate(demo.json(), InputFormat.JSON)), demo.name());
      JsonNode written = Json.mapper().valueToTree(PlanReader.read(demo.json()).plan());
      assertEquals(List.of(), List.copyOf(schema.validate(written)), demo.name());
    }
    for (String broken :
        List.of(
            LEAST.replace("\"highest\": 8", "\"highest\": \"8\""),
            LEAST.replace("\"highest\": 8", "\"hihest\": 8"),
            LEAST.replace("[20,0]", "[20,0,0]"),
            LEAST.replace("[20,0]", "[20,1e9]"),
            LEAST.replace("300}", "-300}"),
            LEAST.replace("\"entry\"", "\"title\": \"a\\u0007\", \"entry\""),
            "{}")) {
      assertTrue(!schema.validate(broken, InputFormat.JSON).isEmpty(), broken);
      assertTrue(!PlanReader.read(broken).faults().isEmpty(), broken);
    }
  }

  @Test
  void the_other_schemas_take_the_examples_of_the_documentation() throws IOException {
    for (String name : List.of("solve-case", "feed-case", "hang-case", "placement", "result")) {
      try (InputStream in =
          getClass().getResourceAsStream("/spanwright/examples/" + name + ".json")) {
        String example = new String(in.readAllBytes(), StandardCharsets.UTF_8);
        assertEquals(
            List.of(), List.copyOf(schema(name).validate(example, InputFormat.JSON)), name);
      }
    }
  }

  private static Schema schema(String name) throws IOException {
    String place = "/spanwright/shared/schema/" + name + ".schema.json";
    try (InputStream in = PlanReaderTest.class.getResourceAsStream(place)) {
      return SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
          .getSchema(new String(in.readAllBytes(), StandardCharsets.UTF_8), InputFormat.JSON);
    }
  }
}
