package spanwright.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import org.junit.jupiter.api.io.TempDir;
import spanwright.BrokenPlans;

/** Exit codes, and what is said. */
class CommandsTest {
  private static final String FEED =
      "{\"load\":[35,-410],\"frequency\":7.1,\"length\":12.4,"
          + "\"line\":{\"impedance\":400,\"velocityFactor\":0.91,\"lossDbPer100m\":0.3}}";
  private static final String HANG =
      "{\"from\":[0,0,8],\"to\":[20,0,7],\"wire\":{\"weight\":0.0286,\"diameter\":0.0016},"
          + "\"pull\":80,\"held\":\"weight\"}";
  private static final String SOLVE =
      "{\"wires\":[{\"points\":[[-5,0,10],[5,0,10]],\"radius\":0.001}],"
          + "\"ground\":{\"kind\":\"none\"},\"feed\":{\"wire\":0,\"fraction\":0.5},"
          + "\"frequencies\":[14.1]}";

  @TempDir Path temp;

  /** What a command left behind. */
  private record Ran(int code, String out, String err) {
    JsonNode json() throws IOException {
      return new ObjectMapper().readTree(out);
    }
  }

  private static Ran run(String... args) {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    ByteArrayOutputStream err = new ByteArrayOutputStream();
    Console console =
        new Console(
            new PrintStream(out, true, StandardCharsets.UTF_8),
            new PrintStream(err, true, StandardCharsets.UTF_8),
            false);
    int code = Program.run(console, args);
    Ran ran =
        new Ran(code, out.toString(StandardCharsets.UTF_8), err.toString(StandardCharsets.UTF_8));
    assertFalse(BrokenPlans.namesInnards(ran.err()), ran.err());
    return ran;
  }

  private String file(String name, String text) throws IOException {
    return Files.writeString(temp.resolve(name), text).toString();
  }

  private static void assertSays(Ran ran, int code, String... words) {
    assertEquals(code, ran.code(), ran.err());
    for (String word : words) {
      assertTrue(ran.err().contains(word), ran.err());
    }
  }

  @Test
  void a_sound_plan_is_said_to_be_so() throws IOException {
    Ran ran = run("check", file("plan.json", BrokenPlans.SOUND));
    assertEquals(0, ran.code(), ran.err());
    assertTrue(ran.out().contains("no faults"));
    assertEquals("", ran.err());
  }

  @TestFactory
  Stream<DynamicTest> a_broken_plan_ends_every_command_with_3_and_a_sentence() {
    Map<String, String> all = new LinkedHashMap<>(BrokenPlans.syntax());
    all.putAll(BrokenPlans.meaning());
    return all.entrySet().stream()
        .map(
            broken ->
                DynamicTest.dynamicTest(
                    broken.getKey(),
                    () -> {
                      String plan = file("broken.json", broken.getValue());
                      Ran check = run("check", plan);
                      assertSays(check, 3, "broken.json: ");
                      assertEquals("", check.out());
                      assertEquals(check.err(), run("rank", plan).err());
                      assertEquals(3, run("assess", plan, plan).code());
                    }));
  }

  @TestFactory
  Stream<DynamicTest> a_broken_text_ends_the_case_commands_with_3() {
    return Stream.of("solve", "feed", "hang")
        .flatMap(
            command ->
                BrokenPlans.syntax().entrySet().stream()
                    .map(
                        broken ->
                            DynamicTest.dynamicTest(
                                command + ", " + broken.getKey(),
                                () -> {
                                  String file = file("case.json", broken.getValue());
                                  assertSays(run(command, file), 3, "case.json: ");
                                })));
  }

  @Test
  void after_twenty_faults_the_rest_are_counted() throws IOException {
    StringBuilder fields = new StringBuilder();
    for (int i = 0; i < 50; i++) {
      fields.append(",\"x").append(i).append("\":0");
    }
    String many = FEED.replaceFirst("\\}$", fields + "}");
    Ran ran = run("feed", file("many.json", many));
    assertSays(ran, 3, "x0: ", "x19: ", "and 30 more faults");
    assertEquals(21, ran.err().lines().count());
  }

  @Test
  void files_that_cannot_be_read_are_bad_input() throws IOException {
    assertSays(run("check", temp.resolve("none.json").toString()), 3, "there is no such file");
    assertSays(run("check", temp.toString()), 3, "this is a folder");
    Path large = temp.resolve("large.json");
    try (var out = Files.newOutputStream(large)) {
      out.write(new byte[9 << 20]);
    }
    assertSays(run("check", large.toString()), 3, "larger than 8 MB");
    Files.write(temp.resolve("latin.json"), new byte[] {'"', (byte) 0xe4, '"'});
    assertSays(run("hang", temp.resolve("latin.json").toString()), 3, "not UTF-8");
  }

  @Test
  void bad_usage_is_2_and_names_the_help() throws IOException {
    assertSays(run(), 2, "Say which command", "--help");
    assertSays(run("dance"), 2, "There is no command dance.");
    assertSays(run("check"), 2, "PLAN.json");
    assertSays(run("rank", "x", "--effort", "heroic"), 2, "quick, normal or thorough");
    assertSays(run("rank", "x", "--top", "0"), 2, "--top");
    assertSays(run("rank", "x", "--top", "many"), 2, "--top");
    assertSays(run("rank", "x", "--threads", "0"), 2, "--threads");
    assertSays(run("serve", "--port", "70000"), 2, "--port");
    assertSays(run("feed", "a.json", "b.json"), 2, "b.json");
    assertSays(run("sheet", "a.json", "b.json"), 2, "--dir");
    assertSays(run("check", "--loudly", "a.json"), 2, "--loudly");
    String plan = file("plan.json", BrokenPlans.SOUND);
    assertSays(
        run("sheet", plan, plan, "--placement", "p01", "--dir", temp.toString(), "--paper", "A9"),
        2,
        "A4 or Letter");
  }

  @Test
  void help_is_a_result() {
    Ran all = run("--help");
    assertEquals(0, all.code());
    for (String command :
        new String[] {
          "serve",
          "check",
          "rank",
          "assess",
          "solve",
          "feed",
          "hang",
          "sheet",
          "catalogue",
          "version"
        }) {
      assertTrue(all.out().contains(command), command);
      assertEquals(0, run(command, "--help").code());
    }
  }

  @Test
  void version_and_catalogue_are_printed() throws IOException {
    assertTrue(run("version").out().matches("(?s)Spanwright \\d+\\.\\d+\\.\\d+, built 20.*"));
    JsonNode catalogue = run("catalogue").json();
    for (String kind :
        new String[] {
          "wires", "lines", "ropes", "matchingUnits", "soils", "bands", "limits", "rules"
        }) {
      assertTrue(catalogue.get(kind).isArray(), kind);
    }
    assertTrue(catalogue.get("wires").size() > 3);
  }

  @Test
  void an_answer_goes_to_the_file_asked_for_whole_or_not_at_all() throws IOException {
    String hang = file("hang.json", HANG);
    Path out = temp.resolve("answer.json");
    Ran ran = run("hang", hang, "--out", out.toString());
    assertEquals(0, ran.code(), ran.err());
    assertEquals("", ran.out());
    assertEquals(run("hang", hang).out(), Files.readString(out));
    assertSays(
        run("hang", hang, "--out", temp.resolve("no/such/x.json").toString()), 1, "no folder");
    assertSays(run("hang", hang, "--out", temp.toString()), 1, "this is a folder");
    try (Stream<Path> left = Files.list(temp)) {
      assertEquals(2, left.count());
    }
  }

  @Test
  void hang_answers_in_the_fields_of_its_contract() throws IOException {
    JsonNode answer = run("hang", file("hang.json", HANG)).json();
    for (String field : new String[] {"points", "length", "sag", "pullFrom", "pullTo"}) {
      assertTrue(answer.get("calm").has(field), field);
      assertTrue(answer.get("inWind").has(field), field);
    }
    assertTrue(answer.get("inWind").has("blowOut"));
    double x = answer.at("/calm/pullTo/0").asDouble();
    double z = answer.at("/calm/pullTo/2").asDouble();
    assertEquals(80, Math.hypot(x, z), 1e-6);
  }

  @Test
  void feed_answers_in_the_fields_of_its_contract() throws IOException {
    String unit =
        "\"matching\":{\"network\":\"L\",\"inductance\":[0,3e-5],\"capacitance\":[1e-11,5e-10],"
            + "\"coilQ\":150,\"capacitorQ\":1000,\"peakVolts\":3000}";
    String with = FEED.replaceFirst("\\}$", "," + unit + "}");
    JsonNode answer = run("feed", file("feed.json", with)).json();
    for (String field :
        new String[] {"lineSwr", "matchedLossDb", "lossDb", "peakVolts", "peakAmps"}) {
      assertTrue(answer.get(field).isNumber(), field);
    }
    assertEquals(2, answer.get("atStation").size());
    assertEquals("clear", answer.at("/matching/state").asText());
    assertTrue(answer.at("/matching/settings/inductance").isNumber());
    assertFalse(run("feed", file("feed.json", FEED)).json().has("matching"));
  }

  @Test
  void feed_takes_lines_and_units_of_the_catalogue_by_id() throws IOException {
    JsonNode catalogue = run("catalogue").json();
    String line = catalogue.at("/lines/0/id").asText();
    String unit = catalogue.at("/matchingUnits/0/id").asText();
    String text =
        "{\"load\":[50,0],\"frequency\":7.1,\"length\":10,\"line\":\""
            + line
            + "\",\"matching\":\""
            + unit
            + "\"}";
    assertEquals(0, run("feed", file("ids.json", text)).code());
    assertSays(
        run("feed", file("ids.json", text.replace(line, "hosepipe"))), 3, "line: ", "catalogue");
    assertSays(
        run("feed", file("ids.json", text.replace(unit, "wand"))), 3, "matching: ", "catalogue");
  }

  @Test
  void a_load_that_takes_no_power_gives_nulls_not_infinities() throws IOException {
    JsonNode answer = run("feed", file("open.json", FEED.replace("[35,-410]", "[0,-410]"))).json();
    assertTrue(answer.get("lineSwr").isNull());
    assertTrue(answer.get("lossDb").isNull());
  }

  @Test
  void faults_of_a_case_are_all_said_with_their_paths() throws IOException {
    String broken =
        HANG.replace("\"pull\":80", "\"pull\":-80")
            .replace("[20,0,7]", "[20,0]")
            .replace("0.0286", "\"heavy\"")
            .replace("\"weight\"}", "\"firmly\",\"gust\":3}");
    assertSays(
        run("hang", file("broken.json", broken)),
        3,
        "pull: ",
        "to: ",
        "wire.weight: ",
        "held: ",
        "gust: ");
    assertSays(run("hang", file("huge.json", HANG.replace("80", "8e500"))), 3, "pull: ");
    assertSays(
        run("feed", file("hertz.json", FEED.replace("7.1", "7100000"))),
        3,
        "frequency: ",
        "It looks like hertz: 7.1 MHz?");
    assertSays(run("feed", file("negative.json", FEED.replace("[35", "[-35"))), 3, "load[0]: ");
  }

  @Test
  void faults_of_an_antenna_case_are_all_said_with_their_paths() throws IOException {
    Map<String, String> broken =
        Map.of(
            SOLVE.replace("[14.1]", "[14100000]"),
            "frequencies[0]: ",
            SOLVE.replace("[14.1]", "[]"),
            "frequencies: ",
            SOLVE.replace("\"none\"", "\"wet\""),
            "ground.kind: ",
            SOLVE.replace("\"none\"", "\"real\""),
            "ground.conductivity: ",
            SOLVE.replace("\"wire\":0", "\"wire\":3"),
            "feed.wire: ",
            SOLVE.replace("0.001", "-1"),
            "wires[0].radius: ",
            SOLVE.replace("\"radius\"", "\"material\":\"jelly\",\"radius\""),
            "wires[0].material: ",
            SOLVE.replace(
                "\"radius\"", "\"insulation\":{\"radius\":1e-5,\"permittivity\":2},\"radius\""),
            "wires[0].insulation.radius: ",
            SOLVE.replace(",[5,0,10]", ""),
            "wires[0].points: ",
            SOLVE.replace("\"ground\"", "\"grund\""),
            "grund: ");
    for (Map.Entry<String, String> each : broken.entrySet()) {
      assertSays(run("solve", file("case.json", each.getKey())), 3, each.getValue());
    }
  }

  @Test
  void a_placement_that_is_none_is_bad_input() throws IOException {
    String plan = file("plan.json", BrokenPlans.SOUND);
    assertSays(run("assess", plan, file("p.json", "{}")), 3, "shape: ", "attachments: ", "feed: ");
    assertSays(
        run("sheet", plan, plan, "--placement", "p01", "--dir", temp.resolve("o").toString()),
        3,
        "not a result");
    String result = "{\"format\":\"spanwright-result/1\",\"placements\":[{\"id\":\"p01\"}]}";
    String file = file("r.json", result);
    assertSays(
        run("sheet", plan, file, "--placement", "p02", "--dir", temp.resolve("o").toString()),
        3,
        "no placement p02",
        "It has p01.");
    assertSays(
        run("sheet", plan, file, "--placement", "p01", "--dir", temp.resolve("o").toString()),
        3,
        "placements[0].shape: ");
  }

  @Test
  void a_plan_on_which_nothing_is_allowed_ends_with_4_and_its_refusals() throws IOException {
    String line =
        "\"overheadLines\": [ { \"id\": \"grid\", \"path\": [[-5,12,8],[30,12,8]],"
            + " \"kind\": \"medium-voltage\" } ], \"entry\"";
    String plan = file("plan.json", BrokenPlans.SOUND.replace("\"entry\"", line));
    Ran ran = run("rank", plan, "--effort", "quick", "--threads", "1");
    assertSays(ran, 4, "no placement is allowed", "refusals");
    JsonNode result = ran.json();
    assertEquals(0, result.get("placements").size());
    assertTrue(result.get("refusals").size() > 0);
    assertTrue(result.at("/refusals/0/cure").asText().length() > 10, ran.out());
    assertEquals("grid", result.at("/refusals/0/to").asText());
  }

  @Test
  void a_folder_another_server_has_in_use_is_said_in_a_sentence() {
    Path data = temp.resolve("data");
    try (var store = spanwright.store.PlanStore.open(data)) {
      assertTrue(store.list().isEmpty());
      assertSays(
          run("serve", "--port", "0", "--data", data.toString()),
          1,
          "is in use by another running");
    }
    assertSays(
        run("serve", "--port", "0", "--data", data.toString(), "--host", "no.such.invalid"),
        1,
        "The host no.such.invalid is not known");
  }
}
