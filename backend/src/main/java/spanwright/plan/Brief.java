package spanwright.plan;

import java.util.List;

/**
 * What the station must do, and with what.
 *
 * @param bands at least one
 * @param targets at least one
 * @param power watts, peak envelope
 * @param duty 0 to 1
 * @param wire catalogue id, or null for the default
 * @param line catalogue id, or null for the default
 * @param rope catalogue id, or null for the default
 * @param lineLengths lengths at hand
 * @param matching or null for the default
 * @param shapes allowed; all when the plan says none
 * @param newMasts how many may be built
 * @param rules what differs from the defaults
 * @param exposure catalogue id of a limit set, or null
 */
public record Brief(
    List<Band> bands,
    List<Target> targets,
    double power,
    double duty,
    String wire,
    String line,
    String rope,
    LineLengths lineLengths,
    MatchingChoice matching,
    List<Shape> shapes,
    int newMasts,
    Rules rules,
    String exposure) {
  public Brief {
    bands = bands == null ? List.of() : List.copyOf(bands);
    targets = targets == null ? List.of() : List.copyOf(targets);
    shapes = shapes == null ? List.of() : List.copyOf(shapes);
  }
}
