package spanwright.rigging;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Random;
import org.junit.jupiter.api.Test;
import spanwright.plan.Json;
import spanwright.plan.Place;

class HangingTest {
  private static HangCase with(
      Place from, Place to, HangCase.Wire wire, HangCase.Load load, double pull, double wind) {
    return new HangCase(from, to, wire, load, pull, HangCase.Held.TIED, wind, null, null);
  }

  private static final HangCase.Wire WIRE = new HangCase.Wire(0.0286, 0.0016, 240_000.0);

  @Test
  void the_example_of_the_contract_reads_and_answers() throws Exception {
    String text =
        """
        { "from": [0,0,8], "to": [20,0,7],
          "wire": { "weight": 0.0286, "diameter": 0.0016, "stiffness": 240000 },
          "load": { "fraction": 0.5, "weight": 0.35 },
          "pull": 80, "held": "weight", "wind": 25, "drag": 1.2, "air": 1.25 }
        """;
    HangAnswer answer = Hanging.solve(Json.mapper().readValue(text, HangCase.class));
    assertEquals(80, answer.calm().pullTo().size(), 1e-6);
    assertEquals(80, answer.inWind().pullTo().size(), 1e-6, "a counterweight's pull stays");
    assertTrue(answer.inWind().blowOut() > answer.calm().sag());
    String json = Json.mapper().writeValueAsString(answer);
    assertTrue(json.contains("\"blowOut\"") && json.contains("\"pullFrom\":["));
  }

  @Test
  void pulls_and_weights_balance_on_random_wires() {
    Random random = new Random(7);
    for (int i = 0; i < 400; i++) {
      double span = Math.pow(10, random.nextDouble() * 2);
      Place to = new Place(span, random.nextGaussian(), 5 + random.nextGaussian() * span / 4);
      double kilograms = 0.01 + random.nextDouble() * 0.05;
      Double stiffness = random.nextBoolean() ? null : 1e4 + 1e5 * random.nextDouble();
      HangCase.Load load =
          random.nextBoolean() ? null : new HangCase.Load(random.nextDouble(), random.nextDouble());
      double pull = 20 + 20 * kilograms * span + 200 * random.nextDouble();
      double wind = random.nextInt(3) * 10;
      HangCase given =
          with(
              new Place(0, 0, 5),
              to,
              new HangCase.Wire(kilograms, 0.002, stiffness),
              load,
              pull,
              wind);
      HangAnswer answer = Hanging.solve(given);
      HangAnswer.Calm calm = answer.calm();
      assertEquals(pull, calm.pullTo().size(), 1e-6 * pull);
      double hung = load == null ? 0 : load.weight();
      double stretch = stiffness == null ? 0 : pull * 1.5 / stiffness;
      double weight = (kilograms * calm.length() + hung) * Hanging.GRAVITY;
      Force sum = calm.pullFrom().plus(calm.pullTo());
      assertEquals(0, Math.hypot(sum.x(), sum.y()), 1e-7 * pull);
      assertEquals(-weight, sum.z(), 1e-7 * pull + weight * stretch);
      assertEquals(calm.length(), polyline(calm.points()), 2e-4 * calm.length());
      assertTrue(answer.inWind().pullTo().size() >= pull * (1 - 1e-9) || wind == 0);
    }
  }

  private static double polyline(java.util.List<Place> points) {
    double sum = 0;
    for (int i = 0; i + 1 < points.size(); i++) {
      sum += points.get(i).distance(points.get(i + 1));
    }
    return sum;
  }

  @Test
  void a_wire_seen_from_its_other_end_hangs_the_same() {
    Place a = new Place(1, 2, 9);
    Place b = new Place(20, -5, 6);
    HangAnswer.Calm calm =
        Hanging.solve(with(a, b, WIRE, new HangCase.Load(0.3, 0.4), 60, 0)).calm();
    double back = calm.pullFrom().size();
    HangAnswer.Calm other =
        Hanging.solve(with(b, a, WIRE, new HangCase.Load(0.7, 0.4), back, 0)).calm();
    assertEquals(calm.length(), other.length(), 1e-8);
    assertEquals(calm.sag(), other.sag(), 1e-3 * calm.sag());
    assertEquals(60, other.pullFrom().size(), 1e-6);
  }

  @Test
  void everything_longer_and_lighter_by_the_same_factor_hangs_alike() {
    HangAnswer.Calm one =
        Hanging.solve(
                with(
                    new Place(0, 0, 0),
                    new Place(20, 0, 3),
                    new HangCase.Wire(0.04, 0.0, null),
                    null,
                    50,
                    0))
            .calm();
    HangAnswer.Calm ten =
        Hanging.solve(
                with(
                    new Place(0, 0, 0),
                    new Place(200, 0, 30),
                    new HangCase.Wire(0.004, 0.0, null),
                    null,
                    50,
                    0))
            .calm();
    assertEquals(10 * one.sag(), ten.sag(), 1e-9 * ten.sag());
    assertEquals(10 * one.length(), ten.length(), 1e-9 * ten.length());
  }

  @Test
  void odd_wires_still_answer_in_numbers() {
    Place origin = new Place(0, 0, 0);
    HangCase[] odd = {
      with(origin, new Place(10, 0, 0), new HangCase.Wire(0.0, 0.0, null), null, 50, 0),
      with(origin, new Place(10, 0, 0), new HangCase.Wire(1e-9, 0.001, null), null, 50, 0),
      with(origin, new Place(0, 0, 8), new HangCase.Wire(0.03, 0.001, null), null, 50, 0),
      with(origin, new Place(0, 0, -8), WIRE, new HangCase.Load(0.5, 0.3), 50, 10),
      with(origin, new Place(0.001, 0, 8), WIRE, null, 50, 20),
      with(origin, new Place(0.002, 0, 0), WIRE, null, 5, 20),
      with(origin, new Place(20, 0, 1), WIRE, new HangCase.Load(0.0, 0.5), 60, 25),
      with(origin, new Place(20, 0, 1), WIRE, new HangCase.Load(1.0, 0.5), 60, 25),
      with(origin, new Place(20, 0, 1), WIRE, new HangCase.Load(0.5, 0.0), 60, 25),
      with(origin, new Place(20, 0, 1), WIRE, null, 5000, 60)
    };
    for (HangCase each : odd) {
      HangAnswer answer = Hanging.solve(each);
      double sum =
          answer.calm().sag()
              + answer.calm().length()
              + answer.inWind().sag()
              + answer.inWind().blowOut()
              + answer.inWind().pullFrom().size()
              + answer.calm().pullFrom().size();
      assertTrue(Double.isFinite(sum), each.toString());
      assertEquals(each.to(), answer.inWind().points().get(answer.inWind().points().size() - 1));
    }
  }

  @Test
  void a_spring_holds_between_a_weight_and_a_tie() {
    Place a = new Place(0, 0, 8);
    Place b = new Place(20, 0, 7);
    double weight = held(a, b, HangCase.Held.WEIGHT, null);
    double tied = held(a, b, HangCase.Held.TIED, null);
    double before = weight;
    for (double spring : new double[] {0.01, 10, 100, 1000, 1e5, 1e8}) {
      double pull = held(a, b, HangCase.Held.SPRING, spring);
      assertTrue(pull >= before - 1e-6, "the stiffer the spring, the more it pulls");
      before = pull;
    }
    assertEquals(weight, held(a, b, HangCase.Held.SPRING, 1e-3), 1e-3);
    assertEquals(tied, held(a, b, HangCase.Held.SPRING, 1e9), 1e-2 * tied);
    HangCase soft =
        new HangCase(a, b, WIRE, null, 80.0, HangCase.Held.SPRING, 25.0, null, null, 200.0);
    HangAnswer answer = Hanging.solve(soft);
    double drawn = answer.inWind().length() - answer.calm().length();
    assertEquals(80 + 200 * drawn, answer.inWind().pullTo().size(), 2);
    says("spring: is missing", spring(null, HangCase.Held.SPRING));
    says("spring: holds nothing", spring(5.0, HangCase.Held.TIED));
  }

  @Test
  void a_spring_too_soft_to_balance_is_refused_and_not_told_a_pull_it_does_not_have() {
    Place a = new Place(0, 0, 8);
    Place b = new Place(20, 0, 7);
    says(
        "stiffer spring",
        new HangCase(a, b, WIRE, null, 15.0, HangCase.Held.SPRING, 45.0, null, null, 2.0));
  }

  private static HangCase spring(Double spring, HangCase.Held held) {
    return new HangCase(
        new Place(0, 0, 8), new Place(20, 0, 7), WIRE, null, 80.0, held, 25.0, null, null, spring);
  }

  private static double held(Place a, Place b, HangCase.Held held, Double spring) {
    HangCase given = new HangCase(a, b, WIRE, null, 80.0, held, 25.0, null, null, spring);
    return Hanging.solve(given).inWind().pullTo().size();
  }

  @Test
  void what_cannot_hang_is_told_in_a_sentence() {
    Place a = new Place(0, 0, 8);
    Place b = new Place(20, 0, 7);
    says("pull: 1.00 N is less", with(a, b, WIRE, null, 1, 0));
    says("less than 1 mm apart", with(a, a, WIRE, null, 10, 0));
    says("wind: is 500", with(a, b, WIRE, null, 80, 500));
    says("wire.weight: is -1", with(a, b, new HangCase.Wire(-1.0, 0.001, null), null, 80, 0));
    says("wire.diameter: is missing", with(a, b, new HangCase.Wire(1.0, null, null), null, 80, 0));
    says("load.fraction", with(a, b, WIRE, new HangCase.Load(1.5, 1.0), 80, 0));
    says("is not a number", with(a, b, WIRE, null, Double.NaN, 0));
    says(
        "does not stretch cannot stand any wind",
        with(a, b, new HangCase.Wire(0.0, 0.002, null), null, 80, 20));
    says("from: ", new HangCase(null, b, WIRE, null, 80.0, HangCase.Held.TIED, null, null, null));
    says("held: ", new HangCase(a, b, WIRE, null, 80.0, null, null, null, null));
    HangCase lifted =
        new HangCase(
            a,
            new Place(90, 0, 8),
            new HangCase.Wire(0.02, 0.003, null),
            null,
            20.0,
            HangCase.Held.WEIGHT,
            50.0,
            null,
            null);
    says("Use a heavier weight or a tie", lifted);
  }

  private static void says(String part, HangCase given) {
    String message =
        assertThrows(IllegalArgumentException.class, () -> Hanging.solve(given)).getMessage();
    assertTrue(message.contains(part), message);
  }
}
