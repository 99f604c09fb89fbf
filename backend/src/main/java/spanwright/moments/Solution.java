package spanwright.moments;

import java.util.List;
import java.util.OptionalDouble;
import org.apache.commons.math3.complex.Complex;

/** One solved model at one frequency. Immutable, thread-safe. */
public final class Solution {
  Solution() {}

  private static <T> T pending() {
    throw new UnsupportedOperationException("not yet");
  }

  /** The frequency [MHz]. */
  public double frequencyMHz() {
    return pending();
  }

  /** Impedance at the feedpoint [ohm]. */
  public Complex impedance() {
    return pending();
  }

  /** Size of the linear system. */
  public int unknowns() {
    return pending();
  }

  /** Radiated to the sky over input, 0 to 1. */
  public double efficiency() {
    return pending();
  }

  /** Lost in the wires over input, 0 to 1. */
  public double wireLossShare() {
    return pending();
  }

  /**
   * (Radiated + wire loss) / input in free space and over perfect ground: 1 when it closes. Empty
   * over real ground, whose loss is not integrated on its own.
   */
  public OptionalDouble powerBalance() {
    return pending();
  }

  /** Size of the linear system's residual over the excitation. */
  public double residual() {
    return pending();
  }

  /** Change of the reflection coefficient (400 ohm) on a finer mesh, when it was asked for. */
  public OptionalDouble refinementChange() {
    return pending();
  }

  /** Doubts about the model or the answer, as sentences; empty when there are none. */
  public List<String> warnings() {
    return pending();
  }

  /**
   * Gain in one direction.
   *
   * @param azimuth radians clockwise from +y
   * @param elevation radians above the horizon
   */
  public Gain gain(double azimuth, double elevation) {
    return pending();
  }

  /** Gains in a batch of directions. */
  public List<Gain> gains(Directions directions) {
    return pending();
  }

  /** Total gain in a batch of directions as a power ratio (not dB): the quick way. */
  public double[] powerGains(Directions directions) {
    return pending();
  }

  /** The greatest gain. */
  public Peak peak() {
    return pending();
  }

  /**
   * Electric and magnetic field at points, from the same kernels.
   *
   * @param points outside the wires, above the ground
   * @param power watts into the feedpoint
   */
  public List<NearField> fields(List<Vertex> points, double power) {
    return pending();
  }

  /** The current along every wire. */
  public List<CurrentSample> currents() {
    return pending();
  }
}
