package spanwright.feed;

import org.apache.commons.math3.complex.Complex;

/**
 * A load seen through a line and a matching unit. Infinite are {@code lineSwr} and {@code lossDb}
 * where the load takes no power at all, and {@code peakVolts} and {@code peakAmps} where the line
 * then loses none either.
 *
 * @param lineSwr at the load, on the line's nominal impedance
 * @param matchedLossDb of the line if it were matched
 * @param lossDb power into the line over power into the load
 * @param atStation impedance at the foot of the line [ohm]
 * @param stationSwr SWR there on 50 ohm
 * @param peakVolts largest along the line, for the power into it
 * @param peakAmps likewise
 * @param lineState its volts against what the line stands; clear when that is not known
 * @param lineWhy the reason in words
 * @param matching what the unit makes of it, or null when there is none
 */
public record FeedResult(
    double lineSwr,
    double matchedLossDb,
    double lossDb,
    Complex atStation,
    double stationSwr,
    double peakVolts,
    double peakAmps,
    Verdict lineState,
    String lineWhy,
    Match matching) {}
