/** Preamplifiers. */
@NullMarked
package earward.preamplifiers;

import org.jspecify.annotations.NullMarked;
