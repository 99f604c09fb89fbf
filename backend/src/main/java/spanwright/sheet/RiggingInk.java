package spanwright.sheet;

import java.util.ArrayList;
import java.util.List;
import spanwright.assess.Placement;
import spanwright.clearance.Clearance;
import spanwright.clearance.State;
import spanwright.plan.Place;
import spanwright.plan.Plan;

/** Draws what is to be rigged, heavy: wire, ropes, feed line, points, tapes, tight distances. */
final class RiggingInk {
  private static final double WIRE = 0.8;

  private final SheetModel model;
  private final Plan plan;
  private final Placement placement;
  private final Frame frame;
  private final Figures figures;
  private final Labels labels;
  private final Pen pen;

  RiggingInk(SheetModel model, Frame frame, Labels labels, Pen pen) {
    this.model = model;
    this.plan = model.source().plan();
    this.placement = model.source().placement();
    this.frame = frame;
    this.figures = new Figures(model.options().units());
    this.labels = labels;
    this.pen = pen;
  }

  void draw() {
    ropes();
    feedLine();
    wires();
    newMasts();
    datums();
    entry();
    points();
    pieces();
    distances();
  }

  private void ropes() {
    for (Placement.RopeRun rope : placement.ropes()) {
      List<double[]> path = frame.places(rope.points());
      pen.path(path, 1.1, 0);
      pen.path(path, 0.35, 1, 1.8, 0.9);
      labels.avoid(path, 2);
    }
  }

  private void feedLine() {
    List<double[]> path = frame.places(placement.feed().path());
    twin(pen, path);
    labels.avoid(path, 3);
    if (path.size() > 1) {
      double[] m = SurveyInk.along(path, 0.5);
      String text = model.feedLine().mark() + " " + figures.length(model.feedLine().finished());
      labels.ask(35, Labels.around(m[0], m[1], text, SurveyInk.BODY, true, 1.2));
    }
  }

  /** The feed line: two thin lines side by side, told from every other kind without colour. */
  static void twin(Pen pen, List<double[]> path) {
    pen.path(path, 1.6, 0);
    pen.path(path, 1.0, 1);
    pen.path(path, 0.5, 0);
  }

  private void wires() {
    for (Placement.Conductor conductor : placement.conductors()) {
      List<double[]> path = frame.places(conductor.points());
      pen.path(path, WIRE + 1.2, 0);
      pen.path(path, WIRE, 1);
      labels.avoid(path, 14);
      double[] first = path.get(0);
      double[] last = path.get(path.size() - 1);
      if (Math.hypot(first[0] - last[0], first[1] - last[1]) > 0.3) {
        pen.circle(first[0], first[1], 0.85, 0.3, 1, 0);
        pen.circle(last[0], last[1], 0.85, 0.3, 1, 0);
      }
    }
    double[] feed = frame.at(placement.feed().at());
    pen.rect(feed[0] - 1.1, feed[1] - 1.1, 2.2, 2.2, 0.5, 0, 1);
  }

  private void newMasts() {
    for (Placement.NewMast mast : placement.masts()) {
      double[] at = frame.at(mast.foot());
      Symbols.mast(pen, at[0], at[1], false);
      for (Place foot : mast.guyFeet()) {
        double[] peg = frame.at(foot);
        pen.circle(peg[0], peg[1], 0.55, 0, Ink.NONE, 1);
      }
      String text = "new mast, " + figures.height(mast.height());
      labels.ask(40, Labels.around(at[0], at[1], text, SurveyInk.BODY, false, 2.4));
    }
  }

  private void datums() {
    List<SetOutParts.Known> known = new ArrayList<>();
    known.add(model.setOut().a());
    known.add(model.setOut().b());
    if (model.setOut().c() != null) {
      known.add(model.setOut().c());
    }
    if (model.setOut().proposed() != null) {
      known.add(model.setOut().proposed().known());
    }
    for (SetOutParts.Known k : known) {
      double[] at = frame.at(k.at());
      Symbols.datum(pen, at[0], at[1]);
      labels.block(Labels.box(at[0], at[1] - 0.4, 3.2, 3.2, 0));
      labels.ask(5, Labels.around(at[0], at[1], k.letter(), 10, true, 2.2));
    }
    double[] a = frame.at(model.setOut().a().at());
    double[] b = frame.at(model.setOut().b().at());
    double base = model.setOut().a().at().onPlan().distance(model.setOut().b().at().onPlan());
    labels.ask(45, 8, Dimensions.beside(a, b, figures.length(base), -4, 4, -7, 7));
  }

  private void entry() {
    if (plan.entry() == null) {
      return;
    }
    double[] at = frame.at(plan.entry().at());
    List<double[]> path = frame.places(placement.feed().path());
    double dx = 0;
    double dy = 0;
    for (int i = path.size() - 1; i >= 0 && Math.hypot(dx, dy) < 0.5; i--) {
      dx = at[0] - path.get(i)[0];
      dy = at[1] - path.get(i)[1];
    }
    Symbols.entry(pen, at[0], at[1], dx, dy);
    labels.block(Labels.box(at[0], at[1], 3, 3, 0));
  }

  private void points() {
    for (SetOutParts.Mark mark : model.setOut().points()) {
      double[] at = frame.at(mark.at());
      labels.block(Labels.box(at[0], at[1], 1.6, 1.6, 0));
      labels.ask(0, Labels.number(at[0], at[1], mark.number()));
    }
    for (Placement.Attachment held : placement.attachments()) {
      if (plan.mastZones().stream().anyMatch(z -> z.id().equals(held.on()))) {
        continue;
      }
      double[] at = frame.at(held.at());
      String text = "at " + figures.height(held.aboveGround());
      labels.ask(25, Labels.around(at[0], at[1], text, SurveyInk.BODY, true, 2));
    }
  }

  /** Each piece of wire with its finished length, beside its chord or along it. */
  private void pieces() {
    List<WireList.Piece> pieces = WireList.pieces(placement);
    for (int i = 0; i < pieces.size(); i++) {
      WireList.Piece piece = pieces.get(i);
      List<double[]> path =
          frame.places(
              WireList.part(
                  placement.conductors().get(piece.conductor()).points(),
                  piece.from(),
                  piece.to()));
      String text = piece.mark() + " " + figures.length(model.wires().get(i).finished());
      double[] a = path.get(0);
      double[] b = path.get(path.size() - 1);
      List<Labels.Spot> spots = new ArrayList<>();
      if (!piece.loop()) {
        spots.addAll(Dimensions.beside(a, b, text, 5, -5, 8, -8));
      }
      for (double share : new double[] {0.5, 0.35, 0.65, 0.2, 0.8}) {
        double[] at = SurveyInk.along(path, share);
        for (double off : new double[] {2.6, -2.6}) {
          spots.add(
              Labels.text(
                  at[0] - at[3] * off,
                  at[1] + at[2] * off,
                  text,
                  9,
                  true,
                  Labels.along(at[2], at[3]),
                  30 + Math.abs(share - 0.5)));
        }
      }
      labels.ask(8, spots);
    }
  }

  /** Every distance that is not clear, and the nearest to each power line. */
  private void distances() {
    for (OverheadParts.Line line : model.overhead().lines()) {
      placement.clearances().stream()
          .filter(c -> c.to().equals(line.id()))
          .filter(c -> OverheadList.regime(c) == OverheadList.Regime.AS_IT_HANGS)
          .filter(c -> line.nearest() != null && c.distance() == line.nearest().distance())
          .findFirst()
          .filter(c -> c.state() == State.CLEAR && OverheadList.countsWhenThingsFall(line))
          .ifPresent(c -> distance(c, figures.found(c.distance()), 33));
    }
    for (Clearance c : placement.clearances()) {
      if (c.state() != State.CLEAR) {
        String how =
            switch (OverheadList.regime(c)) {
              case AS_IT_HANGS -> "";
              case WIRE_LETS_GO -> " if a wire lets go";
              case MAST_FALLS -> " if a mast falls";
            };
        String text =
            figures.foundOf(c.distance(), c.required())
                + (overhead(c) ? how : "")
                + (c.state() == State.TIGHT ? ", tight" : ", foul");
        distance(c, text, 20);
      }
    }
  }

  private boolean overhead(Clearance c) {
    return plan.overheadLines().stream().anyMatch(l -> l.id().equals(c.to()));
  }

  private void distance(Clearance c, String text, int rank) {
    if (c.at() == null || c.toAt() == null) {
      return;
    }
    labels.ask(rank, Dimensions.between(frame.at(c.at()), frame.at(c.toAt()), text));
  }
}
