package spanwright.sheet;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import spanwright.assess.Placement;
import spanwright.plan.MatchingChoice;
import spanwright.plan.MatchingKind;

/** Everything to lay out on the grass before work begins, with what to bring besides. */
final class HardwareList {
  private final Job job;
  private final List<CutParts.Item> items = new ArrayList<>();

  private HardwareList(Job job) {
    this.job = job;
  }

  static List<CutParts.Item> of(
      Job job, List<CutParts.WirePiece> wires, CutParts.FeedLine line, List<CutParts.Rope> ropes) {
    HardwareList list = new HardwareList(job);
    list.addLengths(wires, line, ropes);
    list.addInsulators();
    list.addRopeWork(ropes);
    list.addMasts();
    list.addStation(line);
    return list.items;
  }

  private void add(String what, int count, int spares, String note) {
    if (count <= 0) {
      return;
    }
    for (int i = 0; i < items.size(); i++) {
      CutParts.Item old = items.get(i);
      if (old.what().equals(what) && Objects.equals(old.note(), note)) {
        items.set(i, new CutParts.Item(what, old.count() + count, null, spares, note));
        return;
      }
    }
    items.add(new CutParts.Item(what, count, null, spares, note));
  }

  /** Totals by kind, which is how wire and rope are bought. */
  private void addLengths(
      List<CutParts.WirePiece> wires, CutParts.FeedLine line, List<CutParts.Rope> ropes) {
    Map<String, Double> sums = new LinkedHashMap<>();
    wires.forEach(w -> sums.merge(w.kind(), w.cut(), Double::sum));
    sums.merge(line.kind(), line.cut(), Double::sum);
    ropes.forEach(r -> sums.merge(r.kind(), r.cut(), Double::sum));
    sums.forEach(
        (kind, sum) ->
            items.add(new CutParts.Item(kind, 1, Math.round(sum * 100) / 100.0, 0, "in all")));
  }

  private void addInsulators() {
    int ends = 0;
    int along = 0;
    List<WireList.Piece> pieces = WireList.pieces(job.placement);
    for (WireList.Piece piece : pieces) {
      ends += piece.loop() || piece.free() > 0 ? 0 : 1;
      along += piece.free() > 0 ? 1 : 0;
    }
    if (pieces.stream().anyMatch(WireList.Piece::loop)) {
      along +=
          (int)
              job.placement.attachments().stream().filter(a -> !"centre".equals(a.held())).count();
    }
    add("end insulators, 100 mm", ends, 1, null);
    long held = job.placement.attachments().stream().filter(a -> "centre".equals(a.held())).count();
    boolean middle = feedIsInside();
    boolean feedHeld =
        job.placement.attachments().stream()
            .anyMatch(
                a ->
                    "centre".equals(a.held())
                        && a.at().onPlan().distance(job.placement.feed().at().onPlan()) < 1);
    add(
        middle ? "centre piece with strain relief" : "feed insulator with strain relief",
        1,
        0,
        null);
    add("insulators the wire runs through", (int) held - (feedHeld ? 1 : 0) + along, 0, null);
  }

  private boolean feedIsInside() {
    double fraction = job.placement.feed().fraction();
    return fraction > 0.005 && fraction < 0.995;
  }

  private void addRopeWork(List<CutParts.Rope> ropes) {
    int lifts =
        (int) ropes.stream().map(CutParts.Rope::over).filter(o -> o != null).distinct().count();
    int guys = (int) ropes.stream().filter(r -> r.mark().startsWith("G")).count();
    add("pulleys to suit the rope", lifts, lifts == 0 ? 0 : 1, null);
    add("thimbles", ropes.size() + guys, 1, null);
    add("shackles", lifts + guys, 1, null);
    int weights = 0;
    for (Placement.Attachment held : job.placement.attachments()) {
      if (held.kilograms() != null) {
        weights++;
        add(
            "weight, " + job.holder(held),
            1,
            0,
            Figures.kilograms(held.kilograms())
                + " kg ("
                + Figures.newtons(held.kilograms())
                + " N), filled and weighed on site");
      }
    }
    for (HangParts.Margins span : HangingList.margins(job)) {
      if (span.weakLink() != null) {
        add(
            "weak link, parts at " + Figures.whole(Math.floor(span.weakLink())) + " N",
            1,
            1,
            "in one rope of each span that has one");
      }
    }
    int cleats = Math.max(0, lifts - weights);
    add(cleats == 1 ? "cleat" : "cleats", cleats, 0, null);
  }

  private void addMasts() {
    for (Placement.NewMast mast : job.placement.masts()) {
      String foot = job.zone(mast.zone()).map(z -> z.base() > 0).orElse(false) ? "roof" : "ground";
      add(
          "mast, " + job.name(mast.zone()),
          1,
          0,
          job.figures.sayHeight(mast.height()) + " from foot to head, on the " + foot);
      add("guy pegs, 0.75 m", mast.guyFeet().size(), 1, null);
    }
  }

  private void addStation(CutParts.FeedLine line) {
    boolean standOff = line.standOffReach() > 0;
    add(
        standOff ? "line stand-offs" : "line clips",
        line.standOffs(),
        1,
        standOff ? job.figures.sayCut(line.standOffReach()) + " reach" : null);
    add("arrester or earthing switch, at the entry", 1, 0, null);
    add("earth rod with clamp and conductor", 1, 0, "as the local code asks");
    String unit = matchingUnit();
    if (unit != null) {
      add(unit, 1, 0, "at the station");
    }
  }

  private String matchingUnit() {
    MatchingChoice choice = job.plan.brief() == null ? null : job.plan.brief().matching();
    if (choice != null && choice.unit() != null) {
      return "matching unit as in the brief";
    }
    return job.catalogue.matchingUnits().stream()
        .filter(m -> choice == null ? m.isDefault() : m.id().equals(choice.id()))
        .map(MatchingKind::name)
        .findFirst()
        .orElse(null);
  }
}
