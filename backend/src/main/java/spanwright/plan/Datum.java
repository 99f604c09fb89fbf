package spanwright.plan;

/**
 * A point that tapes are held at.
 *
 * @param name on the sheet
 * @param at its place
 */
public record Datum(String name, Point at) {}
