package spanwright.feed;

/**
 * Settings of a whole unit and what they do.
 *
 * @param section the L of it
 * @param setting its figures
 * @param second capacitance of a T's capacitor on the line's side [F], else 0
 * @param lossDb power in over power out
 * @param volts largest across a part
 * @param amps largest through a part
 * @param state worst of SWR, loss and volts
 */
record Candidate(
    LSection section,
    LSection.Setting setting,
    double second,
    double lossDb,
    double volts,
    double amps,
    Verdict state) {

  static Candidate of(
      LSection section,
      LSection.Setting setting,
      double second,
      double powerOut,
      double volts,
      double amps,
      double stands) {
    double loss =
        powerOut > 0
            ? Math.max(0, 10 * Math.log10(setting.powerIn() / powerOut))
            : Double.POSITIVE_INFINITY;
    Verdict state =
        Judgement.ofSwr(swr(setting.reflection()))
            .worse(Judgement.ofLoss(loss))
            .worse(Judgement.ofVolts(volts, stands));
    return new Candidate(section, setting, second, loss, volts, amps, state);
  }

  /** Whether it matches fully. */
  boolean isExact() {
    return setting.reflection() < 1e-6;
  }

  double swr() {
    return swr(setting.reflection());
  }

  /**
   * The state first; then how far the worst of SWR, loss and volts is over the limit of the next
   * better state; then what is lost in the unit and by what mismatch is left [dB].
   */
  double cost(double stands) {
    double r = setting.reflection();
    double mismatch = -10 * Math.log10(Math.max(1e-80, 1 - r * r));
    double total = Math.min(lossDb + mismatch, 900);
    return state == Verdict.CLEAR ? total : 1000 * state.ordinal() + 10 * over(stands) + total;
  }

  /** Natural logarithm of the worst ratio to a limit, at most 9. */
  private double over(double stands) {
    boolean foul = state == Verdict.FOUL;
    double bySwr = swr() / (foul ? Judgement.TIGHT_SWR : Judgement.CLEAR_SWR);
    double byLoss = lossDb / (foul ? Judgement.TIGHT_LOSS_DB : Judgement.CLEAR_LOSS_DB);
    double byVolts = stands > 0 ? volts / (stands * (foul ? 1 : Judgement.CLEAR_SHARE)) : 0;
    return Math.min(9, Math.log(Math.max(bySwr, Math.max(byLoss, byVolts))));
  }

  private static double swr(double reflection) {
    return (1 + reflection) / Math.max(1e-15, 1 - reflection);
  }
}
