package spanwright.moments;

/**
 * Sine and cosine of many angles, from + − × and rounding only, so that the loop runs several lanes
 * at a time and gives the same bits on every machine. Good to 2e-15 for angles up to 1e5.
 */
final class SinCos {
  private static final double PI_HIGH = 3.14159265160560607910;
  private static final double PI_LOW = Math.PI - PI_HIGH + 1.2246467991473532e-16;
  private static final double PER_PI = 1 / Math.PI;
  // Taylor coefficients; the angle is within ±pi/2
  private static final double S1 = -1.0 / 6;
  private static final double S2 = S1 / -20;
  private static final double S3 = S2 / -42;
  private static final double S4 = S3 / -72;
  private static final double S5 = S4 / -110;
  private static final double S6 = S5 / -156;
  private static final double S7 = S6 / -210;
  private static final double S8 = S7 / -272;
  private static final double S9 = S8 / -342;
  private static final double S10 = S9 / -420;
  private static final double C1 = -0.5;
  private static final double C2 = C1 / -12;
  private static final double C3 = C2 / -30;
  private static final double C4 = C3 / -56;
  private static final double C5 = C4 / -90;
  private static final double C6 = C5 / -132;
  private static final double C7 = C6 / -182;
  private static final double C8 = C7 / -240;
  private static final double C9 = C8 / -306;
  private static final double C10 = C9 / -380;
  private static final double C11 = C10 / -462;

  private SinCos() {}

  /** Writes sin and cos of angle[0 .. count − 1]; the angles are overwritten. */
  static void of(double[] angle, int count, double[] sin, double[] cos) {
    // reduce to ±pi/2; sin[] holds the sign meanwhile
    for (int i = 0; i < count; i++) {
      double n = Math.rint(angle[i] * PER_PI);
      double half = 0.5 * n;
      sin[i] = 1 - 4 * (half - Math.floor(half));
      angle[i] = (angle[i] - n * PI_HIGH) - n * PI_LOW;
    }
    for (int i = 0; i < count; i++) {
      double u = angle[i] * angle[i];
      double c = C6 + u * (C7 + u * (C8 + u * (C9 + u * (C10 + u * C11))));
      cos[i] = sin[i] * (1 + u * (C1 + u * (C2 + u * (C3 + u * (C4 + u * (C5 + u * c))))));
    }
    for (int i = 0; i < count; i++) {
      double y = angle[i];
      double u = y * y;
      double s = S6 + u * (S7 + u * (S8 + u * (S9 + u * S10)));
      sin[i] = sin[i] * (y + y * u * (S1 + u * (S2 + u * (S3 + u * (S4 + u * (S5 + u * s))))));
    }
  }
}
