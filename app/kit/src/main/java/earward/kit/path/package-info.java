/**
 * From a design to solved figures: {@link earward.kit.path.Assembler} joins the blocks to one
 * circuit, {@code KitSolver} solves it in all its cases.
 */
@NullMarked
package earward.kit.path;

import org.jspecify.annotations.NullMarked;
