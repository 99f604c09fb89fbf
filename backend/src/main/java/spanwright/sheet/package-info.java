/**
 * The sheet that goes into the garden: rigging list and site drawing, one model, every format.
 *
 * <p>{@link spanwright.sheet.Sheets#of} turns a plan and an assessed placement into a {@link
 * spanwright.sheet.SheetModel}: cut lengths with their allowances, ropes, hardware, attachments,
 * set-out by two tapes, order of work, checks and cautions, overhead lines before all else. The
 * model holds figures in SI units; the writers (PDF, CSV, JSON, SVG, GeoJSON) only set them out, in
 * metres or in feet and inches.
 *
 * <p>Frames: the model speaks the plan frame (metres, x east and y north of the plan, z above the
 * plan's zero). Drawings speak paper millimetres, x to the right and y down from the top left
 * corner of the page; they are made once, as a list of marks, and both the PDF and the SVG are
 * written from those marks, so that the two cannot differ. GeoJSON speaks WGS 84 longitude and
 * latitude.
 *
 * <p>Allowances (turns at an insulator, trim, rope to make off) are data with the note "common
 * practice, no source". What the package does not do: it computes no physics and judges nothing
 * anew; distances, pulls and states come from the placement as they are, and where one is missing
 * the sheet says so. It reads and writes no files; the same input gives the same bytes.
 *
 * <p>Front door: {@link spanwright.sheet.Sheets}.
 */
package spanwright.sheet;
