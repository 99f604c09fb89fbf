package spanwright.search;

import java.util.ArrayList;
import java.util.List;
import spanwright.assess.Placement;
import spanwright.assess.ReferenceGains;
import spanwright.clearance.Refusal;
import spanwright.plan.Band;
import spanwright.plan.Plan;

/**
 * A result document, as {@code rank} prints it.
 *
 * @param format "spanwright-result/1"
 * @param plan its title
 * @param seed of the search
 * @param effort quick, normal or thorough
 * @param counts what was done
 * @param seconds wall time
 * @param threads used
 * @param placements best first
 * @param reference what gains are held against
 * @param refusals why others are not allowed
 */
public record Result(
    String format,
    String plan,
    long seed,
    String effort,
    Counts counts,
    double seconds,
    int threads,
    List<Placement> placements,
    Reference reference,
    List<Refusal> refusals) {

  /** The format's name and version. */
  public static final String FORMAT = "spanwright-result/1";

  public Result {
    placements = List.copyOf(placements);
    refusals = List.copyOf(refusals);
  }

  /**
   * What was done.
   *
   * @param considered layouts made
   * @param refused by a rule, or not to be hung at all
   * @param screened left aside for others of more promise, before hanging or after a coarse look
   * @param solved assessed in full
   * @param systems matrices filled and factored
   * @param meanUnknowns of those matrices
   */
  public record Counts(
      int considered, int refused, int screened, int solved, int systems, double meanUnknowns) {}

  /**
   * The reference vertical.
   *
   * @param what in words
   * @param bands its gains
   */
  public record Reference(String what, List<ReferenceBand> bands) {
    /** On the bands and the soil of a plan. */
    static Reference of(Plan plan) {
      List<ReferenceBand> bands = new ArrayList<>();
      for (Band band : plan.brief().bands()) {
        List<ReferenceGain> gains = new ArrayList<>();
        for (int elevation = 1; elevation <= 89; elevation += 2) {
          double dbi = ReferenceGains.dbi(band, plan.site().ground(), elevation);
          gains.add(new ReferenceGain(elevation, dbi));
        }
        bands.add(new ReferenceBand(band.name(), gains));
      }
      return new Reference(ReferenceGains.WHAT, bands);
    }
  }

  /**
   * The reference on one band.
   *
   * @param name of the band
   * @param gains by elevation
   */
  public record ReferenceBand(String name, List<ReferenceGain> gains) {}

  /**
   * The reference in one direction.
   *
   * @param elevation degrees up
   * @param dbi gain
   */
  public record ReferenceGain(double elevation, double dbi) {}
}
