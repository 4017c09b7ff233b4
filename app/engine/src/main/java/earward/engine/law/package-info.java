/** The laws of the device kinds: what each adds to the equations of the circuit. */
@NullMarked
package earward.engine.law;

import org.jspecify.annotations.NullMarked;
