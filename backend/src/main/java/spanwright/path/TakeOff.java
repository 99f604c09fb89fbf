package spanwright.path;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/**
 * Take-off windows: which elevations matter for a target on a frequency.
 *
 * <p>For each layer and number of hops the window runs from the elevation at the layer's least
 * height to that at its greatest, cut below at {@link #LEAST_DEGREES} and above where the secant
 * law says the frequency would pass through: f&middot;cos i may not be over the layer's critical
 * frequency (Martyn 1935; Davies, Ionospheric Radio, 1990).
 *
 * <p>Scored is the F2 window with the fewest hops that the middle height (325 km) serves from at
 * least {@link #LEAST_DEGREES}: each hop more costs another reflection from the ground and two more
 * passes through the absorbing layer. Where F2 cannot turn the frequency back so steeply, sporadic
 * E is scored, then E; where nothing can, the F2 geometry stands and the note says so.
 */
public final class TakeOff {
  /**
   * Rays below this are not counted: hills, houses and the soil's reflection take them. With it the
   * longest F2 hop is 4080 km, against "about 4000 km" in US Federal Standard 1037C.
   */
  public static final double LEAST_DEGREES = 1.5;

  /** Nearer than this to the antipode every bearing leads there [km]. */
  public static final double ANTIPODE_KM = 100;

  private static final double ROUND_THE_EARTH_KM = 2 * Math.PI * Hop.EARTH_RADIUS_KM;

  /** Once round, on whichever great circle, rounded up [km]. */
  private static final double FARTHEST_KM = 40_100;

  private static final double FARTHEST_NEAR_VERTICAL_KM = 2000;

  /** Hop numbers reported beyond the least. */
  private static final int MORE_F2_HOPS = 2;

  private static final int MOST_E_HOPS = 2;

  private TakeOff() {}

  /**
   * Windows toward a target at a distance.
   *
   * @param distanceKm along the great circle; over 20,000 is the long way round
   * @param frequencyMHz 0.1 to 1000
   * @return at least one window
   */
  public static Windows toward(double distanceKm, double frequencyMHz) {
    requireFrequency(frequencyMHz);
    if (!(distanceKm >= 0 && distanceKm <= FARTHEST_KM)) {
      throw new IllegalArgumentException(
          said(
              "A target %s km away is farther than once round the earth. Give 0 to 40,100 km.",
              distanceKm));
    }
    List<Window> f2 = windows(Layer.F2, distanceKm, frequencyMHz, MORE_F2_HOPS, 99);
    List<Window> e = windows(Layer.E, distanceKm, frequencyMHz, 0, MOST_E_HOPS);
    List<Window> es = windows(Layer.ES, distanceKm, frequencyMHz, 0, MOST_E_HOPS);
    List<Window> all = new ArrayList<>(f2);
    all.addAll(e);
    all.addAll(es);
    int fewest = fewestHops(distanceKm, middleKm(Layer.F2));
    Optional<Window> byF2 =
        f2.stream()
            .filter(w -> w.hops() >= fewest)
            .findFirst()
            .or(() -> f2.stream().reduce((one, next) -> next));
    if (byF2.isPresent()) {
      return new Windows(all, byF2.get(), "");
    }
    if (!es.isEmpty() || !e.isEmpty()) {
      Window scored = es.isEmpty() ? e.get(0) : es.get(0);
      String by = es.isEmpty() ? "the E layer" : "sporadic E";
      return new Windows(
          all,
          scored,
          said("%s MHz goes through F2 so near by; only %s serves this target.", frequencyMHz, by));
    }
    Window plain = window(Layer.F2, distanceKm, fewest, Layer.F2.highestKm()).orElseThrow();
    return new Windows(
        List.of(plain),
        plain,
        said(
            "%s MHz is hardly ever turned back so steeply; count on ground wave and scatter at "
                + "most. Scored as if F2 did.",
            frequencyMHz));
  }

  /**
   * The window of near-vertical cover: from the elevation that reaches the edge by the lowest F2
   * height up to the zenith, all round.
   *
   * @param radiusKm of the area to cover, over 0, at most 2000
   * @param frequencyMHz 0.1 to 1000
   */
  public static Windows nearVertical(double radiusKm, double frequencyMHz) {
    requireFrequency(frequencyMHz);
    if (!(radiusKm > 0 && radiusKm <= FARTHEST_NEAR_VERTICAL_KM)) {
      throw new IllegalArgumentException(
          said(
              "Near-vertical cover of %s km is not near-vertical. Give up to 2000 km, or a target"
                  + " with bearing and distance.",
              radiusKm));
    }
    double from = Math.toDegrees(Hop.elevation(radiusKm, Layer.F2.lowestKm()));
    Window window = new Window(Layer.F2, 1, from, 90);
    String note =
        frequencyMHz <= Layer.F2.criticalMHz()
            ? ""
            : said(
                "%s MHz is hardly ever turned back from straight above; use a band under 10 MHz for"
                    + " near-vertical cover.",
                frequencyMHz);
    return new Windows(List.of(window), window, note);
  }

  /** Whether a distance ends so near the antipode that every bearing leads there. */
  public static boolean bearingIsAny(double distanceKm) {
    return Math.abs(distanceKm - ROUND_THE_EARTH_KM / 2) <= ANTIPODE_KM;
  }

  private static List<Window> windows(
      Layer layer, double distanceKm, double frequencyMHz, int more, int mostHops) {
    List<Window> windows = new ArrayList<>();
    int fewest = fewestHops(distanceKm, layer.highestKm());
    for (int hops = fewest; hops <= Math.min(fewest + more, mostHops); hops++) {
      double ceiling = ceilingKm(layer, distanceKm / hops, frequencyMHz);
      if (ceiling >= layer.lowestKm()) {
        window(layer, distanceKm, hops, ceiling).ifPresent(windows::add);
      }
    }
    return windows;
  }

  private static Optional<Window> window(
      Layer layer, double distanceKm, int hops, double ceilingKm) {
    double range = distanceKm / hops;
    double to = Math.toDegrees(Hop.elevation(range, ceilingKm));
    if (to < LEAST_DEGREES) {
      return Optional.empty();
    }
    double from = Math.max(LEAST_DEGREES, Math.toDegrees(Hop.elevation(range, layer.lowestKm())));
    return Optional.of(new Window(layer, hops, Math.min(from, to), to));
  }

  /** Fewest hops that a mirror at this height makes without going under the least elevation. */
  private static int fewestHops(double distanceKm, double heightKm) {
    double longest = Hop.rangeKm(Math.toRadians(LEAST_DEGREES), heightKm);
    return Math.max(1, (int) Math.ceil(distanceKm / longest - 1e-9));
  }

  private static double middleKm(Layer layer) {
    return (layer.lowestKm() + layer.highestKm()) / 2;
  }

  /**
   * The greatest height of a layer at which the secant law still turns the frequency back; under
   * the layer's least height when none does. Higher mirrors mean steeper rays, so there is one.
   */
  private static double ceilingKm(Layer layer, double rangeKm, double frequencyMHz) {
    if (turnsBack(layer, rangeKm, layer.highestKm(), frequencyMHz)) {
      return layer.highestKm();
    }
    if (!turnsBack(layer, rangeKm, layer.lowestKm(), frequencyMHz)) {
      return Double.NEGATIVE_INFINITY;
    }
    double served = layer.lowestKm();
    double lost = layer.highestKm();
    while (lost - served > 1e-6) {
      double middle = (served + lost) / 2;
      if (turnsBack(layer, rangeKm, middle, frequencyMHz)) {
        served = middle;
      } else {
        lost = middle;
      }
    }
    return served;
  }

  private static boolean turnsBack(
      Layer layer, double rangeKm, double heightKm, double frequencyMHz) {
    double elevation = Math.max(0, Hop.elevation(rangeKm, heightKm));
    double needed = frequencyMHz * Math.cos(Hop.incidence(elevation, heightKm));
    return needed <= layer.criticalMHz();
  }

  private static void requireFrequency(double frequencyMHz) {
    if (!(frequencyMHz >= 0.1 && frequencyMHz <= 1000)) {
      throw new IllegalArgumentException(
          said(
              "A frequency of %s MHz is outside 0.1 to 1000 MHz. Give megahertz, not hertz.",
              frequencyMHz));
    }
  }

  private static String said(String form, Object... parts) {
    for (int k = 0; k < parts.length; k++) {
      if (parts[k] instanceof Double number) {
        parts[k] = String.format(Locale.ROOT, "%.6g", number).replaceAll("\\.?0+$", "");
      }
    }
    return String.format(Locale.ROOT, form, parts);
  }
}
