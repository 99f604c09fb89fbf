package spanwright.assess;

/**
 * One thing the station wants: a target on a band, as the field solver sees it.
 *
 * @param band index in the brief
 * @param target index in the brief
 * @param frequencyMHz the band's middle frequency
 * @param bearing degrees clockwise from true north; ignored when all round
 * @param allRound near-vertical cover, or a target at the antipode: every azimuth counts alike
 * @param fromElevation lower edge of the scored take-off window, degrees up
 * @param toElevation upper edge, degrees up
 * @param weight band weight times target weight
 */
public record Aim(
    int band,
    int target,
    double frequencyMHz,
    double bearing,
    boolean allRound,
    double fromElevation,
    double toElevation,
    double weight) {}
