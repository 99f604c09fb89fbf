package spanwright.moments;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.apache.commons.math3.complex.Complex;

/**
 * One solved model at one frequency. Immutable to the outside and thread-safe; what takes long
 * (efficiency, peak) is worked out when first asked for.
 */
public final class Solution {
  private final double frequencyMHz;
  private final Complex impedance;
  private final double inputPower;
  private final double wireLoss;
  private final Currents currents;
  private final FarField far;
  private final Reflection reflection;
  private final Ground ground;
  private final double k;
  private final double residual;
  private final double refinementChange;
  private final List<String> warnings;
  private final List<String> failings;
  private final List<WireSpec> wires;
  private volatile FarField.Sky sky;
  private volatile Peak peak;

  /** What the solver found; doubts holds what is to be said of it. */
  record Found(
      double frequencyMHz,
      Complex impedance,
      double inputPower,
      double wireLoss,
      double residual,
      Doubts doubts) {}

  Solution(
      Found found,
      Currents currents,
      FarField far,
      Reflection reflection,
      Ground ground,
      List<WireSpec> wires,
      double refinementChange) {
    this.frequencyMHz = found.frequencyMHz();
    this.impedance = found.impedance();
    this.inputPower = found.inputPower();
    this.wireLoss = found.wireLoss();
    this.residual = found.residual();
    this.warnings = List.copyOf(found.doubts().warnings);
    this.failings = List.copyOf(found.doubts().failings);
    this.currents = currents;
    this.far = far;
    this.reflection = reflection;
    this.ground = ground;
    this.wires = wires;
    this.k = Constants.waveNumber(found.frequencyMHz());
    this.refinementChange = refinementChange;
  }

  /** The same, held against a finer mesh. */
  Solution refined(double change, double allowed) {
    Doubts doubts = new Doubts(warnings, failings);
    doubts.ofRefinement(change, allowed);
    Found found = new Found(frequencyMHz, impedance, inputPower, wireLoss, residual, doubts);
    return new Solution(found, currents, far, reflection, ground, wires, change);
  }

  /** The frequency [MHz]. */
  public double frequencyMHz() {
    return frequencyMHz;
  }

  /** Impedance at the feedpoint [ohm]. */
  public Complex impedance() {
    return impedance;
  }

  /** Size of the linear system. */
  public int unknowns() {
    return currents.mesh.unknowns;
  }

  /** Radiated to the sky over input, 0 to 1. */
  public double efficiency() {
    return radiated() / inputPower;
  }

  /** Lost in the wires over input, 0 to 1. */
  public double wireLossShare() {
    return wireLoss / inputPower;
  }

  /**
   * Lost in the ground over input, 0 to 1: nothing in free space and over perfect ground; over real
   * ground what efficiency and wire loss leave, since it is not integrated on its own.
   */
  public double groundLossShare() {
    return ground.kind() == Ground.Kind.REAL ? Math.max(0, 1 - efficiency() - wireLossShare()) : 0;
  }

  /**
   * (Radiated + wire loss) / input in free space and over perfect ground: 1 when it closes. Empty
   * over real ground, whose loss is not integrated on its own.
   */
  public OptionalDouble powerBalance() {
    if (ground.kind() == Ground.Kind.REAL) {
      return OptionalDouble.empty();
    }
    return OptionalDouble.of((radiated() + wireLoss) / inputPower);
  }

  private double radiated() {
    return sky().power();
  }

  private FarField.Sky sky() {
    FarField.Sky known = sky;
    if (known == null) {
      known = far.sky();
      sky = known;
    }
    return known;
  }

  /** Size of the linear system's residual over the excitation. */
  public double residual() {
    return residual;
  }

  /** Change of the reflection coefficient (400 ohm) on a finer mesh, when it was asked for. */
  public OptionalDouble refinementChange() {
    return Double.isNaN(refinementChange)
        ? OptionalDouble.empty()
        : OptionalDouble.of(refinementChange);
  }

  /**
   * All doubts about the model or the answer, as sentences; empty when there are none. Those that
   * forbid relying on the answer are among them, and alone in {@link #failings}.
   */
  public List<String> warnings() {
    List<String> closing = closing();
    if (closing.isEmpty()) {
      return warnings;
    }
    List<String> all = new ArrayList<>(warnings);
    all.addAll(closing);
    return all;
  }

  /**
   * Why the figures of this answer must not be relied on, as sentences; empty when they may. What
   * fails here must never be ranked as good.
   */
  public List<String> failings() {
    List<String> closing = closing();
    if (closing.isEmpty()) {
      return failings;
    }
    List<String> all = new ArrayList<>(failings);
    all.addAll(closing);
    return all;
  }

  /** Whether nothing was found that forbids relying on the answer: no {@link #failings}. */
  public boolean trusted() {
    return failings().isEmpty();
  }

  /** What is wrong when the power that goes out is not the power that goes in. */
  private List<String> closing() {
    double accounted = (radiated() + wireLoss) / inputPower;
    return Doubts.ofPower(accounted, ground.kind() == Ground.Kind.REAL);
  }

  /** Gain is intensity times this. */
  private double perIntensity() {
    return 4 * Math.PI / inputPower;
  }

  /**
   * Gain in one direction.
   *
   * @param azimuth radians clockwise from +y
   * @param elevation radians above the horizon
   */
  public Gain gain(double azimuth, double elevation) {
    return gains(Directions.of(new double[] {azimuth}, new double[] {elevation})).get(0);
  }

  /** Gains in a batch of directions. */
  public List<Gain> gains(Directions directions) {
    double[] horizontal = new double[directions.count()];
    double[] vertical = new double[directions.count()];
    far.intensity(directions, horizontal, vertical);
    double factor = perIntensity();
    List<Gain> gains = new ArrayList<>(directions.count());
    for (int i = 0; i < directions.count(); i++) {
      double h = factor * horizontal[i];
      double v = factor * vertical[i];
      gains.add(new Gain(Gain.dbi(h + v), Gain.dbi(h), Gain.dbi(v)));
    }
    return gains;
  }

  /** Total gain in a batch of directions as a power ratio (not dB): the quick way. */
  public double[] powerGains(Directions directions) {
    double[] horizontal = new double[directions.count()];
    double[] vertical = new double[directions.count()];
    far.intensity(directions, horizontal, vertical);
    double factor = perIntensity();
    for (int i = 0; i < horizontal.length; i++) {
      horizontal[i] = factor * (horizontal[i] + vertical[i]);
    }
    return horizontal;
  }

  /** The greatest gain over all directions. */
  public Peak peak() {
    Peak known = peak;
    if (known == null) {
      boolean grounded = ground.kind() != Ground.Kind.NONE;
      known = new PeakSearch(far, grounded).find(sky(), perIntensity());
      peak = known;
    }
    return known;
  }

  /**
   * Electric and magnetic field at points, from the same kernels as the matrix; rms.
   *
   * @param points outside the wires, above the ground
   * @param power watts into the feedpoint
   */
  public List<NearField> fields(List<Vertex> points, double power) {
    if (!(power >= 0 && power <= 1e7)) {
      throw new ModelFault("The power is " + power + " W: give one from 0 to 10 MW.");
    }
    NearZone zone = new NearZone(currents, reflection, k);
    double scale = Math.sqrt(0.5 * power / inputPower);
    List<NearField> fields = new ArrayList<>(points.size());
    for (int i = 0; i < points.size(); i++) {
      Vertex p = points.get(i);
      boolean known = Double.isFinite(p.x()) && Double.isFinite(p.y()) && Double.isFinite(p.z());
      if (!known || ground.kind() != Ground.Kind.NONE && p.z() <= 0) {
        throw new ModelFault(
            "fieldPoints["
                + i
                + "] has z = "
                + p.z()
                + " m: fields are worked out above the ground only. Give three numbers, the last"
                + " above 0.");
      }
      fields.add(zone.at(p, scale));
    }
    return fields;
  }

  /** The current along every wire: at the ends and the middle of each element. */
  public List<CurrentSample> currents() {
    Mesh mesh = currents.mesh;
    List<CurrentSample> samples = new ArrayList<>();
    for (int e = 0; e < mesh.elements; e++) {
      double total = wires.get(mesh.wire[e]).length();
      for (int i = 0; i < 3; i++) {
        double t = 0.5 * i;
        double s = t * mesh.length[e];
        samples.add(
            new CurrentSample(
                mesh.wire[e],
                (mesh.arcA[e] + t * (mesh.arcB[e] - mesh.arcA[e])) / total,
                new Vertex(
                    mesh.x[e] + s * mesh.tx[e],
                    mesh.y[e] + s * mesh.ty[e],
                    mesh.z[e] + s * mesh.tz[e]),
                new Complex(
                    Currents.at(currents.re[e], Shapes.POWERS, t),
                    Currents.at(currents.im[e], Shapes.POWERS, t))));
      }
    }
    return samples;
  }
}
