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

  double swr() {
    return swr(setting.reflection());
  }

  /** The state first, then what is lost in the unit and by what mismatch is left [dB]. */
  double cost() {
    double r = setting.reflection();
    double mismatch = -10 * Math.log10(Math.max(1e-80, 1 - r * r));
    return 1000 * state.ordinal() + Math.min(lossDb + mismatch, 900);
  }

  private static double swr(double reflection) {
    return (1 + reflection) / Math.max(1e-15, 1 - reflection);
  }
}
