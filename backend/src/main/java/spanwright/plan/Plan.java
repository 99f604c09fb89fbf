package spanwright.plan;

import java.util.List;

/**
 * A surveyed plot and what is asked of it: the whole of a plan file, its absent scalars filled in.
 *
 * @param format always "spanwright-plan/1"
 * @param title shown to people
 * @param notes free text
 * @param site place, north, soil, terrain
 * @param boundary corners in order, not closed
 * @param boundaryRules edges that allow an overhang
 * @param buildings solids
 * @param supports what may hold
 * @param trees crowns in the way
 * @param bracketLines where brackets may go
 * @param mastZones where masts may stand
 * @param overheadLines never traded against anything
 * @param zones areas with a rule
 * @param people where people are
 * @param noise noise sources
 * @param metalwork solved as conductors
 * @param entry where the line comes in
 * @param datums tape points
 * @param brief what the station must do
 */
public record Plan(
    String format,
    String title,
    String notes,
    Site site,
    List<Point> boundary,
    List<BoundaryRule> boundaryRules,
    List<Building> buildings,
    List<Support> supports,
    List<Tree> trees,
    List<BracketLine> bracketLines,
    List<MastZone> mastZones,
    List<OverheadLine> overheadLines,
    List<Zone> zones,
    List<PeopleVolume> people,
    List<NoisePoint> noise,
    List<Metalwork> metalwork,
    Entry entry,
    List<Datum> datums,
    Brief brief) {
  public Plan {
    boundary = boundary == null ? List.of() : List.copyOf(boundary);
    boundaryRules = boundaryRules == null ? List.of() : List.copyOf(boundaryRules);
    buildings = buildings == null ? List.of() : List.copyOf(buildings);
    supports = supports == null ? List.of() : List.copyOf(supports);
    trees = trees == null ? List.of() : List.copyOf(trees);
    bracketLines = bracketLines == null ? List.of() : List.copyOf(bracketLines);
    mastZones = mastZones == null ? List.of() : List.copyOf(mastZones);
    overheadLines = overheadLines == null ? List.of() : List.copyOf(overheadLines);
    zones = zones == null ? List.of() : List.copyOf(zones);
    people = people == null ? List.of() : List.copyOf(people);
    noise = noise == null ? List.of() : List.copyOf(noise);
    metalwork = metalwork == null ? List.of() : List.copyOf(metalwork);
    datums = datums == null ? List.of() : List.copyOf(datums);
  }
}
