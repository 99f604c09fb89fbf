package spanwright.moments;

import java.util.List;

/**
 * A batch of directions with their sines and cosines: made once, used for every placement and
 * frequency.
 */
public final class Directions {
  final int count;
  final double[] sinAzimuth;
  final double[] cosAzimuth;
  final double[] sinElevation;
  final double[] cosElevation;

  private Directions(int count) {
    this.count = count;
    sinAzimuth = new double[count];
    cosAzimuth = new double[count];
    sinElevation = new double[count];
    cosElevation = new double[count];
  }

  private Directions(double[] azimuths, double[] elevations) {
    this(azimuths.length);
    for (int i = 0; i < count; i++) {
      if (!Double.isFinite(azimuths[i]) || !Double.isFinite(elevations[i])) {
        throw new ModelFault("Direction " + i + " is not a number: give azimuth and elevation.");
      }
      sinAzimuth[i] = Math.sin(azimuths[i]);
      cosAzimuth[i] = Math.cos(azimuths[i]);
      sinElevation[i] = Math.sin(elevations[i]);
      cosElevation[i] = Math.cos(elevations[i]);
    }
  }

  /**
   * Directions one by one.
   *
   * @param azimuths radians clockwise from +y
   * @param elevations radians above the horizon, as many
   */
  public static Directions of(double[] azimuths, double[] elevations) {
    if (azimuths.length != elevations.length) {
      throw new ModelFault(
          azimuths.length + " azimuths but " + elevations.length + " elevations: give as many.");
    }
    return new Directions(azimuths, elevations);
  }

  /** All round at one elevation [rad]: {@code count} azimuths from +y clockwise. */
  public static Directions ring(int count, double elevation) {
    double[] azimuths = new double[count];
    double[] elevations = new double[count];
    for (int i = 0; i < count; i++) {
      azimuths[i] = 2 * Math.PI * i / count;
      elevations[i] = elevation;
    }
    return new Directions(azimuths, elevations);
  }

  /** One azimuth [rad], {@code count} elevations from {@code low} to {@code high} inclusive. */
  public static Directions profile(double azimuth, double low, double high, int count) {
    double[] azimuths = new double[count];
    double[] elevations = new double[count];
    for (int i = 0; i < count; i++) {
      azimuths[i] = azimuth;
      elevations[i] = count == 1 ? low : low + (high - low) * i / (count - 1);
    }
    return new Directions(azimuths, elevations);
  }

  /** These directions as they are seen in a frame turned by a rotation matrix. */
  public Directions turned(double[][] rotation) {
    double[][] out = new double[3][count];
    for (int i = 0; i < count; i++) {
      double x = sinAzimuth[i] * cosElevation[i];
      double y = cosAzimuth[i] * cosElevation[i];
      double z = sinElevation[i];
      for (int c = 0; c < 3; c++) {
        out[c][i] = rotation[c][0] * x + rotation[c][1] * y + rotation[c][2] * z;
      }
    }
    return toward(out[0], out[1], out[2]);
  }

  /** Batches one after the other. */
  public static Directions joined(List<Directions> batches) {
    Directions out = new Directions(batches.stream().mapToInt(Directions::count).sum());
    int at = 0;
    for (Directions batch : batches) {
      System.arraycopy(batch.sinAzimuth, 0, out.sinAzimuth, at, batch.count);
      System.arraycopy(batch.cosAzimuth, 0, out.cosAzimuth, at, batch.count);
      System.arraycopy(batch.sinElevation, 0, out.sinElevation, at, batch.count);
      System.arraycopy(batch.cosElevation, 0, out.cosElevation, at, batch.count);
      at += batch.count;
    }
    return out;
  }

  /** Directions as unit vectors. */
  static Directions toward(double[] x, double[] y, double[] z) {
    Directions out = new Directions(x.length);
    for (int i = 0; i < x.length; i++) {
      double level = Math.sqrt(x[i] * x[i] + y[i] * y[i]);
      out.sinAzimuth[i] = level > 0 ? x[i] / level : 0;
      out.cosAzimuth[i] = level > 0 ? y[i] / level : 1;
      out.cosElevation[i] = level;
      out.sinElevation[i] = z[i];
    }
    return out;
  }

  /**
   * The whole sphere, or the sky only, on a Gauss rule in elevation and even steps in azimuth. The
   * second half of the batch is the first at the opposite azimuths, in the same order.
   *
   * @param across azimuths, an even number
   * @param up elevations
   * @param azimuths filled in [rad]
   * @param elevations filled in [rad]
   * @param weights filled in, solid angles [sr]
   */
  static Directions sky(
      int across,
      int up,
      boolean grounded,
      double[] azimuths,
      double[] elevations,
      double[] weights) {
    GaussRule rule = GaussRule.of(up);
    double low = grounded ? 0 : -0.5 * Math.PI;
    double span = 0.5 * Math.PI - low;
    double step = 2 * Math.PI / across;
    Directions out = new Directions(across * up);
    for (int i = 0; i < across; i++) {
      double azimuth = step * (i + 0.25);
      double sine = Math.sin(azimuth);
      double cosine = Math.cos(azimuth);
      for (int j = 0; j < up; j++) {
        int at = i * up + j;
        azimuths[at] = azimuth;
        elevations[at] = low + span * rule.nodes[j];
        out.sinAzimuth[at] = sine;
        out.cosAzimuth[at] = cosine;
      }
    }
    for (int j = 0; j < up; j++) {
      double sine = Math.sin(elevations[j]);
      double cosine = Math.cos(elevations[j]);
      for (int at = j; at < out.count; at += up) {
        out.sinElevation[at] = sine;
        out.cosElevation[at] = cosine;
        weights[at] = rule.weights[j] * span * cosine * step;
      }
    }
    return out;
  }

  /** How many. */
  public int count() {
    return count;
  }
}
