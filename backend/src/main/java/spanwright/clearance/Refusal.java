package spanwright.clearance;

import java.util.List;
import spanwright.plan.Place;
import spanwright.rigging.Layout;

/**
 * Why a placement is not allowed, and the smallest change that would allow it.
 *
 * @param attachments what it hangs on, as {@code on} of its attachments
 * @param shape its shape word
 * @param rule id in the rule catalogue
 * @param to id of the thing in the way
 * @param what which part of ours is nearest, in words
 * @param at the place, z above the plan's zero
 * @param distance found
 * @param required by the rule
 * @param reason the refusal as a sentence
 * @param cure the cure as a sentence
 * @param cured the attachments that would cure it, or empty when no move of an attachment does
 * @param wire the refused wire as drawn, for a ghost
 * @param after the placement after the cure, as {@code assess} reads it; null where nothing cures
 *     it
 * @param miss 1 to 3 for the nearest misses, where nothing at all is allowed; else null
 * @param lacks everything that stands in this placement's way, as sentences, this one first
 */
public record Refusal(
    List<String> attachments,
    String shape,
    String rule,
    String to,
    String what,
    Place at,
    double distance,
    double required,
    String reason,
    String cure,
    List<Layout.Hold> cured,
    List<List<Place>> wire,
    Layout after,
    Integer miss,
    List<String> lacks) {
  public Refusal {
    attachments = attachments == null ? List.of() : List.copyOf(attachments);
    cured = cured == null ? List.of() : List.copyOf(cured);
    wire = wire == null ? List.of() : List.copyOf(wire);
    lacks = lacks == null ? List.of() : List.copyOf(lacks);
  }

  /** The same, as one of the nearest misses. */
  public Refusal missing(int place) {
    return new Refusal(
        attachments,
        shape,
        rule,
        to,
        what,
        at,
        distance,
        required,
        reason,
        cure,
        cured,
        wire,
        after,
        place,
        lacks);
  }
}
