package spanwright.plan;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.Collection;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.Function;

/** Whether what the station must do makes sense, and whether the catalogues know what it names. */
final class BriefChecks {
  static final double LOWEST_MHZ = 1.8;
  static final double HIGHEST_MHZ = 54;
  private static final double HERTZ = 1e6;
  private static final double KILOHERTZ = 1e3;

  private final Thing brief;
  private final Catalogue catalogue = Catalogues.standard();
  private final List<Fault> faults = new ArrayList<>();

  private BriefChecks(JsonNode plan) {
    brief = new Thing("brief", "The brief", plan.path("brief"));
  }

  static List<Fault> faults(JsonNode plan) {
    BriefChecks checks = new BriefChecks(plan);
    List<Thing> bands = Thing.list(checks.brief.json(), "brief", "bands", "band");
    List<Thing> targets = Thing.list(checks.brief.json(), "brief", "targets", "target");
    Set<String> names = checks.bands(bands);
    targets.forEach(target -> checks.target(target, names));
    checks.weights(bands, "the bands", "bands");
    checks.weights(targets, "the targets", "targets");
    checks.kinds();
    checks.rules();
    checks.matching();
    return checks.faults;
  }

  private void say(String path, Wording wording, Object... parts) {
    faults.add(Fault.of(path, wording, parts));
  }

  private Set<String> bands(List<Thing> bands) {
    Set<String> names = new LinkedHashSet<>();
    for (Thing band : bands) {
      String name = PlanDefaults.bandName(band.json());
      if (!names.add(name)) {
        say(band.at("name"), Wording.SAME_BAND, Wording.quoted(name));
      }
      Set<Double> seen = new HashSet<>();
      JsonNode frequencies = band.json().path("frequencies");
      for (int i = 0; frequencies.isArray() && i < frequencies.size(); i++) {
        if (frequencies.get(i).isNumber()) {
          String at = Paths.entry(band.at("frequencies"), i);
          frequency(at, band.label(), frequencies.get(i).asDouble(), seen);
        }
      }
    }
    return names;
  }

  private void frequency(String at, String label, double value, Set<Double> seen) {
    if (!Double.isFinite(value)) {
      return;
    }
    if (isInRange(value)) {
      if (!seen.add(value)) {
        say(at, Wording.SAME_FREQUENCY, label, value);
      }
    } else if (isInRange(value / HERTZ)) {
      say(at, Wording.IN_HERTZ, label, value, value / HERTZ);
    } else if (isInRange(value / KILOHERTZ)) {
      say(at, Wording.IN_KILOHERTZ, label, value, value / KILOHERTZ);
    } else {
      say(at, Wording.FREQUENCY_OUT, label, value);
    }
  }

  private static boolean isInRange(double megahertz) {
    return megahertz >= LOWEST_MHZ && megahertz <= HIGHEST_MHZ;
  }

  private void target(Thing target, Set<String> bands) {
    boolean bearing = !target.lacks("bearing");
    boolean distance = !target.lacks("distanceKm");
    if (!target.lacks("nearVerticalKm")) {
      if (bearing || distance) {
        say(target.path(), Wording.BOTH_TARGET_KINDS, target.label());
      }
    } else if (!bearing && !distance) {
      say(target.path(), Wording.NO_TARGET_KIND, target.label());
    } else if (bearing != distance) {
      String given = bearing ? "bearing" : "distanceKm";
      String lacking = bearing ? "distanceKm" : "bearing";
      say(target.at(lacking), Wording.HALF_TARGET, target.label(), given, lacking);
    }
    JsonNode named = target.json().path("bands");
    for (int i = 0; named.isArray() && i < named.size(); i++) {
      if (named.get(i).isTextual() && !bands.contains(named.get(i).asText())) {
        say(
            Paths.entry(target.at("bands"), i),
            Wording.NO_SUCH_BAND,
            target.label(),
            Wording.quoted(named.get(i).asText()),
            list(bands));
      }
    }
  }

  private static String list(Collection<String> names) {
    return names.isEmpty()
        ? "none"
        : String.join(", ", names.stream().map(Wording::quoted).toList());
  }

  private void weights(List<Thing> things, String what, String field) {
    if (!things.isEmpty() && things.stream().allMatch(thing -> thing.number("weight", 1) == 0)) {
      say(brief.at(field), Wording.ALL_WEIGHTS_ZERO, what);
    }
  }

  private void kinds() {
    kind("wire", "wire", catalogue.wires(), WireKind::id);
    kind("line", "feed line", catalogue.lines(), LineKind::id);
    kind("rope", "rope", catalogue.ropes(), RopeKind::id);
    kind("matching", "matching unit", catalogue.matchingUnits(), MatchingKind::id);
    kind("exposure", "set of exposure limits", catalogue.limits(), LimitSet::id);
  }

  private <K> void kind(String field, String what, List<K> kinds, Function<K, String> idOf) {
    String id = brief.text(field);
    List<String> ids = kinds.stream().map(idOf).toList();
    if (id != null && !id.isBlank() && !ids.contains(id)) {
      String choice = Wording.either(ids);
      say(brief.at(field), Wording.NOT_IN_CATALOGUE, what, Wording.quoted(id), choice);
    }
  }

  private void rules() {
    Thing overrides = brief.child("rules").child("overrides");
    for (Map.Entry<String, JsonNode> change : overrides.json().properties()) {
      String id = change.getKey();
      String at = overrides.at(id);
      Optional<RuleKind> rule = catalogue.findRule(id);
      if (rule.isEmpty()) {
        List<String> ids =
            catalogue.rules().stream().filter(RuleKind::mayChange).map(RuleKind::id).toList();
        say(at, Wording.NO_SUCH_RULE, Wording.quoted(id), Wording.either(ids));
      } else if (!rule.get().mayChange()) {
        say(at, Wording.FIXED_RULE, id);
      } else if (change.getValue().isNumber()) {
        bounds(at, rule.get(), change.getValue().asDouble());
      }
    }
  }

  private void bounds(String at, RuleKind rule, double value) {
    String unit = rule.unit();
    if (value < rule.least()) {
      say(at, Wording.RULE_TOO_LOW, rule.id(), rule.least(), unit, value, unit);
    } else if (value > rule.most() && Double.isFinite(value)) {
      say(at, Wording.RULE_TOO_HIGH, rule.id(), rule.most(), unit, value, unit);
    }
  }

  private void matching() {
    Thing unit = brief.child("matching");
    if (!unit.json().isObject()) {
      return;
    }
    range(unit, "inductance");
    range(unit, "capacitance");
    String network = unit.text("network");
    if ("L".equals(network) || "T".equals(network)) {
      for (String field : PlanDefaults.UNIT_FIELDS) {
        if (unit.lacks(field)) {
          boolean range = field.endsWith("ance");
          String what = range ? "[least, most], two numbers" : "a number";
          say(unit.at(field), Wording.MISSING, "The matching unit", field, "it", what);
        }
      }
    }
  }

  private void range(Thing unit, String field) {
    List<Double> ends = new ArrayList<>();
    unit.json().path(field).forEach(end -> ends.add(end.isNumber() ? end.asDouble() : Double.NaN));
    if (ends.size() == 2 && ends.get(0) > ends.get(1)) {
      say(unit.at(field), Wording.RANGE_SWAPPED, field, ends.get(0), ends.get(1));
    }
  }
}
