/** Kit designs and part libraries as files: {@link earward.kit.file.Designs} is the door. */
@NullMarked
package earward.kit.file;

import org.jspecify.annotations.NullMarked;
