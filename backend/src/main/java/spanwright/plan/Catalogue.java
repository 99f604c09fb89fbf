package spanwright.plan;

import java.util.List;

/**
 * Everything that can be chosen: generic kinds only.
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
}
