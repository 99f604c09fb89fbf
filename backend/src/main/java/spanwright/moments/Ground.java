package spanwright.moments;

/**
 * What lies below z = 0.
 *
 * @param kind nothing, a perfect mirror, or soil
 * @param permittivity relative, of soil
 * @param conductivity of soil [S/m]
 */
public record Ground(Kind kind, double permittivity, double conductivity) {
  /** The three grounds. */
  public enum Kind {
    NONE,
    PERFECT,
    REAL
  }

  private static final Ground FREE_SPACE = new Ground(Kind.NONE, 1, 0);
  private static final Ground MIRROR = new Ground(Kind.PERFECT, 1, 0);

  public Ground {
    if (kind == Kind.REAL
        && !(permittivity >= 1
            && permittivity <= 1e4
            && conductivity >= 0
            && conductivity <= 1e9)) {
      throw new ModelFault(
          "The ground's permittivity is "
              + permittivity
              + " and its conductivity "
              + conductivity
              + " S/m: give a permittivity from 1 to 10000 and a conductivity from 0 to 1e9 S/m.");
    }
  }

  /** Free space. */
  public static Ground none() {
    return FREE_SPACE;
  }

  /** A perfectly conducting plane. */
  public static Ground perfect() {
    return MIRROR;
  }

  /** Soil of this relative permittivity and conductivity [S/m]. */
  public static Ground real(double permittivity, double conductivity) {
    return new Ground(Kind.REAL, permittivity, conductivity);
  }
}
