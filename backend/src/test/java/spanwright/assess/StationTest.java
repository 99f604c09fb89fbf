package spanwright.assess;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;
import spanwright.clearance.Refusal;
import spanwright.plan.Band;
import spanwright.plan.Catalogue;
import spanwright.plan.Catalogues;
import spanwright.plan.Place;
import spanwright.plan.Plan;
import spanwright.rigging.Layout;

/** From the feedpoint to the socket. */
class StationTest {
  private static final Catalogue CATALOGUE = Catalogues.standard();
  private static final Complex HARD = new Complex(8, -900);

  private static Plan with(String brief) {
    return Gardens.of("", "", Gardens.ONE_BAND + brief);
  }

  private static String line() {
    return CATALOGUE.line(null).id();
  }

  private static Band band(boolean receiveOnly) {
    return new Band("20 m", List.of(14.175), 1, receiveOnly);
  }

  private static Layout span() {
    return new Layout(
        "level",
        List.of(
            new Layout.Hold("west", new Place(5, 15, 9)),
            new Layout.Hold("east", new Place(35, 15, 9))),
        List.of(new Layout.Run(List.of(new Place(7, 15, 9), new Place(33, 15, 9)), null)),
        new Layout.FeedChoice(0, 0.5, null, null));
  }

  @Test
  void a_band_that_is_only_heard_puts_no_volts_on_anything() {
    Station station = new Station(with(", \"power\": 1500"), CATALOGUE);
    assertEquals(0, station.run(line(), 12, band(true), 14.175, HARD).peakVolts());
    assertTrue(station.run(line(), 12, band(false), 14.175, HARD).peakVolts() > 100);
  }

  @Test
  void the_length_chosen_is_no_worse_than_any_other_that_reaches() {
    Station station = new Station(with(""), CATALOGUE);
    List<Station.Load> loads = List.of(new Station.Load(band(false), 14.175, HARD));
    double best = station.bestLength(line(), 11.23, loads);
    assertTrue(best >= 11.23 && best <= 17.4, "length " + best);
    double least = cost(station, best);
    for (int i = 0; i <= 12; i++) {
      assertTrue(least <= cost(station, 11.3 + 0.5 * i) + 1e-6);
    }
  }

  private static double cost(Station station, double length) {
    var result = station.run(line(), length, band(false), 14.175, HARD);
    double state =
        switch (Station.state(result)) {
          case CLEAR -> 0;
          case TIGHT -> 1;
          case FOUL -> 10;
        };
    return Math.min(60, result.lossDb()) + Math.min(60, result.matching().lossDb()) + state;
  }

  @Test
  void of_lengths_at_hand_only_one_that_reaches_is_taken() {
    Station station = new Station(with(", \"lineLengths\": [8, 15, 25]"), CATALOGUE);
    List<Station.Load> loads = List.of(new Station.Load(band(false), 14.175, HARD));
    assertTrue(List.of(15.0, 25.0).contains(station.bestLength(line(), 11.23, loads)));
  }

  @Test
  void when_no_line_at_hand_reaches_that_is_a_refusal_with_its_cure() {
    Assessor assessor = Assessor.of(with(", \"lineLengths\": [8, 5]"), CATALOGUE);
    Hung hung = assessor.hang(span());
    assertFalse(hung.allowed());
    Refusal refusal =
        assessor.refuse(hung).stream()
            .filter(each -> each.to().equals("entry"))
            .findFirst()
            .orElseThrow();
    assertTrue(refusal.reason().startsWith("No feed line at hand reaches: the longest is 8.0 m"));
    assertTrue(refusal.cure().startsWith("Add a length of at least"), refusal.cure());
    assertTrue(Assessor.of(with(", \"lineLengths\": [8, 40]"), CATALOGUE).hang(span()).allowed());
  }
}
