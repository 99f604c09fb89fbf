package spanwright.sheet;

import java.util.List;

/**
 * A sheet as it was handed out: enough to tell later what a new one changes. Kept beside the plan,
 * one after another.
 *
 * @param revision letter, "A" for the first
 * @param date when it was issued, as it reads
 * @param placement id of the placement
 * @param facts what stood on it, in metres whatever the units it was printed in
 */
public record Issued(String revision, String date, String placement, List<Fact> facts) {
  public Issued {
    facts = List.copyOf(facts);
  }

  /**
   * One thing a sheet says.
   *
   * @param what it is about, the same words on every sheet
   * @param value as it reads
   */
  public record Fact(String what, String value) {}
}
