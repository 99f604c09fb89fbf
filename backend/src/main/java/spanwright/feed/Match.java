package spanwright.feed;

/**
 * What a matching unit makes of a load.
 *
 * @param state clear, tight or foul
 * @param why the reason in words, without a full stop
 * @param settings of its parts; null for a balun
 * @param lossDb power into the unit over power out of it; infinite when the load takes none
 * @param swr left at the transmitter, on 50 ohm
 * @param peakVolts greatest across a part, at full power into the unit
 * @param peakAmps greatest through a part, likewise
 */
public record Match(
    Verdict state,
    String why,
    Settings settings,
    double lossDb,
    double swr,
    double peakVolts,
    double peakAmps) {

  /**
   * Settings of a unit's parts.
   *
   * @param layout how they are connected, in words
   * @param inductance henries
   * @param capacitance farads; of a T, the capacitor on the transmitter's side
   * @param secondCapacitance farads, a T's capacitor on the line's side; null for an L
   */
  public record Settings(
      String layout, double inductance, double capacitance, Double secondCapacitance) {}
}
