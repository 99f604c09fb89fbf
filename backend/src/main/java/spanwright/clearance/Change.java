package spanwright.clearance;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.function.Function;
import spanwright.plan.BracketLine;
import spanwright.plan.GroundSurface;
import spanwright.plan.Place;
import spanwright.plan.Point;
import spanwright.rigging.Holder;
import spanwright.rigging.Layout;
import spanwright.rigging.PlanShapes;

/**
 * One way to change a layout, by so much.
 *
 * @param kind what is changed
 * @param attachment index of the attachment that moves, or -1 for all or none
 * @param direction of a move on plan [rad from east], or +1 and -1 along a bracket line; for a
 *     shorter wire or a moved feedpoint -1 at or to its first end, +1 its last, 0 at both
 * @param amount metres
 * @param other catalogue id of another wire, id of another thing to hold it, or null
 */
record Change(Kind kind, int attachment, double direction, double amount, String other) {
  /** What can be changed. */
  enum Kind {
    RAISE,
    LOWER,
    MOVE,
    SLIDE,
    SHORTEN,
    FEED,
    LIGHTEN,
    HOLD
  }

  private static final double[] STEPS = {0.25, 0.5, 1, 1.5, 2, 3, 4, 6};

  /** Everything worth trying on a layout, smallest first. */
  static List<Change> all(List<Holder> holders, boolean line, List<String> lighter) {
    List<Change> all = new ArrayList<>();
    for (double step : STEPS) {
      for (int a = 0; a < holders.size(); a++) {
        all.add(new Change(Kind.RAISE, a, 0, step, null));
        all.add(new Change(Kind.LOWER, a, 0, step, null));
        if (holders.get(a).zone() != null) {
          for (int k = 0; k < 8; k++) {
            all.add(new Change(Kind.MOVE, a, k * Math.PI / 4, step, null));
          }
        }
        if (holders.get(a).bracket() != null) {
          all.add(new Change(Kind.SLIDE, a, 1, step, null));
          all.add(new Change(Kind.SLIDE, a, -1, step, null));
        }
      }
      all.add(new Change(Kind.RAISE, -1, 0, step, null));
      all.add(new Change(Kind.SHORTEN, -1, 0, 2 * step, null));
      all.add(new Change(Kind.SHORTEN, -1, -1, step, null));
      all.add(new Change(Kind.SHORTEN, -1, 1, step, null));
      if (line) {
        all.add(new Change(Kind.FEED, -1, -1, step, null));
        all.add(new Change(Kind.FEED, -1, 1, step, null));
      }
    }
    lighter.forEach(each -> all.add(new Change(Kind.LIGHTEN, -1, 0, 1, each)));
    return all;
  }

  Change by(double much) {
    return new Change(kind, attachment, direction, much, other);
  }

  /** Whether there is more or less of it. */
  boolean isScaled() {
    return kind != Kind.LIGHTEN && kind != Kind.HOLD;
  }

  /**
   * Another thing to hold each end, the nearest first.
   *
   * @param all what the plan has
   * @param most changes at most
   */
  static List<Change> otherHolds(
      List<Layout.Hold> holds, Collection<Holder> all, GroundSurface ground, int most) {
    Set<String> used = new HashSet<>();
    holds.forEach(each -> used.add(each.on()));
    List<Change> changes = new ArrayList<>();
    for (int a = 0; a < holds.size(); a++) {
      for (Holder each : all) {
        boolean never = each.pullLimit() != null && each.pullLimit() <= 0;
        Place to = never || used.contains(each.id()) ? null : onTo(holds.get(a).at(), each, ground);
        if (to != null) {
          double way = to.onPlan().distance(holds.get(a).at().onPlan());
          changes.add(new Change(Kind.HOLD, a, 0, way, each.id()));
        }
      }
    }
    changes.sort(
        Comparator.comparingDouble(Change::amount)
            .thenComparingInt(Change::attachment)
            .thenComparing(Change::other));
    return changes.subList(0, Math.min(most, changes.size()));
  }

  /** The place on another thing that is most like the one there was, or null where it has none. */
  private static Place onTo(Place at, Holder other, GroundSurface ground) {
    Point to;
    if (other.support() != null) {
      to = other.support().at();
    } else if (other.bracket() != null) {
      to = nearestOn(other.bracket().path(), at.onPlan());
    } else {
      to = middle(other.zone().area());
      if (!PlanShapes.contains(other.zone().area(), to.x(), to.y())) {
        return null;
      }
    }
    double above = at.z() - ground.heightAt(at.x(), at.y());
    above = Math.max(other.lowest(), Math.min(other.highest(), above));
    return raised(to, above, ground);
  }

  private static Point middle(List<Point> area) {
    double x = area.stream().mapToDouble(Point::x).average().orElse(0);
    double y = area.stream().mapToDouble(Point::y).average().orElse(0);
    return new Point(x, y);
  }

  private static Point nearestOn(List<Point> path, Point at) {
    Point nearest = path.get(0);
    for (int i = 0; i + 1 < path.size(); i++) {
      Point a = path.get(i);
      Point b = path.get(i + 1);
      double dx = b.x() - a.x();
      double dy = b.y() - a.y();
      double square = dx * dx + dy * dy;
      double t = square == 0 ? 0 : ((at.x() - a.x()) * dx + (at.y() - a.y()) * dy) / square;
      t = Math.max(0, Math.min(1, t));
      Point foot = new Point(a.x() + t * dx, a.y() + t * dy);
      nearest = foot.distance(at) < nearest.distance(at) ? foot : nearest;
    }
    return nearest;
  }

  boolean isOneOf(Change other) {
    return kind == other.kind && attachment == other.attachment && direction == other.direction;
  }

  /**
   * The attachments after the change, or null where what holds them does not allow it.
   *
   * @param byId what the plan has to hold a wire
   */
  List<Layout.Hold> holds(
      List<Layout.Hold> holds, Function<String, Holder> byId, GroundSurface ground) {
    List<Layout.Hold> changed = new ArrayList<>(holds);
    if (kind == Kind.HOLD) {
      Place to = onTo(holds.get(attachment).at(), byId.apply(other), ground);
      if (to == null) {
        return null;
      }
      changed.set(attachment, new Layout.Hold(other, to));
      return changed;
    }
    boolean stays = kind == Kind.SHORTEN || kind == Kind.LIGHTEN || kind == Kind.FEED;
    boolean moved = stays;
    for (int a = 0; a < holds.size() && !stays; a++) {
      if (attachment >= 0 && attachment != a) {
        continue;
      }
      Place to = moved(holds.get(a).at(), byId.apply(holds.get(a).on()), ground);
      if (to != null) {
        changed.set(a, new Layout.Hold(holds.get(a).on(), to));
        moved = true;
      }
    }
    return moved ? changed : null;
  }

  private Place moved(Place at, Holder holder, GroundSurface ground) {
    double above = at.z() - ground.heightAt(at.x(), at.y());
    switch (kind) {
      case RAISE, LOWER -> {
        double wanted = above + (kind == Kind.RAISE ? amount : -amount);
        boolean fits = wanted <= holder.highest() + 1e-9 && wanted >= holder.lowest() - 1e-9;
        return fits ? new Place(at.x(), at.y(), at.z() + wanted - above) : null;
      }
      case MOVE -> {
        if (holder.zone() == null) {
          return null; // another hold took it off its mast zone
        }
        Point to =
            new Point(at.x() + amount * Math.cos(direction), at.y() + amount * Math.sin(direction));
        return PlanShapes.contains(holder.zone().area(), to.x(), to.y())
            ? raised(to, above, ground)
            : null;
      }
      case SLIDE -> {
        Point to = holder.bracket() == null ? null : slid(holder.bracket(), at.onPlan());
        return to == null ? null : raised(to, above, ground);
      }
      default -> {
        return null;
      }
    }
  }

  private static Place raised(Point to, double above, GroundSurface ground) {
    return new Place(to.x(), to.y(), ground.heightAt(to) + above);
  }

  /** The point so far on along the bracket line's first or only straight part. */
  private Point slid(BracketLine line, Point at) {
    for (int i = 0; i + 1 < line.path().size(); i++) {
      Point a = line.path().get(i);
      Point b = line.path().get(i + 1);
      double away = PlanShapes.toSegment(a.x(), a.y(), b.x(), b.y(), at.x(), at.y());
      double length = a.distance(b);
      if (away < 0.5 && length > 0) {
        double ux = (b.x() - a.x()) / length;
        double uy = (b.y() - a.y()) / length;
        double along = (at.x() - a.x()) * ux + (at.y() - a.y()) * uy + direction * amount;
        if (along >= 0 && along <= length) {
          return new Point(a.x() + along * ux, a.y() + along * uy);
        }
      }
    }
    return null;
  }

  /** A coordinate as it stands on the page, with a true minus. */
  private static String signed(double metres) {
    return String.format(Locale.ROOT, "%.2f", metres).replace('-', '−');
  }

  /**
   * The change as an order.
   *
   * @param to the attachments after it
   */
  String sentence(List<Layout.Hold> to, Function<String, Holder> byId, GroundSurface ground) {
    List<Holder> holders = to.stream().map(each -> byId.apply(each.on())).toList();
    String metres = String.format(Locale.ROOT, "%.2f m", amount);
    switch (kind) {
      case RAISE, LOWER -> {
        String verb = kind == Kind.RAISE ? "Raise" : "Lower";
        if (attachment < 0) {
          return verb + " every attachment that allows it by " + metres + ".";
        }
        Place at = to.get(attachment).at();
        return String.format(
            Locale.ROOT,
            "%s the attachment at %s by %s, to %.2f m above the ground.",
            verb,
            holders.get(attachment).name(),
            metres,
            at.z() - ground.heightAt(at.x(), at.y()));
      }
      case MOVE, SLIDE -> {
        Place at = to.get(attachment).at();
        return String.format(
            Locale.ROOT,
            "Move the %s at %s by %s, to %s m east, %s m north on the plan.",
            kind == Kind.MOVE ? "mast" : "bracket",
            holders.get(attachment).name(),
            metres,
            signed(at.x()),
            signed(at.y()));
      }
      case SHORTEN -> {
        String where =
            direction == 0
                ? "half of it at each end"
                : "at " + holders.get(direction < 0 ? 0 : holders.size() - 1).name();
        return "Shorten the wire by " + metres + ", " + where + ", with rope in its place.";
      }
      case FEED -> {
        return String.format(
            Locale.ROOT,
            "Move the feedpoint %s towards %s.",
            metres,
            holders.get(direction < 0 ? 0 : holders.size() - 1).name());
      }
      case HOLD -> {
        Place at = to.get(attachment).at();
        return String.format(
            Locale.ROOT,
            "Hold the wire's %s at %s instead, %.2f m above the ground.",
            attachment == 0 ? "first end" : attachment == to.size() - 1 ? "last end" : "bend",
            holders.get(attachment).name(),
            at.z() - ground.heightAt(at.x(), at.y()));
      }
      default -> {
        return "Take a lighter wire: " + other + ".";
      }
    }
  }
}
