package spanwright.plan;

/** How the place of a value in a document is written: {@code buildings[1].footprint[0]}. */
final class Paths {
  private Paths() {}

  static String field(String path, String name) {
    String shown = Wording.clean(name);
    return path.isEmpty() ? shown : path + "." + shown;
  }

  static String entry(String path, int index) {
    return path + "[" + index + "]";
  }
}
