package spanwright.plan;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.Predicate;

/**
 * Everything that can be chosen: generic kinds only. The look-ups by id take {@code null} for the
 * default; an id that does not exist is a programming error (a plan that was read has none) and
 * throws.
 *
 * @param wires wires
 * @param lines feed lines
 * @param ropes ropes
 * @param matchingUnits matching units
 * @param soils grounds
 * @param bands bands
 * @param limits exposure limits
 * @param rules rules
 */
public record Catalogue(
    List<WireKind> wires,
    List<LineKind> lines,
    List<RopeKind> ropes,
    List<MatchingKind> matchingUnits,
    List<SoilKind> soils,
    List<BandKind> bands,
    List<LimitSet> limits,
    List<RuleKind> rules) {
  public Catalogue {
    wires = wires == null ? List.of() : List.copyOf(wires);
    lines = lines == null ? List.of() : List.copyOf(lines);
    ropes = ropes == null ? List.of() : List.copyOf(ropes);
    matchingUnits = matchingUnits == null ? List.of() : List.copyOf(matchingUnits);
    soils = soils == null ? List.of() : List.copyOf(soils);
    bands = bands == null ? List.of() : List.copyOf(bands);
    limits = limits == null ? List.of() : List.copyOf(limits);
    rules = rules == null ? List.of() : List.copyOf(rules);
  }

  /** The wire of that id; {@code null} is the default. */
  public WireKind wire(String id) {
    return get(wires, WireKind::id, WireKind::isDefault, id, "wire");
  }

  /** The feed line of that id; {@code null} is the default. */
  public LineKind line(String id) {
    return get(lines, LineKind::id, LineKind::isDefault, id, "line");
  }

  /** The rope of that id; {@code null} is the default. */
  public RopeKind rope(String id) {
    return get(ropes, RopeKind::id, RopeKind::isDefault, id, "rope");
  }

  /** The matching unit of that id; {@code null} is the default. */
  public MatchingKind matchingUnit(String id) {
    return get(matchingUnits, MatchingKind::id, MatchingKind::isDefault, id, "matching unit");
  }

  /**
   * What a brief chose: a catalogue unit, one described in place, or ({@code null}) the default.
   */
  public MatchingUnit matchingUnit(MatchingChoice choice) {
    return choice != null && choice.unit() != null
        ? choice.unit()
        : matchingUnit(choice == null ? null : choice.id()).unit();
  }

  /** The soil of that id; {@code null} is the default. */
  public SoilKind soil(String id) {
    return get(soils, SoilKind::id, SoilKind::isDefault, id, "soil");
  }

  /** The set of exposure limits of that id; {@code null} is the default. */
  public LimitSet limitSet(String id) {
    return get(limits, LimitSet::id, LimitSet::isDefault, id, "set of limits");
  }

  /** The rule of that id. */
  public RuleKind rule(String id) {
    return findRule(id).orElseThrow(() -> new IllegalArgumentException("no rule " + id));
  }

  /** The rule of that id, if there is one. */
  public Optional<RuleKind> findRule(String id) {
    return rules.stream().filter(rule -> rule.id().equals(id)).findFirst();
  }

  /** The value of a rule in its unit: the default unless the brief sets another. */
  public double ruleValue(String id, Rules changes) {
    Double set = changes == null ? null : changes.overrides().get(id);
    return set == null ? rule(id).defaultValue() : set;
  }

  /** The rule that holds the kept distance to a kind of overhead line. */
  public RuleKind overheadRule(OverheadLine.Kind kind) {
    return rule("overhead-" + kind.name().toLowerCase(Locale.ROOT).replace('_', '-'));
  }

  /**
   * The kept distance to an overhead line [m]: the larger of its own figure and the rule's; a
   * smaller figure of its own counts only when authorised (rule 1 of the overhead lines).
   */
  public double keptDistance(OverheadLine line, Rules changes) {
    RuleKind rule = overheadRule(line.kind());
    double value = ruleValue(rule.id(), changes);
    if (line.clearance() == null) {
      return value;
    }
    boolean authorised = line.authorisedBy() != null && line.authorisedOn() != null;
    return authorised && line.clearance() < rule.defaultValue()
        ? line.clearance()
        : Math.max(line.clearance(), value);
  }

  private static <K> K get(
      List<K> kinds, Function<K, String> idOf, Predicate<K> isDefault, String id, String what) {
    return kinds.stream()
        .filter(kind -> id == null ? isDefault.test(kind) : idOf.apply(kind).equals(id))
        .findFirst()
        .orElseThrow(
            () -> new IllegalArgumentException("no " + what + " " + (id == null ? "default" : id)));
  }
}
