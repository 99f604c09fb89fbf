package spanwright.assess;

import spanwright.path.ReferenceVertical;
import spanwright.plan.Band;
import spanwright.plan.Soil;

/** The reference vertical over a plan's soil, for documents and drawings. */
public final class ReferenceGains {
  /** In words, as result documents say it. */
  public static final String WHAT = "quarter-wave ground-mounted vertical over the same ground";

  private ReferenceGains() {}

  /** Gain on a band's middle frequency [dBi]. */
  public static double dbi(Band band, Soil soil, double elevationDegrees) {
    return Rounded.hundredth(
        ReferenceVertical.gainDbi(
            Math.toRadians(elevationDegrees),
            band.middleMHz(),
            soil.permittivity(),
            soil.conductivity()));
  }
}
