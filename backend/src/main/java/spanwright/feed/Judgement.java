package spanwright.feed;

import java.util.Locale;

/**
 * Where clear ends and foul begins. The limits are common practice, no source: transmitters give
 * full power up to an SWR of about 1.5 and protect themselves from about 2; a unit that turns half
 * of the power into heat is no match.
 */
final class Judgement {
  static final double CLEAR_SWR = 1.5;
  static final double TIGHT_SWR = 2;
  static final double BALUN_CLEAR_SWR = 2;
  static final double BALUN_TIGHT_SWR = 3;
  static final double CLEAR_LOSS_DB = 1;
  static final double TIGHT_LOSS_DB = 3;

  /** Share of the voltage something stands that is still clear. */
  static final double CLEAR_SHARE = 0.8;

  private Judgement() {}

  static Verdict of(double value, double clear, double tight) {
    if (value <= clear) {
      return Verdict.CLEAR;
    }
    return value <= tight ? Verdict.TIGHT : Verdict.FOUL;
  }

  static Verdict ofSwr(double swr) {
    return of(swr, CLEAR_SWR * (1 + 1e-9), TIGHT_SWR * (1 + 1e-9));
  }

  static Verdict ofLoss(double lossDb) {
    return of(lossDb, CLEAR_LOSS_DB, TIGHT_LOSS_DB);
  }

  /** Clear when it is not known what stands (0). */
  static Verdict ofVolts(double volts, double stands) {
    return stands > 0 ? of(volts, CLEAR_SHARE * stands, stands) : Verdict.CLEAR;
  }

  static String voltsOnLine(double volts, double stands) {
    return switch (ofVolts(volts, stands)) {
      case CLEAR ->
          stands > 0 ? "volts well inside what the line stands" : "no voltage limit known";
      case TIGHT -> said("%.0f V on the line, near the %.0f V it stands", volts, stands);
      case FOUL -> said("%.0f V on the line, over the %.0f V it stands", volts, stands);
    };
  }

  static String said(String form, Object... parts) {
    return String.format(Locale.ROOT, form, parts);
  }
}
