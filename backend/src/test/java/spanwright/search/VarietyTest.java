package spanwright.search;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import spanwright.assess.Placement;
import spanwright.clearance.State;
import spanwright.plan.Place;

/** A list without copies of one idea. */
class VarietyTest {
  private static Placement placement(double score, double fraction, Placement.Attachment... on) {
    return placement(true, score, fraction, on);
  }

  private static Placement placement(
      boolean sure, double score, double fraction, Placement.Attachment... on) {
    return new Placement(
        "p00",
        0,
        score,
        List.of(),
        "sloping",
        List.of(new Placement.Conductor(List.of(), "wire", 10)),
        List.of(on),
        new Placement.Feed(new Place(0, 0, 5), "line", 10, 0, fraction, List.of()),
        List.of(),
        List.of(),
        List.of(),
        List.of(),
        List.of(),
        State.CLEAR,
        List.of(),
        "",
        sure ? null : new Placement.Quality(false, List.of("no"), List.of()));
  }

  private static Placement.Attachment at(String on, double x, double z) {
    return new Placement.Attachment(
        on, new Place(x, 0, z), z, 80, 90, null, State.CLEAR, "tied", null);
  }

  private static List<Double> chosen(int top, Placement... bestFirst) {
    return Variety.choose(List.of(bestFirst), top).stream().map(Placement::score).toList();
  }

  @Test
  void what_is_doubtful_comes_after_everything_that_is_sure() {
    List<Placement> all =
        new ArrayList<>(
            List.of(
                placement(false, 9, 0.5, at("oak", 0, 6), at("bed", 12, 7)),
                placement(true, 1, 0.5, at("ash", 0, 6), at("bed", 12, 7)),
                placement(true, 2, 0.5, at("elm", 0, 6), at("bed", 12, 7))));
    all.sort(Variety.BEST_FIRST);
    List<Placement> chosen = Variety.choose(all, 5);
    assertEquals(List.of(2.0, 1.0, 9.0), chosen.stream().map(Placement::score).toList());
    assertEquals(2, Variety.choose(all, 2).stream().filter(Placement::reliable).count());
  }

  @Test
  void a_near_copy_is_left_out_also_when_it_runs_the_other_way() {
    assertEquals(
        List.of(3.0),
        chosen(
            5,
            placement(3, 0.34, at("bed", 0, 6), at("bed", 12, 7)),
            placement(2, 0.35, at("bed", 0.5, 6.2), at("bed", 12, 7)),
            placement(1, 0.66, at("bed", 12.5, 7), at("bed", 0.4, 6))));
  }

  @Test
  void fed_at_its_other_end_it_is_another_placement() {
    assertEquals(
        List.of(3.0, 2.0),
        chosen(
            5,
            placement(3, 0.34, at("bed", 0, 6), at("bed", 12, 7)),
            placement(2, 0.34, at("bed", 12, 7), at("bed", 0, 6))));
  }

  @Test
  void a_third_of_one_family_waits_until_the_others_have_had_their_turn() {
    Placement[] all =
        IntStream.range(0, 5)
            .mapToObj(
                i ->
                    i < 4
                        ? placement(9 - i, 0.5, at("oak", 0, 4 + 2 * i), at("elm", 20, 8))
                        : placement(1, 0.5, at("oak", 0, 8), at("gable", 9, 6)))
            .toArray(Placement[]::new);
    assertEquals(List.of(9.0, 8.0, 1.0), chosen(3, all));
    assertEquals(List.of(9.0, 8.0, 7.0, 1.0), chosen(4, all));
  }
}
