/** The contract tests that every block must pass. */
@NullMarked
package earward.block.testkit;

import org.jspecify.annotations.NullMarked;
