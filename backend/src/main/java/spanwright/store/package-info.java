/**
 * Plans on disk: one folder, one {@code .json} file for each plan, kept exactly as they were sent.
 *
 * <p>What is promised, and how it is kept:
 *
 * <ul>
 *   <li><b>A save is whole or not there.</b> A plan is written to a temporary file, forced to the
 *       disk, then renamed over the old one; the folder is forced too. A crash leaves the old file
 *       or the new one, never half of either.
 *   <li><b>The save before stays.</b> Before a plan is replaced, what it replaces becomes {@code
 *       ID.previous.json}.
 *   <li><b>Nothing saved is deleted.</b> Deleting renames to {@code ID.deleted-TIME.json}; a file
 *       that cannot be read as JSON is renamed to {@code ID.damaged-TIME.json}, the save before it
 *       takes its place if that one is sound, and the rest of the folder opens as ever.
 *   <li><b>Nobody overwrites unseen.</b> Every save has a version; replacing and deleting name the
 *       version they mean, and comparing and writing are one step. A lock on the folder keeps a
 *       second program out.
 *   <li><b>Ids never become paths unchecked.</b> Only {@code a-z}, {@code 0-9} and single hyphens,
 *       at most 64 characters.
 *   <li><b>A sheet that was issued stays issued.</b> The record of the sheets handed out of a plan
 *       lies beside it as {@code ID.issued.json}, with a copy of the same, {@code
 *       ID.issued-copy.json}. It only grows, outlives its plan, and the copy takes its place when
 *       it is damaged, so that no letter is given twice.
 * </ul>
 *
 * <p>What it does not do: judge plans (drafts are kept too; {@code web} checks what it lets in),
 * merge edits, or keep more than one save before the present one.
 *
 * <p>Front door: {@link spanwright.store.PlanStore}; {@link spanwright.store.IssuedRecords} through
 * it.
 */
package spanwright.store;
