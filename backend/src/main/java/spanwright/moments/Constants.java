package spanwright.moments;

/** Physical constants (CODATA 2018; the metre's definition). */
final class Constants {
  /** Speed of light in vacuum [m/s], exact. */
  static final double LIGHT = 299_792_458.0;

  /** Magnetic constant [H/m]. */
  static final double MU0 = 1.25663706212e-6;

  /** Electric constant [F/m]. */
  static final double EPSILON0 = 1 / (MU0 * LIGHT * LIGHT);

  /** Wave impedance of free space [ohm]. */
  static final double ETA0 = MU0 * LIGHT;

  private Constants() {}

  /** Free-space wave number [1/m]. */
  static double waveNumber(double frequencyMHz) {
    return angularFrequency(frequencyMHz) / LIGHT;
  }

  /** Angular frequency [rad/s]. */
  static double angularFrequency(double frequencyMHz) {
    return 2 * Math.PI * frequencyMHz * 1e6;
  }
}
