/** The engine: wiring in, figures out. */
@NullMarked
package earward.engine;

import org.jspecify.annotations.NullMarked;
