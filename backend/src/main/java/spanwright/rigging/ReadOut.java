package spanwright.rigging;

import java.util.ArrayList;
import java.util.List;
import spanwright.plan.Place;

/** Reads a hang out into its record. */
final class ReadOut {
  /** Pieces that wire hanging free is drawn in. */
  static final int TAIL_PARTS = 8;

  private final Hang hang;
  private final Rigging rigging;
  private final Layout layout;
  private final Course course;
  private final List<Look> looks = new ArrayList<>();

  ReadOut(Hang hang) {
    this.hang = hang;
    rigging = hang.rigging;
    layout = hang.layout;
    course = hang.course;
    for (int i = 0; i < course.spans().size(); i++) {
      looks.add(hang.statics.look(i));
    }
  }

  Rigged rigged() {
    List<Rigged.Attachment> attachments = attachments();
    List<Force> pulls = attachments.stream().map(Rigged.Attachment::pull).toList();
    List<Rigged.Mast> masts = rigging.masts.of(layout.attachments(), hang.holders, pulls);
    List<Rigged.Rope> ropes = new ArrayList<>();
    List<Rigged.Span> spans = new ArrayList<>();
    double[] beyond = new double[attachments.size()];
    for (int a = 0; a < beyond.length; a++) {
      beyond[a] = fall(a, attachments.get(a), masts, ropes);
    }
    for (int i = 0; i < looks.size(); i++) {
      spans.add(span(i, beyond));
      tails(spans.get(i), ropes);
    }
    guys(masts, ropes);
    WireOut wires = new WireOut(hang, looks, spans);
    List<Rigged.Tail> loose = wires.tails();
    Rigged rigged =
        new Rigged(
            layout,
            wires.conductors(loose),
            attachments,
            spans,
            loose,
            ropes,
            new LineOut(hang, looks, loose).feedLine(),
            masts,
            List.of(),
            List.of());
    return new Shortcomings(hang, looks, rigged).added();
  }

  // --- attachments

  private List<Rigged.Attachment> attachments() {
    List<Rigged.Attachment> attachments = new ArrayList<>();
    for (int a = 0; a < hang.holders.size(); a++) {
      Layout.Hold hold = layout.attachments().get(a);
      Statics.Counterweight weight = hang.statics.weight(a);
      boolean tied = course.isOuter(a) || course.corners()[a] != null;
      double travel = weight == null ? 0 : weight.travel();
      attachments.add(
          new Rigged.Attachment(
              hold.on(),
              hold.at(),
              hold.at().z() - rigging.ground.heightAt(hold.at().x(), hold.at().y()),
              weight != null ? "weight" : tied ? "tied" : "centre",
              weight == null ? null : Double.valueOf(weight.pull() / Hanging.GRAVITY),
              travel,
              weight == null ? 0 : weight.up(),
              weight == null ? 0 : weight.down(),
              weight == null ? null : Double.valueOf(ropeAt(a) - weight.down()),
              hang.statics.calm(a),
              hang.statics.worst(a),
              hang.holders.get(a).pullLimit()));
    }
    return attachments;
  }

  /** Rope between an attachment and the wire's end or bend [m]. */
  private double ropeAt(int a) {
    int i = course.at(a)[0];
    boolean first = course.spans().get(i).fromHold() == a;
    return first ? looks.get(i).ropeFrom() : looks.get(i).ropeTo();
  }

  /** The rope from an attachment down to where it is made off; what of it could run out. */
  private double fall(
      int a, Rigged.Attachment attachment, List<Rigged.Mast> masts, List<Rigged.Rope> ropes) {
    Holder holder = hang.holders.get(a);
    if (holder.isWall()) {
      return 0;
    }
    Place at = attachment.at();
    double foot = holder.footHeight(rigging.ground, at.x(), at.y());
    double height = at.z() - foot;
    boolean weighted = hang.statics.weight(a) != null;
    double wanted = weighted ? Practice.WEIGHT_HEIGHT : Practice.CLEAT_HEIGHT;
    double down = foot + Math.min(wanted, height / 2);
    List<Place> run = List.of(at, new Place(at.x(), at.y(), down));
    double length = at.z() - down;
    Rigged.Shapes still = still(run);
    String id = rigging.rope().id();
    if (weighted) {
      ropes.add(new Rigged.Rope("fall", a, still, length, id));
      return length;
    }
    // An endless halyard, both parts made off. Should its pulley or strop part, it comes down with
    // the wire's end, and one run of it trails beyond.
    ropes.add(new Rigged.Rope("halyard", a, still, 2 * length, id));
    return length;
  }

  private Rigged.Shapes still(List<Place> points) {
    List<Place> iced = rigging.isIcy() ? points : List.of();
    return new Rigged.Shapes(points, points, points, iced, iced, iced);
  }

  private void guys(List<Rigged.Mast> masts, List<Rigged.Rope> ropes) {
    for (Rigged.Mast mast : masts) {
      for (Place foot : mast.guyFeet()) {
        ropes.add(
            new Rigged.Rope(
                "guy",
                mast.attachments().get(0),
                still(List.of(mast.top(), foot)),
                mast.top().distance(foot),
                rigging.rope().id()));
      }
    }
  }

  // --- spans

  private Rigged.Span span(int i, double[] beyond) {
    Course.Stretch stretch = course.spans().get(i);
    Look look = looks.get(i);
    Materials materials = hang.materials(stretch.conductor());
    double sagInWind = 0;
    double blowOut = 0;
    for (Solved blown : look.blown()) {
      sagInWind = Math.max(sagInWind, sag(blown));
      blowOut = Math.max(blowOut, shift(look, blown));
    }
    return new Rigged.Span(
        stretch.fromHold(),
        stretch.toHold(),
        stretch.conductor(),
        look.shapes(),
        look.calm().wireFrom(),
        look.calm().wireTo(),
        sag(look.calm()),
        sagInWind,
        blowOut,
        stretch.wire(),
        look.ropeFrom(),
        look.ropeTo(),
        beyond[stretch.fromHold()] + hang.tailLength(stretch.fromHold()),
        beyond[stretch.toHold()] + hang.tailLength(stretch.toHold()),
        look.tension(),
        look.greatest(),
        Strength.of(look, materials));
  }

  /** Below the line between attachments, or between the bends that ropes hold. */
  private double sag(Solved state) {
    return Solved.sag(course.hangsTogether() ? wire(state) : state.points());
  }

  private static List<Place> wire(Solved state) {
    return state.points().subList(state.wireFrom(), state.wireTo() + 1);
  }

  private static double shift(Look look, Solved blown) {
    return Solved.shift(look.calm().points(), blown.points(), look.sideX(), look.sideY());
  }

  private void tails(Rigged.Span span, List<Rigged.Rope> ropes) {
    String id = rigging.rope().id();
    if (span.wireFrom() > 0 && isNew(span.from(), ropes)) {
      ropes.add(
          new Rigged.Rope(
              "tail", span.from(), span.shapes().part(0, span.wireFrom()), span.ropeFrom(), id));
    }
    int end = span.shapes().calm().size() - 1;
    if (span.wireTo() < end && isNew(span.to(), ropes)) {
      ropes.add(
          new Rigged.Rope(
              "tail", span.to(), span.shapes().part(span.wireTo(), end), span.ropeTo(), id));
    }
  }

  /** The rope at a bend belongs to both of its spans, and is one. */
  private boolean isNew(int attachment, List<Rigged.Rope> ropes) {
    return course.corners()[attachment] == null
        || ropes.stream().noneMatch(r -> r.attachment() == attachment && r.what().equals("tail"));
  }
}
