package spanwright.store;

/** A save or deletion named a version that is no longer the present one. */
public final class StaleVersion extends RuntimeException {
  /** Of this plan. */
  StaleVersion(String id) {
    super("Plan " + id + " has been saved since by another window or program.");
  }
}
