package spanwright.moments;

/** How near to the converged answer the mesh is to come. */
public enum MeshAim {
  /** Reflection coefficient (400 ohm) within 0.05, gains within 0.3 dB: for screening. */
  COARSE,
  /** Reflection coefficient (400 ohm) within 0.01, gains within 0.05 dB. */
  FULL,
  /** What {@link #FULL} is held against when a solution is asked how far refinement moves it. */
  FINE
}
