package spanwright.rigging;

import java.util.ArrayList;
import java.util.List;
import spanwright.plan.Place;
import spanwright.published.Check;
import spanwright.published.PublishedChecks;

/** Hanging wires against textbook problems and the exact relations of the catenary. */
public class TextbookCatenaryTest extends PublishedChecks {
  private static final double G = Hanging.GRAVITY;
  private static final String EXAM = "engineering-mechanics board-exam problem with printed answer";
  private static final String TUTORIAL = "line-sag tutorial, printed parabola 3.125 m";
  private static final String POWER =
      "Chakrabarti et al., A Text Book on Power System Engineering, example 5.9 (printed parabola)";
  private static final String CROSSING =
      "power-systems textbook, example 7.4; the exact catenary worked out apart";
  private static final String STATICS =
      "statics textbook exercise (statement read, result worked out apart)";
  private static final String EXACT = "exact relations of the catenary, worked out apart";

  @Override
  public String heading() {
    return "Rigging: hanging wire";
  }

  @Override
  public String about() {
    return "Inextensible wire between two points. Tolerances are the printed digits; where the"
        + " source prints the parabola, its known distance from the catenary is allowed.";
  }

  private static HangAnswer hang(double span, double rise, double weight, double pull) {
    return Hanging.solve(
        new HangCase(
            new Place(0, 0, 0),
            new Place(span, 0, rise),
            new HangCase.Wire(weight, 0.0, null),
            null,
            pull,
            HangCase.Held.TIED,
            null,
            null,
            null));
  }

  /** Level span, from its horizontal pull: the pull at the end is w(c + sag). */
  private static double endPull(double span, double newtonsPerMetre, double level) {
    double c = level / newtonsPerMetre;
    return newtonsPerMetre * c * Math.cosh(span / 2 / c);
  }

  @Override
  public List<Check> checks() {
    List<Check> checks = new ArrayList<>();
    HangAnswer.Calm exam = hang(778.4937, 0, 0.4, 416 * G).calm();
    checks.add(
        Check.within("length, 0.4 kg/m, pull 416 kgf", 800, exam.length(), 0.08, 2, "m", EXAM));
    checks.add(Check.within("sag, same cable", 80, exam.sag(), 0.02, 2, "m", EXAM));
    double pull = endPull(500, G, 10_000 * G);
    checks.add(
        Check.within(
            "sag, 1 kg/m over 500 m, 10 000 kgf level",
            3.12516,
            hang(500, 0, 1, pull).calm().sag(),
            2e-4,
            4,
            "m",
            TUTORIAL));
    double erection = endPull(300, 0.844 * G, 1710 * G);
    checks.add(
        Check.within(
            "sag, 0.844 kg/m over 300 m, 1710 kgf level",
            5.55,
            hang(300, 0, 0.844, erection).calm().sag(),
            0.011,
            3,
            "m",
            POWER));
    checks.add(crossing());
    double scale = 9.81 / G;
    HangAnswer.Calm slack = hang(120, 0, 3 * scale, 2741).calm();
    checks.add(
        Check.within(
            "length, 3 kg/m over 120 m, 2741 N", 140, slack.length(), 0.14, 2, "m", STATICS));
    checks.add(Check.within("sag, same line", 31.70, slack.sag(), 0.04, 2, "m", STATICS));
    double level = Math.hypot(slack.pullFrom().x(), slack.pullFrom().y());
    checks.add(Check.within("level pull, same line", 1808, level, 2, 0, "N", STATICS));
    checks.addAll(ratios());
    checks.addAll(copper());
    checks.add(verySlack());
    return checks;
  }

  private static Check crossing() {
    // Towers 30 m and 90 m above the water, 300 m apart, 1 kg/m, 2000 kgf level: height mid-span.
    double w = G;
    double h = 2000 * G;
    double c = h / w;
    double x1 = -150 + c * asinh(60 / (2 * c * Math.sinh(150 / c)));
    double pull = w * c * Math.cosh((x1 + 300) / c);
    List<Place> points = hang(300, 60, 1, pull).calm().points();
    return Check.within(
        "height above the water mid-span, supports 30 and 90 m high",
        54.26,
        30 + heightAt(points, 150),
        0.02,
        2,
        "m",
        CROSSING);
  }

  private static double heightAt(List<Place> points, double x) {
    for (int i = 0; i + 1 < points.size(); i++) {
      Place a = points.get(i);
      Place b = points.get(i + 1);
      if (b.x() >= x) {
        return a.z() + (x - a.x()) / (b.x() - a.x()) * (b.z() - a.z());
      }
    }
    throw new IllegalStateException("no point beyond x");
  }

  private static double asinh(double x) {
    return Math.log(x + Math.sqrt(x * x + 1));
  }

  private static List<Check> ratios() {
    double[][] rows = {
      {0.01, 1.000267},
      {0.02, 1.001066},
      {0.05, 1.006636},
      {0.10, 1.026187},
      {0.15, 1.057674},
      {0.20, 1.099718},
      {0.25, 1.150791}
    };
    List<Check> checks = new ArrayList<>();
    for (double[] row : rows) {
      // c from the sag of a span of 1 m, by bisection on c (cosh(1/2c) − 1) = sag.
      double low = 0.2;
      double high = 100;
      for (int i = 0; i < 200; i++) {
        double c = (low + high) / 2;
        if (c * (Math.cosh(0.5 / c) - 1) > row[0]) {
          low = c;
        } else {
          high = c;
        }
      }
      HangAnswer.Calm calm = hang(100, 0, 1 / G, endPull(100, 1, 100 * low)).calm();
      checks.add(
          Check.within(
              "length over span at sag/span " + row[0],
              row[1],
              calm.length() / 100,
              1e-6,
              6,
              "",
              EXACT));
    }
    return checks;
  }

  private static List<Check> copper() {
    double[][] rows = {{20, 1.0225, 30.0927}, {50, 0.4085, 30.0148}, {100, 0.2042, 30.0037}};
    List<Check> checks = new ArrayList<>();
    for (double[] row : rows) {
      HangAnswer.Calm calm = hang(30, 0, 0.1815 / G, endPull(30, 0.1815, row[0])).calm();
      String what = String.format("14 AWG copper over 30 m, %.0f N level: ", row[0]);
      checks.add(Check.within(what + "sag", row[1], calm.sag(), 1.5e-4, 4, "m", EXACT));
      checks.add(Check.within(what + "length", row[2], calm.length(), 1e-4, 4, "m", EXACT));
    }
    return checks;
  }

  private static Check verySlack() {
    // 90 m of cable between level ends 60 m apart, 300 N at the ends: looser than the loosest that
    // a pull can set, so hung by its length; the pull comes out.
    Chain chain = new Chain(1);
    chain.length[0] = 90;
    chain.setLoad(0, 0, 0, -56.6 * 9.81 / 90);
    new Tightening(chain, 60, 0, 0).asLong(30);
    return Check.within(
        "end pull, 90 m of cable weighing 56.6 kg over 60 m",
        300,
        chain.tensionAtStart(),
        0.3,
        1,
        "N",
        STATICS);
  }
}
