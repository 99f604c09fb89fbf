package spanwright.web;

import java.util.List;
import spanwright.assess.Placement;
import spanwright.clearance.Clearance;
import spanwright.clearance.State;
import spanwright.plan.Catalogues;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.search.Result;
import spanwright.search.Search;

/** Placements and results made by hand, for tests of what carries them. */
final class SomePlacements {
  private SomePlacements() {}

  /** A level wire between the masts of the test garden. */
  static Placement level(int rank) {
    Place west = new Place(2, 12, 9);
    Place east = new Place(22, 12, 9);
    List<Place> wire = List.of(new Place(5, 12, 8.8), new Place(19, 12, 8.8));
    return new Placement(
            "p00",
            0,
            1.5,
            List.of(new Placement.ScorePart("mean", 1.5)),
            "level",
            List.of(new Placement.Conductor(wire, Catalogues.standard().wire(null).id(), 14)),
            List.of(hold("west", west), hold("east", east)),
            new Placement.Feed(
                new Place(12, 12, 8.7),
                Catalogues.standard().line(null).id(),
                15,
                0,
                0.5,
                List.of(new Place(12, 12, 8.7), new Place(7, 3, 1.5))),
            List.of(
                new Clearance("boundary", "boundary", "wire", west, west, 2.0, 0.0, State.CLEAR)),
            List.of(),
            List.of(new Placement.Span(0, 1, wire, 0.2, 0.3, 0.5, 14, 80)),
            List.of(),
            List.of(),
            State.CLEAR,
            List.of(),
            "RF exposure not computed",
            null)
        .ranked(rank);
  }

  private static Placement.Attachment hold(String on, Place at) {
    return new Placement.Attachment(on, at, 9, 80, 120, 400.0, State.CLEAR, "tied", null);
  }

  /** A result with so many placements. */
  static Result result(Plan plan, Search.Options options, int placements) {
    List<Placement> all =
        java.util.stream.IntStream.rangeClosed(1, placements)
            .mapToObj(SomePlacements::level)
            .toList();
    return new Result(
        Result.FORMAT,
        plan.title(),
        options.seed(),
        options.effort().word(),
        new Result.Counts(10, 3, 5, 2, 6, 40),
        0.1,
        options.threads(),
        all,
        new Result.Reference("test", List.of()),
        List.of());
  }
}
