/** How a compiled circuit is solved; not for use outside the engine. */
@NullMarked
package earward.engine.internal;

import org.jspecify.annotations.NullMarked;
