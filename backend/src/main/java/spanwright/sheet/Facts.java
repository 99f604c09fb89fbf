package spanwright.sheet;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import spanwright.plan.Json;

/**
 * What a sheet says, as plain pairs of words that can be held against those of a sheet issued
 * before. Always metric, so that asking for feet changes nothing.
 */
final class Facts {
  /** What is written to tell a changed thing of the survey from the same one. */
  private static final String SURVEY = "Survey: ";

  private static final Figures METRES = new Figures(SheetOptions.Units.METRES);

  private final Map<String, String> facts = new LinkedHashMap<>();

  private Facts() {}

  static List<Issued.Fact> of(SheetModel model) {
    Facts facts = new Facts();
    facts.rig(model);
    facts.setOut(model.setOut());
    facts.survey(model);
    List<Issued.Fact> list = new ArrayList<>();
    facts.facts.forEach((what, value) -> list.add(new Issued.Fact(what, value)));
    return list;
  }

  private void put(String what, String value) {
    String free = what;
    for (int n = 2; facts.containsKey(free); n++) {
      free = what + " (" + n + ")";
    }
    facts.put(free, value);
  }

  private void rig(SheetModel model) {
    put("Placement", model.head().shape() + ", " + METRES.say(model.head().wireLength()));
    put("Weather", String.join(" ", model.head().weather()));
    for (OverheadParts.Line line : model.overhead().lines()) {
      put(
          "Keep from " + line.name(),
          (line.keep() == null ? "not checked" : METRES.required(line.keep()) + " m")
              + (line.authority() == null ? "" : ", allowed by " + line.authority()));
    }
    model
        .wires()
        .forEach(
            w ->
                put(
                    "Wire " + w.mark() + ", cut",
                    METRES.sayCut(w.cut()) + " of " + w.kind() + ", " + w.piece()));
    put("Feed line, cut", METRES.sayCut(model.feedLine().cut()) + " of " + model.feedLine().kind());
    model
        .ropes()
        .forEach(
            r ->
                put(
                    "Rope " + r.mark() + ", cut",
                    METRES.ropeCut(r.cut()) + " m, " + r.from() + " to " + r.to()));
    for (HangParts.Holding h : model.attachments()) {
      put(
          "Point " + h.point(),
          h.name()
              + " at "
              + METRES.sayHeight(h.aboveGround())
              + ", "
              + (h.kilograms() == null ? h.held() : Figures.kilograms(h.kilograms()) + " kg"));
      put(
          "Pull at point " + h.point(),
          Figures.whole(Math.ceil(h.pull()))
              + " N calm, "
              + Figures.whole(Math.ceil(h.pullInWind()))
              + " N in the gust, of "
              + (h.mayTake() == null ? "not known" : Figures.whole(h.mayTake()) + " N"));
    }
    model.sags().forEach(s -> put("Sag to sight " + s.span(), METRES.say(s.middle())));
    model
        .hardware()
        .forEach(
            i ->
                put(
                    "Hardware, " + i.what(),
                    i.length() == null
                        ? i.count() + " and " + i.spares() + " spare"
                        : METRES.sayCut(i.length())));
  }

  private void setOut(SetOutParts.SetOut setOut) {
    for (SetOutParts.Known k : new SetOutParts.Known[] {setOut.a(), setOut.b(), setOut.c()}) {
      if (k != null) {
        put("Known point " + k.letter(), k.what());
      }
    }
    for (SetOutParts.Mark m : setOut.points()) {
      put(
          "Set-out of point " + m.number() + ", " + m.name(),
          METRES.length(m.fromA()) + " and " + METRES.length(m.fromB()) + " m, " + m.side());
    }
  }

  /** One fact for each thing of the survey, under the name people gave it. */
  private void survey(SheetModel model) {
    if (!(Json.mapper().valueToTree(model.source().plan()) instanceof ObjectNode plan)) {
      return;
    }
    plan.remove(List.of("title", "notes", "format", "brief"));
    plan.properties()
        .forEach(
            part -> {
              if (!part.getValue().isArray() || !named(part.getValue())) {
                put(SURVEY + part.getKey(), digest(part.getValue()));
                return;
              }
              for (JsonNode thing : part.getValue()) {
                String name = thing.path("name").asText(thing.path("id").asText());
                put(SURVEY + name, digest(thing));
              }
            });
  }

  private static boolean named(JsonNode list) {
    for (JsonNode thing : list) {
      if (!thing.has("id") && !thing.has("name")) {
        return false;
      }
    }
    return true;
  }

  /** Short and the same on every machine; two that agree are taken for the same thing. */
  private static String digest(JsonNode node) {
    long hash = 1125899906842597L;
    String text = node.toString();
    for (int i = 0; i < text.length(); i++) {
      hash = 31 * hash + text.charAt(i);
    }
    return Long.toHexString(hash);
  }

  /** What a sheet changes against one issued before, as sentences; empty when nothing. */
  static List<String> changes(List<Issued.Fact> before, List<Issued.Fact> now) {
    Map<String, String> old = new LinkedHashMap<>();
    before.forEach(f -> old.put(f.what(), f.value()));
    List<String> changes = new ArrayList<>();
    for (Issued.Fact f : now) {
      String was = old.remove(f.what());
      boolean survey = f.what().startsWith(SURVEY);
      if (was == null) {
        changes.add(f.what() + (survey ? ": new." : ": new, " + f.value() + "."));
      } else if (!was.equals(f.value())) {
        changes.add(f.what() + (survey ? ": changed." : ": " + f.value() + "; was " + was + "."));
      }
    }
    old.forEach(
        (what, value) ->
            changes.add(
                what + (what.startsWith(SURVEY) ? ": gone." : ": gone; was " + value + ".")));
    return changes;
  }
}
